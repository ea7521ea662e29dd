import { SMALL_WORDS } from './words'

/** What a font says of its letters, in its own units. */
export interface FontMetrics {
  unitsPerEm: number
  /** the advance of a character (one code point); null when the font has no such letter */
  advance: (character: string) => number | null
  /** what is added between two letters, mostly negative */
  kerning: (left: string, right: string) => number
}

/** How a name is set on the ball band. */
export interface LabelSetting {
  /** mm */
  width: number
  /** pt, 1/72 inch */
  size: number
  /** how many lines there is room for */
  lines: 1 | 2
}

/** A ball band of common size. */
export const DEFAULT_LABEL: LabelSetting = { width: 58, size: 15, lines: 2 }

/** A name as it stands on the ball band. */
export interface SetName {
  /** one or two, each with its width in mm */
  lines: { text: string; width: number }[]
  fits: boolean
  /** mm beyond the width, of the longest line; 0 when it fits */
  over: number
  /** letters that the font does not have, each once */
  missing: string[]
}

const MM_PER_POINT = 25.4 / 72

/** The width of one line, in mm, with kerning; a letter that the font lacks counts as an em. */
export function lineWidth(text: string, font: FontMetrics, size: number): number {
  const characters = [...text]
  const units = characters.reduce((sum, character, at) => {
    const kern = at > 0 ? font.kerning(characters[at - 1]!, character) : 0
    return sum + kern + (font.advance(character) ?? font.unitsPerEm)
  }, 0)
  return (units / font.unitsPerEm) * size * MM_PER_POINT
}

/** A line that ends on “of the” reads badly: so much more width is put up with to avoid it. */
const DANGLING = 1.15

/**
 * Sets a name on a ball band: on one line when it fits, else broken between words into two as even
 * as can be, never hyphenated. Throws RangeError for a setting that is not positive.
 */
export function setOnLabel(name: string, font: FontMetrics, setting: LabelSetting): SetName {
  if (!(setting.width > 0) || !(setting.size > 0))
    throw new RangeError(`A band ${setting.width} mm wide set in ${setting.size} pt cannot be.`)
  const words = name.trim().split(/\s+/)
  const measure = (text: string) => ({ text, width: lineWidth(text, font, setting.size) })
  const missing = [...new Set([...name.trim()].filter((letter) => font.advance(letter) === null))]
  const done = (lines: SetName['lines']): SetName => {
    const over = Math.max(0, ...lines.map(({ width }) => width - setting.width))
    return { lines, fits: over === 0 && missing.length === 0, over, missing }
  }
  const whole = measure(words.join(' '))
  if (whole.width <= setting.width || setting.lines === 1 || words.length === 1)
    return done([whole])
  const breaks = words.slice(1).map((_, before) => {
    const lines = [words.slice(0, before + 1), words.slice(before + 1)].map((part) =>
      measure(part.join(' ')),
    )
    const dangles = SMALL_WORDS.has(words[before]!.toLowerCase()) ? DANGLING : 1
    const widest = Math.max(...lines.map(({ width }) => width))
    return { lines, cost: (widest <= setting.width ? 0 : 1e6) + widest * dangles }
  })
  return done(breaks.reduce((a, b) => (b.cost < a.cost ? b : a)).lines)
}
