import { IDIOMS, type Idiom } from './idioms'
import { heardApart } from './pronounce'
import { wordsOf } from './words'

const byLength = new Map<number, { idiom: Idiom; words: readonly string[] }[]>()
for (const idiom of IDIOMS) {
  const words = wordsOf(idiom.phrase)
  byLength.set(words.length, [...(byLength.get(words.length) ?? []), { idiom, words }])
}
/** The ear takes more for a pun when the rest of the saying is there. */
const A_PUN = 0.45

/**
 * The saying that a name plays on: the same words but for one, which sounds like it. Null for a name
 * that is no wordplay we know.
 */
export function sourceOf(name: string): { source: string; from: string; to: string } | null {
  const words = wordsOf(name)
  let best: { source: string; from: string; to: string; apart: number } | null = null
  for (const { idiom, words: theirs } of byLength.get(words.length) ?? []) {
    const differ = words.flatMap((word, at) => (word === theirs[at] ? [] : [at]))
    const [at] = differ
    // A word that comes twice may be exchanged twice.
    const once = new Set(differ.map((place) => `${words[place]} ${theirs[place]}`)).size === 1
    if (at === undefined || !once || differ.length === words.length) continue
    const apart = heardApart(words[at]!, theirs[at]!)
    if (apart <= A_PUN && apart < (best?.apart ?? Infinity))
      best = { source: idiom.phrase, from: theirs[at]!, to: words[at]!, apart }
  }
  return best && { source: best.source, from: best.from, to: best.to }
}
