import type { Lab } from '../color/types'
import { isVowel, parseSound, symbolOf, type Sound } from './arpabet'
import { COLOR_THINGS, type ThingKind } from './color-things'
import { evokedBy } from './evokes'
import { IDIOMS, type Idiom, type Role } from './idioms'
import { ALSO_VERBS, HETERONYMS, NOT_PLAYED, SAID_AS, TRADE_PLAY } from './play-words'
import { pronounceWord, rimeOf } from './pronounce'
import { readySound, type ReadySound } from './sound-distance'
import { SMALL_WORDS, stemOf } from './words'

/** A way to say a word, with what is asked of it again and again. */
export interface Said {
  sound: Sound
  symbols: readonly string[]
  syllables: number
  rime: string
  ready: ReadySound
  /** which sounds it has, a bit each */
  has: readonly [number, number]
}

/** A word in the form in which it is set in. */
export interface PlayWord {
  text: string
  stem: string
  roles: ReadonlySet<Role>
  /** the colours it is thought of in, and how much one thinks of it as a colour (0–1) */
  labs: readonly (readonly [lab: Lab, weight: number])[]
  /** one may say `a` of it: a plum, not a thyme */
  counted: boolean
  fiber: string | null
  /** 0–1: how soon one thinks of yarn, dye or knitting; 0 for a word that is none of the trade */
  trade: number
  said: readonly Said[]
}

/** A word, or two that one word may stand for, wherever they stand in that part. */
export interface Slot {
  text: string
  stem: string
  role: Role | null
  /** 1, or 2 for two words next to each other: turn up, for turnip */
  span: 1 | 2
  said: readonly Said[]
  /** which idioms it stands in, and at which of their words */
  places: { idiom: number; at: readonly number[] }[]
}

/** An idiom, with what does not depend on the shade. */
export interface ReadyIdiom {
  idiom: Idiom
  stems: ReadonlySet<string>
  /** everybody knows it, and it has words enough to be known by when one of them is another */
  firm: boolean
  /** how each word ends */
  rimes: readonly string[]
  /** how much each word tells of which saying it is: little for `the`, much for `glitters` */
  telling: readonly number[]
  evoked: readonly (readonly [word: string, lab: Lab])[]
  /** colours it names outright, each with all the ways it is thought of */
  colors: readonly (readonly Lab[])[]
}

/** How readily each kind of thing is thought of as a colour of yarn. */
const AS_COLOR: Record<ThingKind, number> = {
  color: 1,
  dye: 1,
  plant: 1,
  fruit: 1,
  mineral: 1,
  metal: 0.96,
  food: 0.94,
  drink: 0.9,
  weather: 0.95,
  fire: 0.95,
  animal: 0.88,
  water: 0.88,
  land: 0.82,
  house: 0.8,
}

const BITS = 31
const numbers = new Map<string, number>()
function hasOf(symbols: readonly string[]): [number, number] {
  const has: [number, number] = [0, 0]
  for (const symbol of symbols) {
    const number = numbers.get(symbol) ?? numbers.size
    numbers.set(symbol, number)
    if (number < BITS) has[0] |= 1 << number
    else has[1] |= 1 << (number - BITS)
  }
  return has
}

const saidOf = (sounds: readonly Sound[]): Said[] =>
  sounds.map((sound) => ({
    sound,
    symbols: sound.map(symbolOf),
    syllables: sound.filter(isVowel).length,
    rime: rimeOf(sound),
    ready: readySound(sound),
    has: hasOf(sound.map(symbolOf)),
  }))

const ONE_F = /^(?:leaf|loaf|sheaf)$/
const plural = (word: string): string =>
  /[^aeiou]y$/.test(word)
    ? `${word.slice(0, -1)}ies`
    : ONE_F.test(word)
      ? `${word.slice(0, -1)}ves`
      : /(?:s|x|z|ch|sh)$/.test(word)
        ? `${word}es`
        : `${word}s`

