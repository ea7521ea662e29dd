import { deltaE00 } from '../color/ciede2000'
import type { Lab } from '../color/types'
import { isVowel, parseSound, respell, symbolOf, type Sound } from './arpabet'
import { COLOR_THINGS, type ThingKind } from './color-things'
import { evokedBy } from './evokes'
import { impliedFibers } from './fiber-words'
import { IDIOMS, type Idiom, type Role } from './idioms'
import { HETERONYMS, SAID_AS, TRADE_PLAY } from './play-words'
import { pronounceWord, rimeOf } from './pronounce'
import { NEAR, readySound, SAME, soundDistance, type ReadySound } from './sound-distance'
import { stemOf, wordsOf } from './words'

/** How the word set in sounds beside the one it replaces. */
export type PlaySound = 'same' | 'near' | 'within' | 'rhyme'

/** A saying with one of its words exchanged for one that suits a shade. */
export interface Play {
  /** as it would be printed, first letter large */
  name: string
  /** the saying as everybody knows it */
  source: string
  swapped: { from: string; to: string }
  /** what the ear takes the new word for: how it is said, and how the old one is */
  heardAs: string
  sound: PlaySound
  /** ΔE00 from the shade to the colour of the word or of what the saying calls to mind; null for neither */
  colorApart: number | null
  why: string
  /** 0–1: sound, how well the saying is known, fit to the shade, each weighed in */
  score: number
}

/** What wordplay is asked for. */
export interface PlayWishes {
  /** the fibres of the yarn, lower case: `['wool', 'silk']` */
  fibers?: readonly string[]
  /** how many results at most; 40 unless told */
  limit?: number
  /** names that the line has already, which are not proposed again */
  taken?: readonly string[]
}

/** A way to say a word, with what is asked of it again and again. */
interface Said {
  sound: Sound
  symbols: readonly string[]
  syllables: number
  rime: string
  ready: ReadySound
}

/** A word in the form in which it is set in. */
interface PlayWord {
  text: string
  stem: string
  roles: ReadonlySet<Role>
  /** the colours it is thought of in, and how much one thinks of it as a colour (0–1) */
  labs: readonly (readonly [lab: Lab, weight: number])[]
  colored: boolean
  fiber: string | null
  said: readonly Said[]
}

/** A word that may be exchanged, wherever it stands in that part. */
interface Slot {
  text: string
  stem: string
  role: Role
  said: readonly Said[]
  /** which idioms it stands in, and at which of their words */
  places: { idiom: number; at: readonly number[] }[]
}

interface Heard {
  slot: Slot
  sound: PlaySound
  /** 0–1: how surely the old word is heard in the new one */
  value: number
  /** 0–1: what is left of the sentence's grammar */
  grammar: number
}

interface ReadyIdiom {
  idiom: Idiom
  stems: ReadonlySet<string>
  /** sounds of each word, for how much of the saying stays */
  lengths: readonly number[]
  total: number
  evoked: readonly (readonly [word: string, lab: Lab])[]
  /** colours it names outright */
  colors: readonly Lab[]
}

const AT_MOST_OF_ONE_IDIOM = 2
/** How often the same word is set in for the same other, and set in at all. */
const AT_MOST_OF_ONE_EXCHANGE = 3
/** What each further name with the same word is worth less, so that a list is not all of thyme. */
const AGAIN = 0.03
/** And with the same saying. */
const AGAIN_OF_IDIOM = 0.08
/** From here on, in ΔE00, a word's colour is another than the shade's. */
const COLOR_FAR = 24
/** What a trade word is worth that suits any shade, beside a colour word that fits. */
const NO_COLOR = 0.3
const MOST_CALLED = 0.9
const WEIGHTS = { sound: 0.44, known: 0.2, fit: 0.31, short: 0.05 }
/** Names up to the first length (letters and spaces) stand well on a ball band; beyond the second, hardly. */
const SHORT = 18
const LONG = 36

/** How readily each kind of thing is thought of as a colour of yarn. */
const AS_COLOR: Record<ThingKind, number> = {
  color: 1,
  dye: 1,
  plant: 1,
  fruit: 1,
  mineral: 0.96,
  metal: 0.96,
  food: 0.96,
  drink: 0.95,
  weather: 0.95,
  fire: 0.95,
  animal: 0.92,
  water: 0.85,
  land: 0.82,
  house: 0.8,
}

const sayings = (sounds: readonly Sound[]): Said[] =>
  sounds.map((sound) => ({
    sound,
    symbols: sound.map(symbolOf),
    syllables: sound.filter(isVowel).length,
    rime: rimeOf(sound),
    ready: readySound(sound),
  }))

const plural = (word: string): string =>
  /[^aeiou]y$/.test(word)
    ? `${word.slice(0, -1)}ies`
    : /(?:s|x|z|ch|sh)$/.test(word)
      ? `${word}es`
      : `${word}s`

