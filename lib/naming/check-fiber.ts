import { impliedFibers } from './fiber-words'
import type { Finding } from './finding'

const SOUNDS = {
  named: 'names',
  'sounds alike': 'sounds like',
  'spelled alike': 'is spelled like',
}

/**
 * Whether a name seems to promise a fibre or a fur that the yarn (`fibers`, lower case) does not
 * hold. A caution that defers to counsel, never a verdict.
 */
export function checkFiber(name: string, fibers: readonly string[]): Finding[] {
  return impliedFibers(name, fibers).map(({ word, implies, how, sure, rule }) => ({
    check: 'fiber',
    grade: 'warning',
    what: `“${word}” ${SOUNDS[how]} ${how === 'named' && implies === word ? 'a fibre' : implies}, which this yarn does not hold.`,
    why: `United States rules restrict such words (${rule}): ask counsel before it is printed.`,
    sure: sure > 0.9 ? 'certain' : sure > 0.65 ? 'likely' : 'perhaps',
  }))
}
