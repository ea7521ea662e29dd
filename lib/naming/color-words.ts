import { hexToLab } from '../color/srgb'
import type { Lab } from '../color/types'
import { COLOR_THINGS, type ThingKind } from './color-things'
import surveyed from './survey-colors.json'
import { stemOf } from './words'

/** A word, or words that go together, that call a colour to mind. */
export interface ColorWord {
  words: string
  labs: readonly Lab[]
  /** true for places and the like, which have a colour but are not named for it */
  weak: boolean
}

/** The longest name of a colour in the survey has so many words. */
const LONGEST = 3

/** Things that have a colour, but are not named for it: a fell is green, and dark, and a place. */
const WEAK: ReadonlySet<ThingKind> = new Set(['land', 'house', 'water'])

interface Entry {
  labs: Lab[]
  weak: boolean
}

/**
 * Colours by the words for them: what people called colours in a survey of some 200,000 of them, and
 * our own things with a colour, which go before it.
 * @source the 949 names of the xkcd colour survey (2010), dedicated to the public domain (CC0)
 */
const byWords = new Map<string, Entry>(
  Object.entries(surveyed).map(([name, hex]) => [name, { labs: [hexToLab(hex)], weak: false }]),
)
const ours = new Set<string>()
for (const { word, kind, lab } of COLOR_THINGS) {
  const weak = WEAK.has(kind)
  const known = ours.has(word) ? byWords.get(word) : undefined
  byWords.set(word, {
    labs: [...(known?.labs ?? []), lab],
    weak: weak && (known?.weak ?? true),
  })
  ours.add(word)
}

/** What in a name calls a colour to mind, the longest words that go together first; in order. */
export function colorWordsIn(words: readonly string[]): ColorWord[] {
  const found: ColorWord[] = []
  for (let at = 0; at < words.length;) {
    let taken = 0
    for (let length = Math.min(LONGEST, words.length - at); length > 0 && !taken; length--) {
      const as = words.slice(at, at + length)
      const joined = as.join(' ')
      const entry =
        byWords.get(joined) ?? byWords.get([...as.slice(0, -1), stemOf(as.at(-1)!)].join(' '))
      if (!entry) continue
      found.push({ words: joined, ...entry })
      taken = length
    }
    at += Math.max(1, taken)
  }
  return found
}