/** The rest of a verb: glowed, glowing; tanned, tanning. */
function verbForms(word: string): [text: string, roles: readonly Role[]][] {
  const bare = /e$/.test(word) ? word.slice(0, -1) : word
  const doubled = /^[^aeiou]*[aeiou][bdgmnpt]$/.test(word) ? `${word}${word.at(-1)}` : bare
  return [
    [word, ['v']],
    [plural(word), ['vz']],
    [`${doubled}ed`, ['vd', 'vn']],
    [`${doubled}ing`, ['vg']],
  ]
}

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
      counted: false,
      fiber,
      trade: 0,
      said: saidOf(pronounceWord(text).sounds),
    }
    words.set(text, word)
    return word
  }
  for (const { word, kind, lab, grammar } of COLOR_THINGS) {
    const forms: [text: string, roles: readonly Role[]][] = [[word, ROLES[grammar]]]
    if (grammar === 'counted' || grammar === 'color') forms.push([plural(word), ['ns']])
    if (ALSO_VERBS.has(word)) forms.push(...verbForms(word))
    for (const [text, roles] of forms) {
      const form = wordOf(text)
      form.counted ||= grammar === 'counted'
      if (!form.labs.some(([known]) => known === lab)) form.labs.push([lab, AS_COLOR[kind]])
      for (const role of roles) form.roles.add(role)
    }
  }
  for (const { word, roles, fiber, near } of TRADE_PLAY) {
    const form = wordOf(word, fiber)
    form.trade = near
    for (const lab of evokedBy(word)) form.labs.push([lab, AS_COLOR.animal])
    form.counted = TRADE_PLAY.some((other) => other.word === plural(word))
    for (const role of roles) form.roles.add(role)
  }
  return [...words.values()].filter(
    ({ text, stem }) =>
      !HETERONYMS.has(text) &&
      !HETERONYMS.has(stem) &&
      !NOT_PLAYED.has(text) &&
      !NOT_PLAYED.has(stem),
  )
}

/** How few sayings hold each word: what is rare tells which saying it is. */
function tellingOf(): (word: string) => number {
  const holds = new Map<string, number>()
  for (const { words } of IDIOMS)
    for (const stem of new Set(words.map(({ text }) => stemOf(text))))
      holds.set(stem, (holds.get(stem) ?? 0) + 1)
  return (word) => Math.log(IDIOMS.length / (holds.get(stemOf(word)) ?? 1))
}

/** What is hung on a word of a saying and stays: the ’s of a stone’s throw. */
export const tailOf = (text: string): string => (text.length > 4 && text.endsWith("'s") ? "'s" : '')

const FIRM_WORDS = 3
/** Two words that one may stand for hold no more sounds than this. */
const MOST_OF_TWO = 7

function gatherIdioms(): { idioms: ReadyIdiom[]; slots: Slot[] } {
  const slots = new Map<string, Slot>()
  const labs = new Map<string, Lab[]>()
  const colors = new Map<string, Lab[]>()
  for (const { word, kind, lab } of COLOR_THINGS) {
    labs.set(word, [...(labs.get(word) ?? []), lab])
    if (kind === 'color') colors.set(word, [...(colors.get(word) ?? []), lab])
  }
  const telling = tellingOf()
  const soundsOf = ({ text, role }: Idiom['words'][number]): readonly Sound[] => {
    const known = SAID_AS[`${text}:${role}`]
    return known ? [parseSound(known)] : pronounceWord(text.toLowerCase()).sounds
  }
  const slotOf = (text: string, role: Role | null, span: 1 | 2, sounds: () => readonly Sound[]) => {
    const key = `${text}:${role}`
    const known = slots.get(key)
    if (known) return known
    const slot = { text, stem: stemOf(text), role, span, said: saidOf(sounds()), places: [] }
    slots.set(key, slot)
    return slot
  }
  IDIOMS.forEach(({ words }, idiom) => {
    const places = new Map<Slot, number[]>()
    words.forEach((word, at) => {
      const tail = tailOf(word.text)
      const text = word.text.toLowerCase().slice(0, word.text.length - tail.length)
      const role = tail && !SMALL_WORDS.has(text) ? 'n' : word.role
      const slot = slotOf(text, role, 1, () => soundsOf({ text, role }))
      places.set(slot, [...(places.get(slot) ?? []), at])
      const next = words[at + 1]
      if (!next) return
      const both = [...soundsOf(word)[0]!, ...soundsOf(next)[0]!]
      if (both.length > MOST_OF_TWO) return
      places.set(
        slotOf(`${word.text} ${next.text}`.toLowerCase(), null, 2, () => [both]),
        [at],
      )
    })
    for (const [slot, at] of places) slot.places.push({ idiom, at })
  })
  const idioms = IDIOMS.map((idiom): ReadyIdiom => ({
    idiom,
    stems: new Set(idiom.words.map(({ text }) => stemOf(text))),
    firm: idiom.known === 3 && idiom.words.length >= FIRM_WORDS,
    rimes: idiom.words.map((word) => rimeOf(soundsOf(word)[0]!)),
    telling: idiom.words.map(({ text }) => telling(text)),
    evoked: idiom.words.flatMap(({ text }) =>
      [...evokedBy(text), ...(labs.get(text) ?? labs.get(stemOf(text)) ?? [])].map(
        (lab) => [text, lab] as const,
      ),
    ),
    colors: idiom.words.map(({ text }) => colors.get(text)).filter((known) => known !== undefined),
  }))
  return { idioms, slots: [...slots.values()] }
}

interface Lists {
  words: readonly PlayWord[]
  idioms: readonly ReadyIdiom[]
  slots: readonly Slot[]
}
let gathered: Lists | null = null

/** All that does not depend on the shade, made once when first asked for. */
export function playLists(): Lists {
  gathered ??= { words: gatherWords(), ...gatherIdioms() }
  return gathered
}
