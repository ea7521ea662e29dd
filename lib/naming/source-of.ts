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

/** A saying, and the word of it that was exchanged. */
export interface PlayedOn {
  source: string
  from: string
  to: string
}

const remembered = new Map<string, PlayedOn | null>()
const MOST_REMEMBERED = 20_000

/**
 * The saying that a name plays on: the same words but for one, which sounds like it. Null for a name
 * that is no wordplay we know.
 */
export function sourceOf(name: string): PlayedOn | null {
  const known = remembered.get(name)
  if (known !== undefined) return known
  const found = look(wordsOf(name))
  if (remembered.size >= MOST_REMEMBERED) remembered.clear()
  remembered.set(name, found)
  return found
}

function look(words: readonly string[]): PlayedOn | null {
  let best: PlayedOn | null = null
  let least = A_PUN
  for (const { idiom, words: theirs } of byLength.get(words.length) ?? []) {
    const from = exchangedIn(words, theirs)
    if (!from) continue
    const apart = heardApart(from.to, from.from, least)
    if (apart > least || (best && apart === least)) continue
    least = apart
    best = { source: idiom.phrase, ...from }
  }
  return best
}

/** The one word by which two lists of words differ, though it may come twice; null for none or more. */
function exchangedIn(
  words: readonly string[],
  theirs: readonly string[],
): Omit<PlayedOn, 'source'> | null {
  let found: Omit<PlayedOn, 'source'> | null = null
  let same = 0
  for (let at = 0; at < words.length; at++) {
    const [to, from] = [words[at]!, theirs[at]!]
    if (to === from) same++
    else if (!found) found = { from, to }
    else if (found.from !== from || found.to !== to) return null
  }
  return same > 0 ? found : null
}
