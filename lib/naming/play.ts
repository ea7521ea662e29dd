import { deltaE00 } from '../color/ciede2000'
import type { Lab } from '../color/types'
import { isVowel, respell } from './arpabet'
import { impliedFibers } from './fiber-words'
import type { Idiom } from './idioms'
import { allHeard, type Heard, type PlaySound } from './play-hearing'
import { playLists, tailOf, type PlayWord, type ReadyIdiom, type Slot } from './play-lists'
import { wordsOf } from './words'

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

const AT_MOST_OF_ONE_IDIOM = 2
/**
 * What a name is worth less for each of the last few chosen that set in the same word, so that a list
 * is not all of thyme, and yet has much of it where the shade is thyme.
 */
const AGAIN = 0.03
const LAST_FEW = 7
/** With the same word in the place of the same other. */
const AGAIN_OF_EXCHANGE = 0.03
/** Within so much, in ΔE00, a word is the shade's own, and held back less the nearer it is; so little at least. */
const OWN = 8
const HELD_BACK = 0.15
/** Of so many names that follow each other so many at most make the same exchange, unless no ear can tell. */
const AMONG = 20
const OF_ONE_EXCHANGE = 5
/** The first of a list are what most people read: all are English, and no more than so many of one word. */
const FIRST = 10
const OF_ONE_WORD = 3
const READS = 0.85
/** And with the same saying. */
const AGAIN_OF_IDIOM = 0.08
/** What each further word is worth less that is of the trade and not of the shade. */
const AGAIN_OF_TRADE = 0.025
/** What a word is worth less for every name of the line that has it, and how much less at most. */
const TAKEN = 0.015
const MOST_TAKEN = 0.09
/** From here on, in ΔE00, a word's colour is another than the shade's. */
const COLOR_FAR = 20
/** The very colour is worth more than one beside it by more than in proportion. */
const NEARER = 2
/** From here on a colour that the saying names is not the shade's. */
const CONTRADICTS = 14
/** What a trade word is worth that suits any shade, beside a colour word that fits. */
const NO_COLOR = 0.3
const MOST_CALLED = 0.9
/** What a shade's own turn among names that suit any shade may be worth. */
const TURN = 0.16
const WEIGHTS = { heard: 0.34, known: 0.2, fit: 0.5, short: 0.1, rhymes: 0.06 }
const MOST_SCORE = Object.values(WEIGHTS).reduce((sum, weight) => sum + weight)
/** Names up to the first length (letters and spaces) stand well on a ball band; beyond the second, hardly. */
const SHORT = 12
const LONG = 40
/** Less than the first tells no saying apart (`over the …`), more than the second is known at once. */
const TELLS_NOTHING = 4
const TELLS_ALL = 11
const SAID_TWICE = 4
/**
 * How much of a saying of some words that everybody knows is known beyond what its words tell: where one
 * sound is another, and where more are.
 */
const FIRM = 0.9
const FIRM_OF_MORE = 0.5
/** And of a shorter one. */
const KNOWN_SHORT = 0.35
/** How much a wrong part of speech still matters in such a saying, where one sound is another. */
const PUT_UP_WITH = 0.1
/** Below this a name is not worth reading. */
const HEARD_ENOUGH = 0.5

const clamp = (value: number): number => Math.max(0, Math.min(1, value))
const fitOf = (apart: number): number => clamp(1 - apart / COLOR_FAR) ** NEARER

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
function setIn(
  idiom: Idiom,
  places: readonly number[],
  slot: Slot,
  { text, said }: PlayWord,
): string {
  const texts: (string | null)[] = idiom.words.map((word, at) => {
    if (places.includes(at)) return text + tailOf(word.text)
    return slot.span === 2 && places.includes(at - 1) ? null : word.text
  })
  for (const place of places) {
    const before = texts[place - 1]
    if (before === 'a' || before === 'an')
      texts[place - 1] = isVowel(said[0]!.sound[0]!) ? 'an' : 'a'
  }
  const name = texts.filter((word) => word !== null).join(' ')
  return name[0]!.toUpperCase() + name.slice(1)
}

/** The new word rhymes with one that stays, as a saying should: teal the deal. */
const rhymesOn = ({ said }: PlayWord, { rimes }: ReadyIdiom, places: readonly number[]): boolean =>
  rimes.some((rime, at) => rime === said[0]!.rime && !places.includes(at))

/** A word of sense, or one long enough to be heard by itself: over, after. */
const carries = ({ role, said }: Slot): boolean =>
  (role !== null && role !== 'x') || said[0]!.syllables > 1

interface Candidate {
  heard: Heard
  word: PlayWord
  at: number
  places: readonly number[]
  colored: number | null
  called: Near | null
  /** it reads as English, but for a word that sounds just as the right one does */
  reads: boolean
  score: number
}

