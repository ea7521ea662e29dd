import { Note } from '@/components/layout/note'
import { SCREEN_CAUTION } from '@/components/layout/screen-caution'
import type { Match } from '@/lib/color/match'

import { READING_PROOF, type MatchShadeView } from './types'

/** Under this many L* two yarns read as one in stranded work. Common practice; no source. */
const MUDDY = 10

/** What is proved of the five, how they step in lightness, and what a screen cannot say. */
export function ProofNotes({
  match,
  shades,
  asked,
}: {
  match: Match | null
  shades: readonly MatchShadeView[]
  /** There are wishes. */
  asked: boolean
}) {
  return (
    <>
      {match ? (
        <>
          <Note title={match.certified ? 'Proved best' : 'Best found'}>
            <p>
              {match.certified
                ? `No other five of your ${shades.length} shades ${READING_PROOF[match.kind]}${asked ? ' under your wishes' : ''}, with ${apartInWords(match)}.`
                : `The proof was cut off: these five are within ${(match.gap * 100).toFixed(1)} % of the best there can be.`}
            </p>
            <p>
              Mean difference ΔE00 {match.meanDeltaE.toFixed(1)}
              {match.kind === 'quiet' ? ' to the quieted photograph' : ''}; with all {shades.length}{' '}
              shades at once it would be {match.leastMeanDeltaE.toFixed(1)}.
            </p>
            <p className="text-sm text-ink-faint">
              Weighed {match.objective.toFixed(3)}, least possible {match.lowerBound.toFixed(3)}.
            </p>
          </Note>
          <Note title="As cloth">
            <Steps match={match} shades={shades} />
          </Note>
        </>
      ) : null}
      <Note title="On screen only">
        <p>{SCREEN_CAUTION}</p>
      </Note>
    </>
  )
}

/** Locked shades may stand as near to each other as they like. */
function apartInWords({ apart, places }: Match): string {
  const free = places.filter(({ locked }) => locked).length > 1 ? ' but the locked ones' : ''
  return `every pair${free} at least ΔE00 ${apart.toFixed(apart % 1 ? 1 : 0)} apart`
}

function Steps({ match, shades }: { match: Match; shades: readonly MatchShadeView[] }) {
  const byId = new Map(shades.map((shade) => [shade.id, shade]))
  const five = match.places.flatMap(({ shadeId }) => byId.get(shadeId) ?? [])
  const steps = five.slice(1).map((shade, at) => ({
    pair: [five[at]!, shade] as const,
    step: five[at]!.lab[0] - shade.lab[0],
  }))
  const least = steps.reduce((a, b) => (b.step < a.step ? b : a), steps[0]!)
  if (!least) return null
  const [light, dark] = least.pair
  return (
    <p>
      From light to dark the least step is {least.step.toFixed(0)} L*, between {light.label} and{' '}
      {dark.label}
      {least.step < MUDDY
        ? ': in stranded work those two may read as one. A swatch decides.'
        : '. Stranded work will show every one of them.'}
    </p>
  )
}
