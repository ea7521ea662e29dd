/**
 * The sounds of English in ARPAbet: 24 consonants and 15 vowels, a vowel followed by its stress
 * (0 none, 1 main, 2 lesser): `['S', 'K', 'EY1', 'N']`.
 * @source the phoneme set of the CMU Pronouncing Dictionary
 */
export type Sound = readonly string[]

type Manner = 'stop' | 'affricate' | 'fricative' | 'nasal' | 'liquid' | 'glide'

/** What a consonant is made of: where (0 lips … 7 throat), how, and whether the voice sounds. */
interface Consonant {
  place: number
  manner: Manner
  voiced: boolean
}

/** Where a vowel begins and ends in the mouth: [open 0 – close 1, front 0 – back 1, rounded 0–1]. */
interface Vowel {
  from: readonly [number, number, number]
  to: readonly [number, number, number]
}

const CONSONANTS: Record<string, Consonant> = {
  P: { place: 0, manner: 'stop', voiced: false },
  B: { place: 0, manner: 'stop', voiced: true },
  M: { place: 0, manner: 'nasal', voiced: true },
  W: { place: 0, manner: 'glide', voiced: true },
  F: { place: 1, manner: 'fricative', voiced: false },
  V: { place: 1, manner: 'fricative', voiced: true },
  TH: { place: 2, manner: 'fricative', voiced: false },
  DH: { place: 2, manner: 'fricative', voiced: true },
  T: { place: 3, manner: 'stop', voiced: false },
  D: { place: 3, manner: 'stop', voiced: true },
  S: { place: 3, manner: 'fricative', voiced: false },
  Z: { place: 3, manner: 'fricative', voiced: true },
  N: { place: 3, manner: 'nasal', voiced: true },
  L: { place: 3, manner: 'liquid', voiced: true },
  SH: { place: 4, manner: 'fricative', voiced: false },
  ZH: { place: 4, manner: 'fricative', voiced: true },
  CH: { place: 4, manner: 'affricate', voiced: false },
  JH: { place: 4, manner: 'affricate', voiced: true },
  R: { place: 4, manner: 'liquid', voiced: true },
  Y: { place: 5, manner: 'glide', voiced: true },
  K: { place: 6, manner: 'stop', voiced: false },
  G: { place: 6, manner: 'stop', voiced: true },
  NG: { place: 6, manner: 'nasal', voiced: true },
  HH: { place: 7, manner: 'fricative', voiced: false },
}

const still = (open: number, back: number, round: number): Vowel => ({
  from: [open, back, round],
  to: [open, back, round],
})

const VOWELS: Record<string, Vowel> = {
  IY: still(1, 0, 0),
  IH: still(0.82, 0.15, 0),
  EY: { from: [0.65, 0.05, 0], to: [0.9, 0.1, 0] },
  EH: still(0.45, 0.1, 0),
  AE: still(0.15, 0.15, 0),
  AA: still(0, 0.75, 0),
  AO: still(0.2, 0.9, 0.5),
  OW: { from: [0.5, 0.85, 0.7], to: [0.85, 0.9, 1] },
  UH: still(0.78, 0.75, 0.6),
  UW: still(1, 0.9, 1),
  AH: still(0.4, 0.6, 0),
  ER: still(0.5, 0.45, 0.1),
  AY: { from: [0.05, 0.5, 0], to: [0.88, 0.15, 0] },
  AW: { from: [0.05, 0.5, 0], to: [0.85, 0.8, 0.8] },
  OY: { from: [0.35, 0.85, 0.7], to: [0.85, 0.15, 0] },
}

/** A sound without its stress: `EY1` is `EY`. */
export const symbolOf = (phoneme: string): string => phoneme.replace(/\d$/, '')

/** The stress of a vowel, 0–2; null for a consonant. */
export const stressOf = (phoneme: string): number | null => {
  const mark = phoneme.charCodeAt(phoneme.length - 1) - 48
  return mark >= 0 && mark <= 2 ? mark : null
}

export const isVowel = (phoneme: string): boolean => symbolOf(phoneme) in VOWELS

/**
 * Reads ARPAbet as dictionaries print it, without what they remark after a `#`. Throws RangeError at
 * a sound that there is not.
 */