/** How surely the saying is known in the name: by the new word's sound, and by all that stays. */
function recognised(
  { value, sound, slot, oneSound }: Heard,
  { telling, idiom, firm }: ReadyIdiom,
  places: readonly number[],
) {
  const stays = telling.reduce(
    (sum, tells, at) =>
      places.includes(at) || (slot.span === 2 && places.includes(at - 1)) ? sum : sum + tells,
    0,
  )
  // What is said twice is heard twice: loam sweet loam.
  const twice = places.length > 1 ? SAID_TWICE : 0
  const told = clamp((stays + twice - TELLS_NOTHING) / (TELLS_ALL - TELLS_NOTHING))
  const unsure = 1 - value
  // What everybody knows is known by less of it: hit the woad.
  const whole =
    told +
    (firm ? (oneSound ? FIRM : FIRM_OF_MORE) : idiom.known === 3 ? KNOWN_SHORT : 0) * (1 - told)
  // A rhyme lives by the rest of the saying.
  return value + unsure * (0.45 * whole - (sound === 'rhyme' ? 0.7 : 0.4) * (1 - whole))
}

/** A number of 0–1 that is a shade's own for a name: the same each time, unlike the next shade's. */
function turnOf(shade: Lab, { text }: PlayWord, at: number): number {
  let hash = 2166136261
  for (const part of `${shade.map(Math.round).join()} ${text} ${at}`)
    hash = Math.imul(hash ^ part.charCodeAt(0), 16777619)
  hash ^= hash >>> 15
  return (Math.imul(hash, 2246822519) >>> 8) / 2 ** 24
}

/** `A thyme` is heard, and is no English; before a noun it is: a thyme piece. */
const NOT_COUNTED = 0.8
const countedIn = (word: PlayWord, { words }: Idiom, places: readonly number[]): boolean =>
  word.counted ||
  !word.roles.has('n') ||
  places.every(
    (place) =>
      !/^(?:a|an|one)$/.test(words[place - 1]?.text ?? '') ||
      /^(?:n|ns|j)$/.test(words[place + 1]?.role ?? ''),
  )

/**
 * Familiar sayings with a word exchanged for a colour or trade word that suits a shade (Lab D65),
 * best first: by how surely the saying is heard, how near the word's colour, or what the saying calls
 * to mind, is to the shade, how well the saying is known, and how short the name is. At most two
 * results of one saying; the first ten all read as English. Nothing that implies a fibre the yarn does not hold, and no word that can be
 * read in two ways. The first call of a process takes a second: it listens for every word in every
 * saying.
 */
export function playOnWords(
  shade: Lab,
  { fibers = ['wool'], limit = 40, taken = [] }: PlayWishes = {},
): Play[] {
  const { idioms } = playLists()
  const called = idioms.map(({ evoked }) => nearestEvoked(evoked, shade))
  // A saying that names another colour would contradict the yarn.
  const contradicts = idioms.map(({ colors }) =>
    colors.some((labs) => labs.every((lab) => deltaE00(lab, shade) > CONTRADICTS)),
  )
  const names = taken.map((name) => new Set(wordsOf(name)))
  const candidates: Candidate[] = []
  for (const [word, places] of allHeard()) {
    if (word.fiber && !fibers.includes(word.fiber)) continue
    let colored: number | null = null
    let ownFit = 0
    for (const [lab, weight] of word.labs) {
      const apart = deltaE00(lab, shade)
      ownFit = Math.max(ownFit, weight * fitOf(apart))
      colored = Math.min(colored ?? Infinity, apart)
    }
    if (ownFit === 0 && word.trade === 0) continue
    if (ownFit <= NO_COLOR * word.trade) colored = null
    const times = names.filter((name) => name.has(word.text)).length
    for (const heard of places)
      for (const { idiom: at, at: everywhere } of heard.slot.places) {
        const ready = idioms[at]!
        if (contradicts[at] || ready.stems.has(word.stem)) continue
        const near = colored === null ? called[at]! : null
        const fit =
          colored !== null
            ? ownFit
            : word.trade * (NO_COLOR + (near ? (MOST_CALLED - NO_COLOR) * fitOf(near.apart) : 0))
        const short = clamp((LONG - ready.idiom.phrase.length) / (LONG - SHORT))
        for (const places of placesFor(heard, everywhere)) {
          const parsed = heard.otherwise?.(ready.idiom, places) ? 0.98 : heard.grammar
          // Whoever knows every word of a saying but one puts up with that one.
          const grammar =
            ready.firm && heard.oneSound && heard.sound !== 'within' && carries(heard.slot)
              ? 1 - PUT_UP_WITH * (1 - parsed)
              : parsed
          const known = recognised(heard, ready, places)
          if (known < HEARD_ENOUGH) continue
          const counted = countedIn(word, ready.idiom, places) ? 1 : NOT_COUNTED
          const score =
            grammar *
            counted *
            known *
            (WEIGHTS.heard +
              WEIGHTS.known * ((ready.idiom.known - 1) / 2) +
              WEIGHTS.fit * fit +
              (WEIGHTS.short +
                (colored !== null && rhymesOn(word, ready, places) ? WEIGHTS.rhymes : 0)) *
                short)
          const turn = colored === null ? TURN * turnOf(shade, word, at) : 0
          const worth = score - turn - Math.min(MOST_TAKEN, TAKEN * times)
          candidates.push({
            heard,
            word,
            at,
            places,
            colored,
            called: near,
            reads: parsed * counted >= READS,
            score: worth,
          })
        }
      }
  }
  return choose(withoutTaken(candidates, names), limit, fibers)
}