const ROLES: Record<(typeof COLOR_THINGS)[number]['grammar'], readonly Role[]> = {
  counted: ['n'],
  uncounted: ['n'],
  color: ['j', 'n'],
  adjective: ['j'],
}

function gatherWords(): PlayWord[] {
  const words = new Map<string, PlayWord & { roles: Set<Role>; labs: [Lab, number][] }>()
  const wordOf = (text: string, fiber: string | null = null) => {
    const known = words.get(text)
    if (known) return known
    const word = {
      text,
      stem: stemOf(text),
      roles: new Set<Role>(),
      labs: [],
      colored: false,
      fiber,
      said: sayings(pronounceWord(text).sounds),
    }
    words.set(text, word)
    return word
  }
  for (const { word, kind, lab, grammar } of COLOR_THINGS)
    for (const text of grammar === 'counted' ? [word, plural(word)] : [word]) {
      const form = wordOf(text)
      form.colored = true
      form.labs.push([lab, AS_COLOR[kind]])
      for (const role of text === word ? ROLES[grammar] : (['ns'] as const)) form.roles.add(role)
    }
  for (const { word, roles, fiber } of TRADE_PLAY)
    for (const role of roles) wordOf(word, fiber).roles.add(role)
  return [...words.values()].filter(
    ({ text, stem }) => !HETERONYMS.has(text) && !HETERONYMS.has(stem),
  )
}

function gatherIdioms(): { idioms: ReadyIdiom[]; slots: Slot[] } {
  const slots = new Map<string, Slot>()
  const labs = new Map<string, Lab[]>()
  const colors = new Map<string, Lab>()
  for (const { word, kind, lab } of COLOR_THINGS) {
    labs.set(word, [...(labs.get(word) ?? []), lab])
    if (kind === 'color') colors.set(word, lab)
  }
  const idioms = IDIOMS.map((idiom, number): ReadyIdiom => {
    const lengths = idiom.words.map(
      ({ text }) => pronounceWord(text.toLowerCase()).sounds[0]!.length,
    )
    const places = new Map<string, number[]>()
    idiom.words.forEach(({ text, role }, place) => {
      if (!role) return
      const key = `${text}:${role}`
      places.set(key, [...(places.get(key) ?? []), place])
      if (slots.has(key)) return
      const sounds = SAID_AS[key] ? [parseSound(SAID_AS[key])] : pronounceWord(text).sounds
      slots.set(key, { text, stem: stemOf(text), role, said: sayings(sounds), places: [] })
    })
    for (const [key, at] of places) slots.get(key)!.places.push({ idiom: number, at })
    return {
      idiom,
      stems: new Set(idiom.words.map(({ text }) => stemOf(text))),
      lengths,
      total: lengths.reduce((sum, length) => sum + length, 0),
      evoked: idiom.words.flatMap(({ text }) =>
        [...evokedBy(text), ...(labs.get(text) ?? labs.get(stemOf(text)) ?? [])].map(
          (lab) => [text, lab] as const,
        ),
      ),
      colors: idiom.words.map(({ text }) => colors.get(text)).filter((lab) => lab !== undefined),
    }
  })
  return { idioms, slots: [...slots.values()] }
}

/** The old word whole at the end of the new one, with little before it: olive for live. */
function standsWithin(one: Said, other: Said): boolean {
  const extra = one.symbols.length - other.symbols.length
  if (extra < 1 || extra > 2 || other.symbols.length < 2) return false
  if (extra === 2 && (isVowel(one.symbols[0]!) || isVowel(one.symbols[1]!))) return false
  return other.symbols.every((symbol, at) => symbol === one.symbols[at + extra])
}

/** How a word would be heard in the place of another; null when nobody would hear it. */
function hear(
  word: PlayWord,
  slot: Slot,
): (Pick<Heard, 'sound' | 'value'> & { apart: number }) | null {
  let apart = Infinity
  let sameLength = false
  let rhymes = false
  let within = false
  for (const one of word.said)
    for (const other of slot.said) {
      if (Math.abs(one.sound.length - other.sound.length) > 2) continue
      apart = Math.min(apart, soundDistance(one.ready, other.ready))
      if (one.syllables === other.syllables) {
        sameLength = true
        rhymes ||= one.rime === other.rime
      }
      within ||= standsWithin(one, other)
    }
  if (apart <= SAME) return { sound: 'same', value: 1, apart }
  // What is heard and seen in the new word is not lost: the o before live, the s before late.
  if (within && slot.text.length >= 3 && word.text.endsWith(slot.text))
    return { sound: 'within', value: 0.85, apart }
  // Whoever hears the end of a word knows how it began: pine for nine, call it a grey.
  const rhyme = rhymes && apart <= 0.45 ? 0.92 - 0.65 * apart : 0
  const near =
    apart <= NEAR && sameLength ? 0.97 - 1.3 * apart - 2.5 * Math.max(0, apart - 0.12) : 0
  if (near > 0) return { sound: 'near', value: Math.max(near, rhyme), apart }
  if (rhyme > 0) return { sound: 'rhyme', value: rhyme, apart }
  if (within && apart < 0.3) return { sound: 'within', value: 0.55, apart }
  return null
}

