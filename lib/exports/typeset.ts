import { readFileSync } from 'node:fs'
import { join } from 'node:path'

import { create, type Font } from 'fontkit'

import { unpackWoff } from './woff'

/** The faces pictures and sheets are set in. */
export const FACES = {
  title: { family: 'besley', weight: '400-normal' },
  hand: { family: 'besley', weight: '400-italic' },
  text: { family: 'hanken-grotesk', weight: '400-normal' },
  strong: { family: 'hanken-grotesk', weight: '600-normal' },
} as const
/** One of FACES. */
export type Face = keyof typeof FACES

/** One of a face's files: each holds a part of its letters. */
export interface FontFile {
  name: string
  bytes: Buffer
  font: Font
}

/** Where packages are, said so that a build does not try to take every font along. */
const PACKAGES = join(process.cwd(), 'node_modules')
const loaded = new Map<Face, FontFile[]>()

/** A face's files, the one with most of the letters first. */
export function fontFiles(face: Face): FontFile[] {
  const known = loaded.get(face)
  if (known) return known
  const { family, weight } = FACES[face]
  const files = ['latin', 'latin-ext'].map((subset) => {
    const name = `${family}-${subset}-${weight}`
    const path = join(PACKAGES, '@fontsource', family, 'files', `${name}.woff`)
    const bytes = unpackWoff(readFileSync(path))
    // Only a collection of fonts gives anything but a font.
    return { name, bytes, font: create(bytes) as Font }
  })
  loaded.set(face, files)
  return files
}

/** A stretch of text in one file of its face. */
export interface Run {
  text: string
  file: FontFile
}

const segmenter = new Intl.Segmenter('en', { granularity: 'grapheme' })

/** The file of a face that has every letter of a text. */
function fileFor(face: Face, text: string): FontFile | undefined {
  return fontFiles(face).find(({ font }) =>
    Array.from(text).every((letter) => font.hasGlyphForCodePoint(letter.codePointAt(0)!)),
  )
}

const MOST_WIDTHS = 5_000
const widths = new Map<string, number>()

/** How wide a text is, in ems. Lines are tried at many sizes, so that it is asked again and again. */
function emsOf(text: string, face: Face): number {
  const key = `${face} ${text}`
  let ems = widths.get(key)
  if (ems !== undefined) return ems
  ems = runsOf(text, face).reduce(
    (sum, run) => sum + run.file.font.layout(run.text).advanceWidth / unitsOf(run),
    0,
  )
  if (widths.size >= MOST_WIDTHS) widths.clear()
  widths.set(key, ems)
  return ems
}

/**
 * The text as far as the face can set it: on one line, without invisible marks, and without the
 * pictures and signs it has no shapes for. Null when that would lose letters or leave none: half a
 * word is worse than another word.
 */
export function settable(text: string, face: Face): string | null {
  let set = ''
  // NFC, so that a letter and its accent are one where the font has them as one.
  for (const { segment } of segmenter.segment(text.normalize('NFC'))) {
    if (/^\s+$/u.test(segment)) set += ' '
    else if (fileFor(face, segment)) set += segment
    else if (/[\p{L}\p{N}]/u.test(segment) && !/\p{Extended_Pictographic}/u.test(segment))
      return null
  }
  const trimmed = set.replace(/ +/g, ' ').trim()
  return /[\p{L}\p{N}]/u.test(trimmed) ? trimmed : null
}

/** The text where the face can set it, else what stands for it. */
export const settableOr = (text: string, face: Face, otherwise: string): string =>
  settable(text, face) ?? otherwise

/** Settable text as runs, each in one file. */
export function runsOf(text: string, face: Face): Run[] {
  const runs: Run[] = []
  for (const { segment } of segmenter.segment(text)) {
    const last = runs.at(-1)
    const file = /^\s+$/u.test(segment) && last ? last.file : fileFor(face, segment)
    if (!file) continue
    if (last?.file === file) last.text += segment
    else runs.push({ text: segment, file })
  }
  return runs
}