export function parseSound(text: string): Sound {
  return text
    .replace(/\s*#.*$/, '')
    .split(' ')
    .map((phoneme) => {
      const symbol = symbolOf(phoneme)
      if (!(symbol in VOWELS) && !(symbol in CONSONANTS))
        throw new RangeError(`“${phoneme}” is not a sound of ARPAbet.`)
      return phoneme
    })
}

const MANNERS: readonly Manner[] = ['stop', 'affricate', 'fricative', 'nasal', 'liquid', 'glide']
/** How unlike two manners are, in the order above; symmetric. */
const BETWEEN_MANNERS = [
  [0, 0.2, 0.35, 0.45, 0.6, 0.65],
  [0.2, 0, 0.2, 0.6, 0.6, 0.6],
  [0.35, 0.2, 0, 0.55, 0.55, 0.55],
  [0.45, 0.6, 0.55, 0, 0.4, 0.5],
  [0.6, 0.6, 0.55, 0.4, 0, 0.3],
  [0.65, 0.6, 0.55, 0.5, 0.3, 0],
]
const VOICE = 0.15
const PLACE_STEP = 0.1
const FAR_PLACE = 0.35
/** Most that one sound for another can cost: more than that is one dropped and one put in. */
const UNLIKE = 1
/** However near in the mouth, two sounds that tell words apart (fin and thin) are two. */
const OTHER = 0.1
const VOWEL_FOR_CONSONANT = 1.3

/** Pairs that many speakers do not tell apart, whatever their features. */
const MERGED: Record<string, number> = {
  'AA AO': 0.2, // cot and caught
  'AO UH': 0.2, // moor and more
  'EH IH': 0.25, // pen and pin
  'AH IH': 0.25, // olive, or roses and Rosa's
  'AH UH': 0.2, // put and putt
  'T TH': 0.3, // tin and thin
  'D DH': 0.3, // den and then
  'F TH': 0.25, // fin and thin
  'N NG': 0.25, // lichen and liking
  'IY Y': 0.3,
  'UW W': 0.3,
}

function betweenConsonants(one: Consonant, other: Consonant): number {
  const place = Math.min(FAR_PLACE, PLACE_STEP * Math.abs(one.place - other.place))
  const manner = BETWEEN_MANNERS[MANNERS.indexOf(one.manner)]![MANNERS.indexOf(other.manner)]!
  const voice = one.voiced === other.voiced ? 0 : VOICE
  return Math.min(UNLIKE, (voice > 0 && place + manner === 0 ? 0 : OTHER) + place + manner + voice)
}

function betweenVowels(one: Vowel, other: Vowel): number {
  const apart = (a: readonly number[], b: readonly number[]) =>
    Math.hypot(a[0]! - b[0]!, 0.8 * (a[1]! - b[1]!), 0.4 * (a[2]! - b[2]!))
  return Math.min(UNLIKE, OTHER + 0.6 * apart(one.from, other.from) + 0.4 * apart(one.to, other.to))
}

/**
 * How unlike two sounds are, 0 (the same) to 1.3 (a vowel for a consonant), stress left aside.
 * Symmetric. The weights are ours, set on pairs that people mishear (tests/fixtures/naming).
 * @source features after Ladefoged & Johnson, A Course in Phonetics, ch. 2–4 (common practice)
 */
export function betweenSymbols(one: string, other: string): number {
  if (one === other) return 0
  const merged = MERGED[one < other ? `${one} ${other}` : `${other} ${one}`]
  if (merged !== undefined) return merged
  const consonants = [CONSONANTS[one], CONSONANTS[other]] as const
  if (consonants[0] && consonants[1]) return betweenConsonants(consonants[0], consonants[1])
  const vowels = [VOWELS[one], VOWELS[other]] as const
  if (vowels[0] && vowels[1]) return betweenVowels(vowels[0], vowels[1])
  return VOWEL_FOR_CONSONANT
}

/** Every sound, vowels with each stress: what a distance is tabulated over. */
export const PHONEMES: readonly string[] = [
  ...Object.keys(CONSONANTS),
  ...Object.keys(VOWELS).flatMap((vowel) => [0, 1, 2].map((stress) => `${vowel}${stress}`)),
]

const WRITTEN: Record<string, string> = {
  AA: 'ah',
  AE: 'a',
  AH: 'uh',
  AO: 'aw',
  AW: 'ow',
  AY: 'y',
  EH: 'e',
  ER: 'ur',
  EY: 'ay',
  IH: 'i',
  IY: 'ee',
  OW: 'oh',
  OY: 'oy',
  UH: 'uu',
  UW: 'oo',
  DH: 'th',
  HH: 'h',
  JH: 'j',
}

/** Whether English begins a syllable with these consonants; all that respelling needs. */
const ONSET =
  /^(?:[PBTDKG] ?[LRW]?|[FVSZ] ?[LR]?|S [PTKMNW](?: [LRW])?|TH R?|SH R?|DH|CH|JH|HH|M|N|L|R|W|Y|ZH)$/

/**
 * A sound as English would spell it for a reader who knows no phonetics, its main stress in
 * capitals when there is more than one syllable: `KOCH-i-neel`.
 */
export function respell(sound: Sound): string {
  const syllables: string[][] = []
  let held: string[] = []
  for (const phoneme of sound) {
    if (!isVowel(phoneme)) {
      held.push(phoneme)
      continue
    }
    let take = 0
    while (take < held.length && !ONSET.test(held.slice(take).join(' '))) take++
    if (syllables.length > 0) syllables.at(-1)!.push(...held.slice(0, take))
    else take = 0
    syllables.push([...held.slice(take), phoneme])
    held = []
  }
  if (syllables.length === 0) syllables.push([])
  syllables.at(-1)!.push(...held)
  return syllables
    .map((syllable) => {
      const spelled = syllable
        .map((phoneme, at) => {
          const symbol = symbolOf(phoneme)
          if (symbol === 'AY') return at === 0 ? 'eye' : 'y'
          return WRITTEN[symbol] ?? symbol.toLowerCase()
        })
        .join('')
      const main = syllable.some((phoneme) => stressOf(phoneme) === 1)
      return main && syllables.length > 1 ? spelled.toUpperCase() : spelled
    })
    .join('-')
}