/**
 * What is left of the grammar when a word does not play the part of the one it replaces: where the
 * ear hears the old word anyway, much; where it only hears a rhyme, nothing.
 */
function grammarOf(word: PlayWord, slot: Slot, sound: PlaySound, apart: number): number {
  if (word.roles.has(slot.role)) return 1
  if (sound === 'same') return 0.97
  if (sound === 'rhyme') return 0
  // A thing stands before a noun as well as an adjective does: a tin box.
  if (slot.role === 'j' && word.colored && word.roles.has('n')) return 0.98
  if (sound === 'within') return word.roles.has('n') ? 0.93 : 0.82
  return 0.95 - 0.8 * apart
}

interface Lists {
  words: readonly PlayWord[]
  idioms: readonly ReadyIdiom[]
  slots: readonly Slot[]
  heard: Map<PlayWord, readonly Heard[]>
}
let gathered: Lists | null = null

/** All that does not depend on the shade, made once when first asked for. */
function lists(): Lists {
  gathered ??= { words: gatherWords(), ...gatherIdioms(), heard: new Map() }
  return gathered
}

function heardOf(word: PlayWord): readonly Heard[] {
  const { slots, heard } = lists()
  const known = heard.get(word)
  if (known) return known
  const found: Heard[] = []
  for (const slot of slots) {
    if (slot.stem === word.stem || slot.text.includes(word.text)) continue
    const fit = hear(word, slot)
    const grammar = fit ? grammarOf(word, slot, fit.sound, fit.apart) : 0
    if (fit && grammar > 0) found.push({ slot, sound: fit.sound, value: fit.value, grammar })
  }
  heard.set(word, found)
  return found
}

const clamp = (value: number): number => Math.max(0, Math.min(1, value))
const fitOf = (apart: number): number => clamp(1 - apart / COLOR_FAR)

/** A word that has, or calls to mind, a colour near the shade. */
interface Near {
  word: string
  apart: number
}

const nearestEvoked = (evoked: ReadyIdiom['evoked'], shade: Lab): Near | null =>
  evoked.reduce<Near | null>((best, [word, lab]) => {
    const apart = deltaE00(lab, shade)
    return apart < (best?.apart ?? COLOR_FAR) ? { word, apart } : best
  }, null)

/** The saying with a word set in at these places; `a` and `an` follow the ear. */
function setIn(idiom: Idiom, places: readonly number[], { text, said }: PlayWord): string {
  const texts = idiom.words.map((word, at) => (places.includes(at) ? text : word.text))
  for (const place of places) {
    const before = texts[place - 1]
    if (before === 'a' || before === 'an')
      texts[place - 1] = isVowel(said[0]!.sound[0]!) ? 'an' : 'a'
  }
  const name = texts.join(' ')
  return name[0]!.toUpperCase() + name.slice(1)
}

const SOUNDS_LIKE: Record<PlaySound, string> = {
  same: 'sounds just like',
  near: 'sounds nearly like',
  within: 'has the whole of it within, like',
  rhyme: 'rhymes with',
}

interface Candidate {
  heard: Heard
  word: PlayWord
  at: number
  places: readonly number[]
  colored: number | null
  called: Near | null
  score: number
}

/**
 * Familiar sayings with a word exchanged for a colour or trade word that suits a shade (Lab D65),
 * best first: by how alike they sound, how near the word's colour, or what the saying calls to mind,
 * is to the shade, how well the saying is known, and how short the name is. At most two results of
 * one saying. Nothing that implies a fibre the yarn does not hold, and no word that can be read in
 * two ways. The first call of a process takes longer: it listens to all words that suit the shade.
 */