/** How wide a text is at a size, in the unit of the size. */
export const widthOf = (text: string, face: Face, size: number): number => emsOf(text, face) * size

const unitsOf = ({ file }: Run) => file.font.unitsPerEm

/** A text set within a width. */
export interface Setting {
  lines: string[]
  size: number
}

/**
 * Breaks a text into at most `most` lines of a width: at blanks, inside a word only where it is
 * wider than a line, and at the largest of the sizes at which it fits; at the smallest it is cut.
 */
export function fitText(
  text: string,
  face: Face,
  { width, sizes, most }: { width: number; sizes: readonly number[]; most: number },
): Setting {
  let smallest = { lines: [text], size: sizes[0] ?? 0 }
  for (const size of sizes) {
    const lines = breakLines(text, face, width, size)
    const breaksWord = text.split(' ').some((word) => widthOf(word, face, size) > width)
    if (lines.length <= most && !breaksWord)
      return { lines: balance(text, face, width, size, lines), size }
    smallest = { lines, size }
  }
  const { lines, size } = smallest
  if (lines.length <= most) return smallest
  const kept = lines.slice(0, most)
  kept[most - 1] = cut(kept[most - 1] ?? '', face, width, size)
  return { lines: kept, size }
}

/** The same number of lines as even as they come, so that no word is left alone on the last. */
function balance(text: string, face: Face, width: number, size: number, lines: string[]): string[] {
  let even = lines
  for (let narrow = width * 0.95; even.length > 1 && narrow > width / 2; narrow *= 0.95) {
    const tried = breakLines(text, face, narrow, size)
    const splits = text.split(' ').some((word) => widthOf(word, face, size) > narrow)
    if (tried.length > lines.length || splits) break
    even = tried
  }
  return even
}

/** Ends a line with an ellipsis within the width. */
function cut(line: string, face: Face, width: number, size: number): string {
  const letters = Array.from(segmenter.segment(line), ({ segment }) => segment)
  while (letters.length > 1 && widthOf(`${letters.join('')}…`, face, size) > width) letters.pop()
  return `${letters.join('').trimEnd()}…`
}

function breakLines(text: string, face: Face, width: number, size: number): string[] {
  const lines: string[] = []
  let line = ''
  for (const word of text.split(' ').flatMap((one) => splitWord(one, face, width, size))) {
    const longer = line ? `${line} ${word}` : word
    if (line && widthOf(longer, face, size) > width) {
      lines.push(line)
      line = word
    } else line = longer
  }
  return line ? [...lines, line] : lines
}

function splitWord(word: string, face: Face, width: number, size: number): string[] {
  if (widthOf(word, face, size) <= width) return [word]
  const parts: string[] = []
  let part = ''
  for (const { segment } of segmenter.segment(word)) {
    if (part && widthOf(part + segment, face, size) > width) {
      parts.push(part)
      part = segment
    } else part += segment
  }
  return [...parts, part]
}

const round = (value: number) => Math.round(value * 100) / 100

/**
 * A line of text as the outlines of its letters, so that a picture needs no installed font.
 * @param x of its left end @param y of its baseline
 */
export function outlines(text: string, face: Face, size: number, x: number, y: number): string {
  let path = ''
  let at = x
  for (const run of runsOf(text, face)) {
    const scale = size / unitsOf(run)
    const { glyphs, positions } = run.file.font.layout(run.text)
    glyphs.forEach((glyph, index) => {
      const position = positions[index]!
      const left = at + position.xOffset * scale
      const base = y - position.yOffset * scale
      for (const { command, args } of glyph.path.commands) {
        const points = args.map((value, axis) =>
          round(axis % 2 === 0 ? left + value * scale : base - value * scale),
        )
        path += COMMANDS[command] + points.join(' ')
      }
      at += position.xAdvance * scale
    })
  }
  return path
}

const COMMANDS = {
  moveTo: 'M',
  lineTo: 'L',
  quadraticCurveTo: 'Q',
  bezierCurveTo: 'C',
  closePath: 'Z',
} as const
