import { betweenSymbols, isVowel, PHONEMES, stressOf, symbolOf, type Sound } from './arpabet'

/**
 * Names nearer than this may be taken for each other. Set so that nine in ten slips of the ear that
 * people have written fall within, and hardly any words met at random (`npm run bench -- names`).
 */
export const NEAR = 0.25
/** Nearer than this, most people hear no difference at all. */
export const SAME = 0.02

const codes = new Map(PHONEMES.map((phoneme, code) => [phoneme, code]))
const COUNT = PHONEMES.length
const STRESS_MOVED = 0.06
/** Between vowels without stress there is little to hear. */
const UNSTRESSED = 0.55

const substitution = new Float64Array(COUNT * COUNT)
PHONEMES.forEach((one, i) =>
  PHONEMES.forEach((other, j) => {
    const base = betweenSymbols(symbolOf(one), symbolOf(other))
    const [a, b] = [stressOf(one), stressOf(other)]
    const bothWeak = a === 0 && b === 0
    const moved = a !== null && b !== null && (a === 0) !== (b === 0) ? STRESS_MOVED : 0
    substitution[i * COUNT + j] = (bothWeak ? UNSTRESSED * base : base) + moved
  }),
)
const FLAPPED = 0.05
const T = codes.get('T')!
const D = codes.get('D')!

/** A sound made ready to be compared many times. */
export interface ReadySound {
  /** index into PHONEMES a sound; ER is taken apart into its vowel and its R */
  codes: Uint8Array
  /** what it costs to leave each sound out, or to put it in */
  drop: Float64Array
  /** 1 where T and D are one sound: between vowels, before a weak one */
  flap: Uint8Array
}

/** What the ear makes up for without noticing costs less than a sound that carries a word. */
function dropCost(sounds: Sound, at: number): number {
  const phoneme = sounds[at]!
  const symbol = symbolOf(phoneme)
  const before = sounds[at - 1]
  const after = sounds[at + 1]
  if (isVowel(phoneme)) return stressOf(phoneme) === 0 ? 0.55 : 1
  if (before === phoneme) return 0.1
  if (symbol === 'R' && before && isVowel(before) && !(after && isVowel(after))) return 0.15
  if (symbol === 'HH') return 0.4
  if (symbol === 'Y') return 0.35
  if ((symbol === 'T' || symbol === 'D') && before && !isVowel(before)) return 0.4
  return 0.8
}

/** Throws RangeError for a sound of nothing. */
export function readySound(sound: Sound): ReadySound {
  if (sound.length === 0) throw new RangeError('There is nothing to hear.')
  const sounds = sound.flatMap((phoneme) =>
    symbolOf(phoneme) === 'ER' ? [phoneme, 'R'] : [phoneme],
  )
  const flap = sounds.map((phoneme, at) => {
    const before = sounds[at - 1]
    const after = sounds[at + 1]
    const between = before && after && (isVowel(before) || before === 'R') && isVowel(after)
    return (phoneme === 'T' || phoneme === 'D') && between && stressOf(after) === 0 ? 1 : 0
  })
  return {
    codes: Uint8Array.from(sounds, (phoneme) => codes.get(phoneme)!),
    drop: Float64Array.from(sounds, (_, at) => dropCost(sounds, at)),
    flap: Uint8Array.from(flap),
  }
}

let row: Float64Array = new Float64Array(64)

/**
 * What it takes to turn one sound into the other, in whole sounds: the cheapest way of putting in,
 * leaving out and exchanging, each by how much is heard of it. Symmetric, ≥ 0. Gives up, with
 * Infinity, as soon as it must be more than `most`. Costs n·m.
 * @source weighted edit distance (Wagner & Fischer 1974) over phonetic features, common practice
 */
export function soundCost(one: ReadySound, other: ReadySound, most = Infinity): number {
  const n = one.codes.length
  const m = other.codes.length
  if (row.length <= m) row = new Float64Array(2 * m + 1)
  row[0] = 0
  for (let j = 0; j < m; j++) row[j + 1] = row[j]! + other.drop[j]!
  for (let i = 0; i < n; i++) {
    let diagonal: number = row[0]!
    row[0] = diagonal + one.drop[i]!
    const a = one.codes[i]!
    let least = row[0]!
    for (let j = 0; j < m; j++) {
      const b = other.codes[j]!
      const flapped =
        one.flap[i] === 1 && other.flap[j] === 1 && (a === T || a === D) && (b === T || b === D)
      const exchange = flapped && a !== b ? FLAPPED : substitution[a * COUNT + b]!
      const cost = Math.min(
        diagonal + exchange,
        row[j + 1]! + one.drop[i]!,
        row[j]! + other.drop[j]!,
      )
      diagonal = row[j + 1]!
      row[j + 1] = cost
      if (cost < least) least = cost
    }
    if (least > most) return Infinity
  }
  return row[m]!
}

/**
 * {@link soundCost} per sound of the longer one: 0 alike, {@link NEAR} mistakable, 1 unlike; Infinity
 * when it is certainly more than `most`.
 */
export function soundDistance(one: ReadySound, other: ReadySound, most = Infinity): number {
  const longer = Math.max(one.codes.length, other.codes.length)
  return soundCost(one, other, most * longer) / longer
}
