import type { Finding, OtherName } from './finding'
import { headWords, stemOf, wordsOf } from './words'

/** Names this much alike in letters are warned of: one slip in each so many letters. */
const LETTERS_A_SLIP = 6

/**
 * The letters put in, left out, exchanged, or swapped with the next one between two words; stops
 * counting beyond `most` and gives `most + 1`. Costs n·m.
 * @source Damerau (1964), optimal string alignment
 */
export function lettersApart(one: string, other: string, most = Infinity): number {
  if (Math.abs(one.length - other.length) > most) return most + 1
  let before: number[] = []
  let last = Array.from({ length: other.length + 1 }, (_, at) => at)
  for (let i = 1; i <= one.length; i++) {
    const row = [i]
    let least = i
    for (let j = 1; j <= other.length; j++) {
      const exchanged = last[j - 1]! + (one[i - 1] === other[j - 1] ? 0 : 1)
      let cost = Math.min(exchanged, last[j]! + 1, row[j - 1]! + 1)
      if (i > 1 && j > 1 && one[i - 1] === other[j - 2] && one[i - 2] === other[j - 1])
        cost = Math.min(cost, before[j - 2]! + 1)
      row.push(cost)
      least = Math.min(least, cost)
    }
    if (least > most) return most + 1
    before = last
    last = row
  }
  return last[other.length]!
}

interface Folded {
  heads: readonly string[]
  letters: string
}

const folded = new Map<string, Folded>()
const MOST_REMEMBERED = 20_000

/** A name without case, accents, punctuation, small words and plurals. */
function fold(name: string): Folded {
  const known = folded.get(name)
  if (known) return known
  const heads = headWords(wordsOf(name)).map(stemOf)
  const fresh = { heads, letters: heads.join('') }
  if (folded.size >= MOST_REMEMBERED) folded.clear()
  folded.set(name, fresh)
  return fresh
}

/** Whether two names are one but for case, accents, punctuation, small words and plurals. */
export const isSameName = (one: string, other: string): boolean =>
  fold(one).letters === fold(other).letters

const ORDER = { certain: 0, likely: 1, perhaps: 2 }

/**
 * Which other names are the same as a name or nearly so, surest first: the same but for case,
 * accents, punctuation and small words; a slip of letters apart; or most of their words shared.
 */
export function checkSame(name: string, others: readonly OtherName[]): Finding[] {
  const mine = fold(name)
  if (mine.letters === '') return []
  const findings: Finding[] = []
  for (const other of others) {
    const theirs = fold(other.name)
    if (theirs.letters === '') continue
    const called = `“${other.name}” (${other.where})`
    if (theirs.letters === mine.letters) {
      const what = `It is the same as ${called}.`
      const why = 'Case, accents, punctuation, plurals and small words do not tell names apart.'
      findings.push({ check: 'same', grade: 'warning', what, why, sure: 'certain' })
      continue
    }
    const longer = Math.max(mine.letters.length, theirs.letters.length)
    const most = Math.floor(longer / LETTERS_A_SLIP)
    const apart = most > 0 ? lettersApart(mine.letters, theirs.letters, most) : 1
    if (apart <= most) {
      const what = `It is spelled nearly like ${called}.`
      const why = `${apart === 1 ? 'One letter' : `${apart} letters`} apart: easily mixed up on an order.`
      findings.push({ check: 'same', grade: 'warning', what, why, sure: 'likely' })
      continue
    }
    const shared = mine.heads.filter((head) => theirs.heads.includes(head))
    const most2 = Math.max(mine.heads.length, theirs.heads.length)
    if (shared.length > 0 && shared.length * 2 >= most2) {
      const what = `It shares ${shared.map((word) => `“${word}”`).join(' and ')} with ${called}.`
      const why = 'Half of what such a name is remembered by, or more, is the same.'
      findings.push({ check: 'same', grade: 'note', what, why, sure: 'perhaps' })
    }
  }
  return findings.sort((a, b) => ORDER[a.sure] - ORDER[b.sure])
}
