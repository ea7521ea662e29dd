import { isVowel } from './arpabet'
import type { Idiom } from './idioms'
import { playLists, type PlayWord, type Said, type Slot } from './play-lists'
import { SAME, soundCost } from './sound-distance'

/** How the word set in sounds beside the one it replaces. */
export type PlaySound = 'same' | 'near' | 'within' | 'rhyme'

/** Whether a saying is whole with a word at these of its places. */
export type Whole = (idiom: Idiom, places: readonly number[]) => boolean

/** A word in the place of another, as it is heard. */
export interface Heard {
  slot: Slot
  sound: PlaySound
  /** 0–1: how surely the old word is heard in the new one by itself */
  value: number
  /** no more than one sound differs, whichever it is */
  oneSound: boolean
  /** 0–1: what is left of the sentence's grammar */
  grammar: number
  /** where else the sentence is whole though the word plays another part; null when nowhere */
  otherwise: Whole | null
}

/** What the difference may cost in whole sounds ({@link soundCost}) for a word to be heard at all. */
const MOST = 1
/** And for one that carries no sense by itself, or is two. */
const MOST_OF_SMALL = 0.45
/** A difference of this much is a slip of one sound: tide and dyed; in more syllables, of two. */
const SLIP = 0.42
const SLIP_OF_MORE = 0.55
/** What a word is heard more surely in one that has all its consonants: wait in wheat. */
const OF_CONSONANTS = 0.08
/** How surely one is heard whose only vowel is quite another, where the eye helps: rise in rose. */
const OF_VOWEL = 0.68
/** How surely a word is heard in one that has another consonant within. */
const OF_ONE_WITHIN = 0.7
/** Words of this many sounds hide a slip no better and no worse than others. */
const USUAL = 3.5

/** What is left of a difference in a word of so many sounds: long words hide more. */
const inWordOf = (cost: number, sounds: number): number => cost / (0.6 + (0.4 * sounds) / USUAL)

/** The old word whole at the end of the new one, with little before it: olive for live. */
function standsWithin(one: Said, other: Said): boolean {
  const extra = one.symbols.length - other.symbols.length
  if (extra < 1 || extra > 2 || other.symbols.length < 2) return false
  if (extra === 2 && one.symbols.slice(0, extra).some(isVowel) && other.syllables < 2) return false
  return other.symbols.every((symbol, at) => symbol === one.symbols[at + extra])
}

/** The old word whole at the beginning of the new one: newt for new, raisin for raise. */
const beginsWith = (one: Said, other: Said): boolean =>
  one.symbols.length > other.symbols.length &&
  other.symbols.every((symbol, at) => symbol === one.symbols[at])

/** The new word has lost no more than one consonant of the old one, at the beginning. */
const dropsFirst = (one: Said, other: Said): boolean =>
  one.symbols.length + 1 === other.symbols.length &&
  !isVowel(other.symbols[0]!) &&
  one.symbols.every((symbol, at) => symbol === other.symbols[at + 1])

/** One sound exchanged, or one more or less at the beginning. */
function differsInOne(one: Said, other: Said): boolean {
  const [long, short] =
    one.symbols.length > other.symbols.length
      ? [one.symbols, other.symbols]
      : [other.symbols, one.symbols]
  if (long.length === short.length)
    return long.filter((symbol, at) => symbol !== short[at]).length <= 1
  return long.length === short.length + 1 && short.every((symbol, at) => symbol === long[at + 1])
}

/** A consonant exchanged within a word of more than one syllable, which begins as it did: ochre, over. */
const differsWithin = (one: Said, other: Said): boolean =>
  one.syllables > 1 &&
  one.symbols[0] === other.symbols[0] &&
  one.syllables === other.syllables &&
  differsInOne(one, other)

const consonantsOf = ({ symbols }: Said): string =>
  symbols.filter((symbol) => !isVowel(symbol)).join(' ')

