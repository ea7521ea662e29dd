import { isSameName } from './check-same'
import type { Finding, OtherName } from './finding'
import { heardApart, pronounceName, respellName } from './pronounce'
import { NEAR, SAME } from './sound-distance'

/** Up to here a name heard on the telephone is likely to be taken for the other. */
const LIKELY = 0.14

/**
 * Which other names sound like a name, nearest first, with what both are heard as. Names that are
 * the same in letters are left to {@link checkSame}.
 */
export function checkSound(name: string, others: readonly OtherName[]): Finding[] {
  const spoken = pronounceName(name)
  if (spoken.sounds.length === 0) return []
  return others
    .map((other) => ({ other, apart: heardApart(name, other.name, NEAR) }))
    .filter(({ other, apart }) => apart <= NEAR && !isSameName(name, other.name))
    .sort((a, b) => a.apart - b.apart)
    .map(({ other, apart }): Finding => {
      const theirs = pronounceName(other.name)
      const guessed = !spoken.sure || !theirs.sure
      const same = apart <= SAME
      return {
        check: 'sound',
        grade: apart <= LIKELY ? 'warning' : 'note',
        what: `It sounds ${same ? 'just' : 'nearly'} like “${other.name}” (${other.where}).`,
        why:
          `Heard as ${respellName(spoken)} and ${respellName(theirs)}` +
          (guessed ? '; a word is in no dictionary, so that its sound is a guess.' : '.'),
        sure: guessed ? 'perhaps' : same ? 'certain' : apart <= LIKELY ? 'likely' : 'perhaps',
      }
    })
}
