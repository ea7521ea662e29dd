import type { MatchShadeView } from '@/components/match/types'
import type { Match } from '@/lib/color/match'

/** A line of grey shades, ten L* apart, named by their letters. */
export const SHADES: MatchShadeView[] = ['A', 'B', 'C', 'D', 'E', 'F', 'G'].map((name, at) => ({
  id: `00000000-0000-4000-8000-00000000000${at}`,
  number: String(at + 1),
  name,
  label: name,
  lab: [90 - 10 * at, 0, 0],
  hex: '#808080',
  inGamut: true,
}))

/** A match of these shades, in equal shares. */
export function matchOf(letters: string, locked = ''): Match {
  return {
    kind: 'true',
    places: [...letters].map((letter) => ({
      shadeId: SHADES.find(({ name }) => name === letter)!.id,
      share: 0.2,
      presence: 2,
      deltaE: 3,
      inPhotograph: true,
      locked: locked.includes(letter),
    })),
    objective: 5,
    lowerBound: 5,
    certified: true,
    gap: 0,
    meanDeltaE: 5,
    leastMeanDeltaE: 4,
    apart: 10,
    assignment: [0, 1, 2, 3, 4],
    accent: null,
  }
}