/** All the consonants are the same, and two at least. */
const keepsConsonants = (one: Said, other: Said): boolean =>
  consonantsOf(one) === consonantsOf(other) && consonantsOf(one).includes(' ')

/** How alike two words look, 0–1: whoever reads coral for moral has seen most of it before. */
function looksAlike(one: string, other: string): number {
  let row = Array.from({ length: other.length + 1 }, (_, at) => at)
  for (let i = 1; i <= one.length; i++) {
    const next = [i]
    for (let j = 1; j <= other.length; j++)
      next.push(
        Math.min(
          row[j - 1]! + (one[i - 1] === other[j - 1] ? 0 : 1),
          row[j]! + 1,
          next[j - 1]! + 1,
        ),
      )
    row = next
  }
  return 1 - row[other.length]! / Math.max(one.length, other.length)
}

interface Fit {
  sound: PlaySound
  value: number
}

const isTwoAtMost = (bits: number): boolean => {
  const one = bits & (bits - 1)
  return (one & (one - 1)) === 0
}
/** Whoever hears a word in another has most of its sounds: all but two, or the whole of its end. */
const mayBeHeard = (one: Said, other: Said): boolean =>
  (isTwoAtMost(one.has[0] & ~other.has[0]) &&
    isTwoAtMost(one.has[1] & ~other.has[1]) &&
    isTwoAtMost(other.has[0] & ~one.has[0]) &&
    isTwoAtMost(other.has[1] & ~one.has[1])) ||
  one.rime === other.rime

/** How one way to say a word is heard for one way to say the other; null when nobody would hear it. */
function hearOne(word: PlayWord, one: Said, slot: Slot, other: Said): Fit | null {
  const sounds = Math.max(one.symbols.length, other.symbols.length)
  const longer = Math.abs(one.symbols.length - other.symbols.length)
  const small = slot.role === null || slot.role === 'x'
  if (longer > (slot.span === 2 ? 1 : 2)) return null
  const within = slot.span === 1 && differsWithin(one, other)
  const cost = soundCost(one.ready, other.ready, small && !within ? MOST_OF_SMALL : MOST)
  if (cost <= SAME * sounds) return { sound: 'same', value: 1 }
  if (standsWithin(one, other) && slot.span === 1) {
    if (word.text.endsWith(slot.text) && slot.text.length >= 3)
      return { sound: 'within', value: 0.9 }
    if (!small && cost <= 1) return { sound: 'within', value: 0.74 }
  }
  const rhymes = one.syllables === other.syllables && one.rime === other.rime && !small
  if (cost === Infinity && !rhymes) return null
  const alike = looksAlike(word.text, slot.text)
  if (!small && slot.span === 1 && alike >= 0.5 && beginsWith(one, other))
    return { sound: 'within', value: 0.76 }
  if (one.syllables === other.syllables) {
    const apart = inWordOf(cost, sounds)
    if (apart <= (one.syllables > 1 ? SLIP_OF_MORE : SLIP)) {
      // What carries no sense by itself is heard only where hardly anything is changed.
      if (small && !within && apart > (slot.span === 2 ? 0.34 : 0.26)) return null
      const kept = keepsConsonants(one, other) ? OF_CONSONANTS : 0
      return {
        sound: 'near',
        value: Math.min(0.97, 0.97 - 0.6 * apart + kept) + 0.08 * (alike - 0.5),
      }
    }
    if (within) return { sound: 'near', value: OF_ONE_WITHIN + 0.12 * (alike - 0.5) }
    if (small) return null
    if (one.syllables === 1 && alike >= 0.6 && keepsConsonants(one, other))
      return { sound: 'near', value: OF_VOWEL }
    if (rhymes) {
      // Whatever it begins with, whoever hears the end of a word knows how it began.
      const more = 0.06 * (one.syllables - 1) + 0.12 * (alike - 0.5)
      if (dropsFirst(one, other)) return { sound: 'rhyme', value: 0.73 + more }
      return { sound: 'rhyme', value: 0.73 - 0.14 * Math.min(1, apart) + more }
    }
    if (apart <= 0.62 && alike >= 0.4)
      return { sound: 'near', value: 0.9 - 0.6 * apart + 0.12 * (alike - 0.5) }
  }
  return null
}