export function playOnWords(
  shade: Lab,
  { fibers = ['wool'], limit = 40, taken = [] }: PlayWishes = {},
): Play[] {
  const { words, idioms } = lists()
  const called = idioms.map(({ evoked }) => nearestEvoked(evoked, shade))
  // A saying that names another colour would contradict the yarn.
  const contradicts = idioms.map(({ colors }) =>
    colors.some((color) => deltaE00(color, shade) > COLOR_FAR),
  )
  const candidates: Candidate[] = []
  for (const word of words) {
    if (word.fiber && !fibers.includes(word.fiber)) continue
    let colored: number | null = null
    let ownFit = 0
    for (const [lab, weight] of word.labs) {
      const apart = deltaE00(lab, shade)
      ownFit = Math.max(ownFit, weight * fitOf(apart))
      colored = Math.min(colored ?? Infinity, apart)
    }
    if (word.colored && ownFit === 0) continue
    for (const heard of heardOf(word))
      for (const { idiom: at, at: everywhere } of heard.slot.places) {
        const { idiom, stems, lengths, total } = idioms[at]!
        if (contradicts[at] || stems.has(word.stem)) continue
        const near = word.colored ? null : called[at]!
        const fit = word.colored
          ? ownFit
          : NO_COLOR + (near ? (MOST_CALLED - NO_COLOR) * fitOf(near.apart) : 0)
        const short = clamp((LONG - idiom.phrase.length) / (LONG - SHORT))
        for (const places of everywhere.length > 1
          ? [everywhere, everywhere.slice(0, 1)]
          : [everywhere]) {
          const kept = 1 - places.reduce((sum, place) => sum + lengths[place]!, 0) / total
          // What sounds just alike needs nothing of the rest; a rhyme lives by it.
          const carried = heard.sound === 'same' ? 1 : Math.min(1, 0.55 + 0.75 * kept)
          const half = places.length < everywhere.length && heard.sound === 'same' ? 0.95 : 1
          const score =
            half *
            heard.grammar *
            (WEIGHTS.sound * heard.value * carried +
              WEIGHTS.known * ((idiom.known - 1) / 2) +
              WEIGHTS.fit * fit +
              WEIGHTS.short * short)
          candidates.push({ heard, word, at, places, colored, called: near, score })
        }
      }
  }
  const names = taken.map((name) => new Set(wordsOf(name)))
  const left = candidates.filter(({ word, at, places }) => {
    const { idiom } = idioms[at]!
    const others = idiom.words.filter((_, place) => !places.includes(place))
    return !names.some(
      (name) => name.has(word.text) && others.every(({ text }) => name.has(text.toLowerCase())),
    )
  })
  return choose(left, limit, fibers)
}

function present({
  heard: { slot, sound },
  word,
  at,
  places,
  colored,
  called,
  score,
}: Candidate): Play {
  const { idiom } = lists().idioms[at]!
  const alike = `“${word.text}” ${SOUNDS_LIKE[sound]} “${slot.text}”`
  const suits =
    colored !== null
      ? `; its colour is ΔE00 ${colored.toFixed(0)} from the shade.`
      : called
        ? `; “${called.word}” calls to mind a colour ΔE00 ${called.apart.toFixed(0)} from the shade.`
        : '; a word of the trade, it suits any shade.'
  return {
    name: setIn(idiom, places, word),
    source: idiom.phrase,
    swapped: { from: slot.text, to: word.text },
    heardAs: `“${word.text}” (${respell(word.said[0]!.sound)}) for “${slot.text}” (${respell(slot.said[0]!.sound)})`,
    sound,
    colorApart: colored ?? called?.apart ?? null,
    why: alike + suits,
    score,
  }
}

/** The best, each worth a little less for every one chosen before it that set in the same word. */
function choose(candidates: Candidate[], limit: number, fibers: readonly string[]): Play[] {
  const ranked = candidates.sort(
    (a, b) => b.score - a.score || a.at - b.at || (a.word.text < b.word.text ? -1 : 1),
  )
  const chosen: Play[] = []
  const done = new Set<Candidate>()
  const counts = new Map<string, number>()
  const count = (key: string): number => counts.get(key) ?? 0
  const exchangeOf = ({ heard, word }: Candidate) => `${heard.slot.stem} for ${word.stem}`
  while (chosen.length < limit) {
    let best: Candidate | null = null
    let worth = -Infinity
    for (const candidate of ranked) {
      if (candidate.score <= worth) break
      if (done.has(candidate)) continue
      const now =
        candidate.score -
        AGAIN * count(candidate.word.stem) -
        AGAIN_OF_IDIOM * count(`idiom ${candidate.at}`)
      if (now <= worth) continue
      if (count(`idiom ${candidate.at}`) >= AT_MOST_OF_ONE_IDIOM) continue
      if (count(exchangeOf(candidate)) >= AT_MOST_OF_ONE_EXCHANGE) continue
      worth = now
      best = candidate
    }
    if (!best) break
    done.add(best)
    const play = present(best)
    // Sayings grow out of each other: rags to riches, from rags to riches.
    const fresh = chosen.every(
      ({ name }) => !contains(name, play.name) && !contains(play.name, name),
    )
    if (!fresh || impliedFibers(play.name, fibers).length > 0) continue
    chosen.push(play)
    for (const key of [`idiom ${best.at}`, exchangeOf(best), best.word.stem])
      counts.set(key, count(key) + 1)
  }
  return chosen
}

const contains = (name: string, part: string): boolean =>
  ` ${name.toLowerCase()} `.includes(` ${part.toLowerCase()} `)