/** Names that the line does not have: not the same word in the same saying, however it is written. */
function withoutTaken(candidates: Candidate[], names: readonly ReadonlySet<string>[]): Candidate[] {
  if (names.length === 0) return candidates
  const { idioms } = playLists()
  return candidates.filter(({ word, at, places }) => {
    const has = names.filter((name) => name.has(word.text))
    if (has.length === 0) return true
    const others = idioms[at]!.idiom.words.filter((_, place) => !places.includes(place))
    return !has.some((name) => others.every(({ text }) => name.has(text.toLowerCase())))
  })
}

/**
 * Where a word is set in that stands in the saying more than once: everywhere, or only the first time.
 * One that holds the old word needs it after: olive and let live.
 */
function placesFor({ sound }: Heard, everywhere: readonly number[]): (readonly number[])[] {
  if (everywhere.length === 1) return [everywhere]
  const first = everywhere.slice(0, 1)
  return sound === 'within' ? [first] : [everywhere, first]
}

const SOUNDS_LIKE: Record<PlaySound, string> = {
  same: 'sounds just like',
  near: 'sounds nearly like',
  within: 'has the whole of it within, like',
  rhyme: 'rhymes with',
}

function present({ heard, word, at, places, colored, called, score }: Candidate): Play {
  const { idiom } = playLists().idioms[at]!
  const { slot, sound } = heard
  const alike = `“${word.text}” ${SOUNDS_LIKE[sound]} “${slot.text}”`
  const suits =
    colored !== null
      ? `; its colour is ΔE00 ${colored.toFixed(0)} from the shade.`
      : called
        ? `; “${called.word}” calls to mind a colour ΔE00 ${called.apart.toFixed(0)} from the shade.`
        : '; a word of the trade, it suits any shade.'
  return {
    name: setIn(idiom, places, slot, word),
    source: idiom.phrase,
    swapped: { from: slot.text, to: word.text },
    heardAs: `“${word.text}” (${respell(word.said[0]!.sound)}) for “${slot.text}” (${respell(slot.said[0]!.sound)})`,
    sound,
    colorApart: colored ?? called?.apart ?? null,
    why: alike + suits,
    score: score / MOST_SCORE,
  }
}

function countIn(lists: readonly (readonly string[])[]): (what: string) => number {
  const counts = new Map<string, number>()
  for (const what of lists.flat()) counts.set(what, (counts.get(what) ?? 0) + 1)
  return (what) => counts.get(what) ?? 0
}

/** The nearer a word's colour, the less it is held back: a shade may have much of its own word. */
const againOf = ({ colored }: Candidate): number =>
  colored === null ? 1 : Math.max(HELD_BACK, Math.min(1, colored / OWN))

/** The best, each worth a little less for every one chosen before it that is like it. */
function choose(candidates: Candidate[], limit: number, fibers: readonly string[]): Play[] {
  const ranked = candidates.sort(
    (a, b) => b.score - a.score || a.at - b.at || (a.word.text < b.word.text ? -1 : 1),
  )
  const chosen: Play[] = []
  const done = new Set<Candidate>()
  const sayings = new Map<number, number>()
  const recent: string[][] = []
  const exchangeOf = ({ heard, word }: Candidate) => `${heard.slot.stem} for ${word.stem}`
  while (chosen.length < limit) {
    let best: Candidate | null = null
    let worth = -Infinity
    const lately = countIn(recent.slice(-LAST_FEW))
    const among = countIn(recent)
    for (const candidate of ranked) {
      if (candidate.score <= worth) break
      const times = sayings.get(candidate.at) ?? 0
      if (done.has(candidate) || times >= AT_MOST_OF_ONE_IDIOM) continue
      const now =
        candidate.score -
        againOf(candidate) *
          (AGAIN * lately(candidate.word.stem) +
            AGAIN_OF_EXCHANGE * lately(exchangeOf(candidate))) -
        AGAIN_OF_IDIOM * times -
        (candidate.colored === null ? AGAIN_OF_TRADE * lately('trade') : 0)
      if (now <= worth) continue
      if (chosen.length < FIRST && (!candidate.reads || among(candidate.word.stem) >= OF_ONE_WORD))
        continue
      if (candidate.heard.sound !== 'same' && among(exchangeOf(candidate)) >= OF_ONE_EXCHANGE)
        continue
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
    sayings.set(best.at, (sayings.get(best.at) ?? 0) + 1)
    recent.push([best.word.stem, exchangeOf(best), ...(best.colored === null ? ['trade'] : [])])
    if (recent.length >= AMONG || chosen.length === FIRST)
      recent.splice(0, chosen.length === FIRST ? FIRST : 1)
  }
  return chosen
}

const contains = (name: string, part: string): boolean =>
  ` ${name.toLowerCase()} `.includes(` ${part.toLowerCase()} `)
