import { readFileSync } from 'node:fs'

import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { parseSound, PHONEMES, respell } from '@/lib/naming/arpabet'
import { guessSound } from '@/lib/naming/letters-to-sound'
import { heardApart, pronounceName, pronounceWord, respellName } from '@/lib/naming/pronounce'
import { NEAR, readySound, SAME, soundDistance } from '@/lib/naming/sound-distance'
import { TRADE_WORDS } from '@/lib/naming/trade-words'

const sounds = fc
  .array(fc.constantFrom(...PHONEMES), { minLength: 1, maxLength: 12 })
  .map((sound) => readySound(sound))

describe('the distance between sounds', () => {
  test('is nothing from a sound to itself, and the same both ways', () => {
    fc.assert(
      fc.property(sounds, sounds, (one, other) => {
        expect(soundDistance(one, one)).toBe(0)
        expect(soundDistance(one, other)).toBeCloseTo(soundDistance(other, one), 12)
        expect(soundDistance(one, other)).toBeGreaterThanOrEqual(0)
      }),
    )
  })

  test('a sound of nothing is refused', () => {
    expect(() => readySound([])).toThrow(RangeError)
  })

  test.each([
    ['thyme', 'tyme'],
    ['ewe', 'yew'],
    ['dun', 'done'],
    ['whey', 'way'],
    ['madder', 'matter'],
    ['shore', 'sure'],
    ['plaice', 'place'],
    ['conker', 'conquer'],
  ])('%s and %s sound the same', (one, other) => {
    expect(heardApart(one, other)).toBeLessThanOrEqual(one === 'thyme' ? NEAR : SAME)
  })

  test.each([
    ['skein', 'skin'],
    ['dyed', 'tide'],
    ['heather', 'feather'],
    ['Moss Likely', 'Most Likely'],
    ['Stem the Dyed', 'Stem the Tide'],
  ])('%s and %s sound near', (one, other) => {
    expect(heardApart(one, other)).toBeLessThanOrEqual(NEAR)
  })

  test.each([
    ['cat', 'dog'],
    ['Woad Works Ahead', 'Marmalade Sundays'],
    ['fox', 'hen'],
  ])('%s and %s sound unlike', (one, other) => {
    expect(heardApart(one, other)).toBeGreaterThan(NEAR)
  })

  test('voicing weighs less than manner, and both less than another kind of sound', () => {
    const from = (one: string, other: string) =>
      soundDistance(readySound(parseSound(one)), readySound(parseSound(other)))
    expect(from('P AE1 T', 'B AE1 T')).toBeLessThan(from('P AE1 T', 'M AE1 T'))
    expect(from('P AE1 T', 'M AE1 T')).toBeLessThan(from('P AE1 T', 'AE1 T AE1'))
  })

  test('nine in ten slips of the ear are near', () => {
    const { pairs } = JSON.parse(readFileSync('tests/fixtures/naming/eggcorns.json', 'utf8')) as {
      pairs: [string, string][]
    }
    const near = pairs.filter(([one, other]) => heardApart(one, other) <= NEAR)
    expect(near.length).toBeGreaterThanOrEqual(0.9 * pairs.length)
  })
})

describe('how words are said', () => {
  test('every trade word is written in sounds that there are', () => {
    for (const [word, ways] of Object.entries(TRADE_WORDS))
      for (const way of [ways].flat()) expect(() => parseSound(way), word).not.toThrow()
  })

  test.each([
    ['cochineal', 'trade'],
    ['lamb', 'dictionary'],
    ['heronsway', 'built'],
    ['zblorf', 'guess'],
  ])('%s is known from the %s', (word, source) => {
    expect(pronounceWord(word).source).toBe(source)
  })

  test('accents, punctuation and signs do not change a name’s sound', () => {
    expect(pronounceName('Égg & Spoon!').sounds).toEqual(pronounceName('egg and spoon').sounds)
  })

  test('a guess is never empty, whatever the letters', () => {
    fc.assert(
      fc.property(fc.stringMatching(/^[a-z']{1,14}$/), (word) => {
        expect(guessSound(word).length).toBeGreaterThan(0)
        expect(() => readySound(guessSound(word))).not.toThrow()
      }),
    )
  })

  test('a name with a guessed word says so', () => {
    expect(pronounceName('Plain Ewe').sure).toBe(true)
    expect(pronounceName('Plain Zblorf').sure).toBe(false)
    expect(pronounceName('!!').sounds).toEqual([])
  })

  test('sounds are spelled for readers, the main stress in capitals', () => {
    expect(respell(parseSound('S K EY1 N'))).toBe('skayn')
    expect(respellName(pronounceName('heather skein'))).toBe('HE-thur skayn')
  })
})