/** The way in which it is heard best. */
function hear(word: PlayWord, slot: Slot): (Fit & { oneSound: boolean }) | null {
  let best: ReturnType<typeof hear> = null
  for (const one of word.said)
    for (const other of slot.said) {
      if (!mayBeHeard(one, other)) continue
      const fit = hearOne(word, one, slot, other)
      if (fit && fit.value > (best?.value ?? 0))
        best = { ...fit, oneSound: differsInOne(one, other) }
    }
  return best
}

/**
 * What is left of the grammar when a word does not play the part of the one it replaces: where the
 * ear hears the old word anyway, much; where it only hears a rhyme, little.
 */
function grammarOf(word: PlayWord, slot: Slot, { sound, value }: Fit): number {
  if (slot.role && word.roles.has(slot.role)) return 1
  // Done and dun, new and tinted: each can be said of a thing.
  if ((slot.role === 'vn' && word.roles.has('j')) || (slot.role === 'j' && word.roles.has('vn')))
    return 0.97
  if (sound === 'same')
    return !slot.role || slot.role === 'x' ? 0.86 : /^v/.test(slot.role) ? 0.89 : 0.92
  if (sound === 'rhyme') return 0.7
  if (sound === 'within') {
    // Olive for live, which the eye finds too; not blues for lose.
    if (!word.text.includes(slot.text)) return 0.72
    return slot.role && !/^(?:x|v)/.test(slot.role) ? 0.9 : 0.8
  }
  // A sentence without its verb is heard for longer than one without its adjective.
  return (slot.role === 'v' ? 0.15 : 0.25) + 0.52 * value
}

/** A thing before a noun, where an adjective stood: the sun days. */
const beforeNoun: Whole = ({ words }, places) =>
  places.every((place) => /^ns?$/.test(words[place + 1]?.role ?? ''))
/** An adjective after the article, where a thing stood: the dyed. */
const afterThe: Whole = ({ words }, places) =>
  places.every((place) => words[place - 1]?.text === 'the' && !words[place + 1])

function otherwiseWhole({ roles }: PlayWord, { role }: Slot): Whole | null {
  if (role === 'j' && roles.has('n')) return beforeNoun
  if (role === 'n' && (roles.has('vn') || roles.has('j'))) return afterThe
  return null
}

/** A word that is only the other with an ending is no play on it. */
const ENDED = /^(?:s|es|d|ed|ing|y|er|en|n|ly|’s)$/
function sameWord(word: PlayWord, slot: Slot): boolean {
  if (word.stem === slot.stem) return true
  const [long, short] =
    word.text.length > slot.text.length ? [word.text, slot.text] : [slot.text, word.text]
  return short.length >= 3 && long.startsWith(short) && ENDED.test(long.slice(short.length))
}

function listen(word: PlayWord): Heard[] {
  const found: Heard[] = []
  const long = word.said[0]!.syllables > 1
  for (const slot of playLists().slots) {
    if (slot.span === 2 && !long) continue
    const fit = hear(word, slot)
    if (!fit || sameWord(word, slot)) continue
    const grammar = grammarOf(word, slot, fit)
    const otherwise = grammar < 1 ? otherwiseWhole(word, slot) : null
    found.push({ slot, ...fit, grammar, otherwise })
  }
  return found
}

let heard: ReadonlyMap<PlayWord, readonly Heard[]> | null = null

/** Everywhere in our sayings that each word is heard; all are listened for once, when first asked. */
export function allHeard(): ReadonlyMap<PlayWord, readonly Heard[]> {
  heard ??= new Map(playLists().words.map((word) => [word, listen(word)]))
  return heard
}
