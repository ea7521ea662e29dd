import { dictionary } from 'cmu-pronouncing-dictionary'

import { isVowel, parseSound, respell, symbolOf, type Sound } from './arpabet'
import { guessSound } from './letters-to-sound'
import { readySound, soundDistance, type ReadySound } from './sound-distance'
import { TRADE_WORDS } from './trade-words'
import { SMALL_WORDS, wordsOf } from './words'

/**
 * Whence a pronunciation is: the CMU dictionary, our own list of trade words, put together of words
 * in them (`built`), or guessed by its letters.
 */
export type SoundSource = 'dictionary' | 'trade' | 'built' | 'guess'

/** How a word is said; the commonest way first, never none. */
export interface SpokenWord {
  word: string
  sounds: readonly Sound[]
  source: SoundSource
}

/** How a name is said: its words, and each way to say all of them one after the other. */
export interface SpokenName {
  words: readonly SpokenWord[]
  sounds: readonly Sound[]
  /** false as soon as one word was guessed by its letters */
  sure: boolean
}

/** A name of five words with two ways each need not be said in 32 ways. */
const MOST_WAYS = 4

function lookUp(word: string): SpokenWord | null {
  const trade = Object.hasOwn(TRADE_WORDS, word) ? TRADE_WORDS[word] : undefined
  if (trade) return { word, sounds: [trade].flat().map(parseSound), source: 'trade' }
  if (!Object.hasOwn(dictionary, word)) return null
  const sounds = [parseSound(dictionary[word]!)]
  for (let way = 2; Object.hasOwn(dictionary, `${word}(${way})`); way++)
    sounds.push(parseSound(dictionary[`${word}(${way})`]!))
  return { word, sounds, source: 'dictionary' }
}

const VOICELESS = new Set(['P', 'T', 'K', 'F', 'TH'])
const HISSING = new Set(['S', 'Z', 'SH', 'ZH', 'CH', 'JH'])

/** The sound of a word with the s of its plural, its possessive or its third person. */
export function withS(sound: Sound): Sound {
  const last = symbolOf(sound.at(-1)!)
  return [...sound, ...(HISSING.has(last) ? ['IH0', 'Z'] : VOICELESS.has(last) ? ['S'] : ['Z'])]
}

/** The sound of a word with the ed of its past. */
function withEd(sound: Sound): Sound {
  const last = symbolOf(sound.at(-1)!)
  if (last === 'T' || last === 'D') return [...sound, 'IH0', 'D']
  return [...sound, VOICELESS.has(last) || HISSING.has(last) ? 'T' : 'D']
}

const ENDINGS: readonly [ending: RegExp, say: (sound: Sound) => Sound][] = [
  [/'?s$|es$/, withS],
  [/ed$|d$/, withEd],
  [/ing$/, (sound) => [...sound, 'IH0', 'NG']],
  [/ish$/, (sound) => [...sound, 'IH0', 'SH']],
  [/less$/, (sound) => [...sound, 'L', 'AH0', 'S']],
  [/y$|ie$/, (sound) => [...sound, 'IY0']],
  [/er$/, (sound) => [...sound, 'ER0']],
]

/** A word with an ending, or of two words: heronsway. Parts of two letters say too little. */
function build(word: string): SpokenWord | null {
  for (const [ending, say] of ENDINGS) {
    const bare = word.replace(ending, '')
    if (bare === word || bare.length < 3) continue
    const known = lookUp(bare) ?? lookUp(`${bare}e`) ?? lookUp(bare.replace(/(.)\1$/, '$1'))
    if (known) return { word, sounds: known.sounds.map(say), source: 'built' }
  }
  for (let at = word.length - 3; at >= 3; at--) {
    const first = lookUp(word.slice(0, at))
    const second = first && lookUp(word.slice(at))
    if (!second) continue
    const weaker = second.sounds[0]!.map((phoneme) => phoneme.replace('1', '2'))
    return { word, sounds: [[...first.sounds[0]!, ...weaker]], source: 'built' }
  }
  return null
}

const spoken = new Map<string, SpokenWord>()
/** Names come and go: what was asked long ago may be asked anew. */
const MOST_REMEMBERED = 20_000

/** How one word is said, in lower case without accents (as {@link wordsOf} gives it). */
export function pronounceWord(word: string): SpokenWord {
  const known = spoken.get(word)
  if (known) return known
  const said = lookUp(word) ??
    build(word) ?? { word, sounds: [guessSound(word)], source: 'guess' as const }
  if (spoken.size >= MOST_REMEMBERED) spoken.clear()
  spoken.set(word, said)
  return said
}

/** How a name is said. A name without a letter has no sounds. */
export function pronounceName(text: string): SpokenName {
  const words = wordsOf(text).map(pronounceWord)
  let sounds: Sound[] = words.length > 0 ? [[]] : []
  for (const { word, sounds: ways } of words) {
    // How “the” is said before a vowel tells no names apart.
    const told = SMALL_WORDS.has(word) ? ways.slice(0, 1) : ways
    sounds = sounds.flatMap((before) => told.map((way) => [...before, ...way])).slice(0, MOST_WAYS)
  }
  return { words, sounds, sure: words.every(({ source }) => source !== 'guess') }
}

/** A name as English would spell what is heard: `STEM thuh DYD`. */
export const respellName = ({ words }: SpokenName): string =>
  words.map(({ sounds }) => respell(sounds[0]!)).join(' ')

const heard = new Map<string, readonly ReadySound[]>()

/** {@link pronounceName}, made ready to be compared; remembered. */
export function earOf(text: string): readonly ReadySound[] {
  const known = heard.get(text)
  if (known) return known
  const ready = pronounceName(text).sounds.map(readySound)
  if (heard.size >= MOST_REMEMBERED) heard.clear()
  heard.set(text, ready)
  return ready
}

/**
 * How unlike two names sound, in the way of saying them in which they are nearest: 0 alike, NEAR
 * mistakable; Infinity when one cannot be said at all, or when it is more than `most`.
 */
export function heardApart(one: string, other: string, most = Infinity): number {
  let apart = Infinity
  for (const a of earOf(one))
    for (const b of earOf(other)) apart = Math.min(apart, soundDistance(a, b, most))
  return apart
}

/** From the last stressed vowel on: two words rhyme when theirs are the same. */
export function rimeOf(sound: Sound): string {
  let at = sound.findLastIndex((phoneme) => /[12]$/.test(phoneme))
  if (at < 0) at = sound.findIndex(isVowel)
  return sound.slice(at).map(symbolOf).join(' ')
}
