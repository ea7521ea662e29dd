import { readFileSync } from 'node:fs'

import { describe, expect, test } from 'vitest'

import { deltaE00 } from '@/lib/color/ciede2000'
import { hexToLab } from '@/lib/color/srgb'
import type { Lab } from '@/lib/color/types'
import { COLOR_THINGS } from '@/lib/naming/color-things'
import { impliedFibers } from '@/lib/naming/fiber-words'
import { IDIOMS } from '@/lib/naming/idioms'
import { playOnWords } from '@/lib/naming/play'
import { HETERONYMS } from '@/lib/naming/play-words'
import { pronounceWord } from '@/lib/naming/pronounce'
import { tellColorStory } from '@/lib/naming/story'

const SHADES: Lab[] = ['#6f7d5a', '#43648f', '#c9566e', '#e8b92a', '#3a2a22', '#8f9193'].map(
  hexToLab,
)
/** The list is large, and the first call listens to all of it. */
const PATIENT = 60_000

describe('sayings', () => {
  test('are at least 500, each once, with at least one word that may be exchanged', () => {
    expect(IDIOMS.length).toBeGreaterThanOrEqual(500)
    expect(new Set(IDIOMS.map(({ phrase }) => phrase)).size).toBe(IDIOMS.length)
    for (const { phrase, words, known } of IDIOMS) {
      expect([1, 2, 3], phrase).toContain(known)
      for (const { text } of words) expect(text, phrase).toMatch(/^[A-Za-z’']+$/)
    }
  })

  test('have parts of speech that there are', () => {
    const roles = new Set(IDIOMS.flatMap(({ words }) => words.map(({ role }) => role)))
    expect([...roles].filter(Boolean).sort()).toEqual(
      ['j', 'n', 'ns', 'r', 'v', 'vd', 'vg', 'vn', 'vz', 'x'].sort(),
    )
  })

  test('things with a colour can be said without guessing', () => {
    const guessed = COLOR_THINGS.filter(({ word }) => pronounceWord(word).source === 'guess')
    expect(guessed.map(({ word }) => word)).toEqual([])
  })
})

describe('wordplay', () => {
  test(
    'finds what must be found among the first twenty',
    () => {
      const { plays } = JSON.parse(
        readFileSync('tests/fixtures/naming/must-find.json', 'utf8'),
      ) as { plays: { phrase: string; source: string; lab: Lab }[] }
      for (const { phrase, source, lab } of plays) {
        const found = playOnWords(lab, { limit: 20 })
        const play = found.find(({ name }) => name.toLowerCase() === phrase)
        expect(play?.source, phrase).toBe(source)
      }
    },
    PATIENT,
  )

  test(
    'takes no more than two of one saying, sets in no word of two readings, and implies no fibre',
    () => {
      for (const lab of SHADES) {
        const plays = playOnWords(lab, { limit: 60 })
        expect(plays).toHaveLength(60)
        for (const { source } of plays)
          expect(plays.filter((one) => one.source === source).length).toBeLessThanOrEqual(2)
        for (const { name, swapped } of plays) {
          expect(HETERONYMS.has(swapped.to), name).toBe(false)
          expect(impliedFibers(name, ['wool']), name).toEqual([])
          expect(name.toLowerCase(), name).toContain(swapped.to)
        }
      }
    },
    PATIENT,
  )

  test(
    'a colour word is never far from the shade',
    () => {
      for (const lab of SHADES)
        for (const { swapped, name } of playOnWords(lab)) {
          const labs = COLOR_THINGS.filter(
            ({ word }) => swapped.to === word || swapped.to === `${word}s`,
          ).map((thing) => deltaE00(thing.lab, lab))
          if (labs.length > 0) expect(Math.min(...labs), name).toBeLessThan(24)
        }
    },
    PATIENT,
  )

  test(
    'a fibre is played on only where the yarn holds it',
    () => {
      const silver = hexToLab('#c2c5c8')
      const words = (fibers: string[]) =>
        playOnWords(silver, { fibers, limit: 2000 }).map(({ swapped }) => swapped.to)
      expect(words(['cotton'])).not.toContain('wool')
      expect(words(['wool'])).not.toContain('silk')
      expect(words(['wool'])).toContain('fleece')
    },
    PATIENT,
  )

  test(
    'the article follows the ear, and names that the line has are not proposed again',
    () => {
      const pale = hexToLab('#d9dcdd')
      const first = playOnWords(pale, { limit: 10 })
      const again = playOnWords(pale, { limit: 10, taken: [first[0]!.name] })
      expect(again.map(({ name }) => name)).not.toContain(first[0]!.name)
      for (const { name } of playOnWords(hexToLab('#69502f'), { limit: 200 }))
        expect(name).not.toMatch(
          /\ba (?:oak|umber|olive|otter|owl|acorn)\b|\ban (?:yew|ewe|plum)\b/i,
        )
    },
    PATIENT,
  )

  test(
    'the same shade gives the same names',
    () => {
      expect(playOnWords(SHADES[0]!)).toEqual(playOnWords(SHADES[0]!))
    },
    PATIENT,
  )
})

describe('the colour story', () => {
  test('names things near the shade, with the words of the line’s world', () => {
    const names = tellColorStory(hexToLab('#6f7f36'), { themes: ['harbour'], limit: 20 })
    expect(names).toHaveLength(20)
    expect(new Set(names.map(({ name }) => name)).size).toBe(20)
    expect(names.some(({ name }) => name.includes('Harbour'))).toBe(true)
    for (const { colorApart } of names) expect(colorApart).toBeLessThan(16)
  })

  test('speaks of no thing more than three times', () => {
    for (const lab of SHADES) {
      const things = tellColorStory(lab, { limit: 40 }).flatMap(({ things: those }) => those)
      for (const thing of things)
        expect(things.filter((one) => one === thing).length, thing).toBeLessThanOrEqual(3)
    }
  })
})
