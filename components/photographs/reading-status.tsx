'use client'

import { LiveRegion } from '@/components/ui/live-region'
import { isUnsettled, type PhotographStanding } from '@/lib/photographs/constants'

import { ReadAgainButton, type RereadPhotograph } from './read-again-button'
import { StateStatus } from './state-status'
import { useStandings } from './use-standings'

/** Props of {@link ReadingStatus}. */
export interface ReadingStatusProps {
  brand: string
  /** As the server rendered it; a PhotographView fits. */
  standing: PhotographStanding
  canReread: boolean
  reread: RereadPhotograph
}

/** Follows the reading of one photograph; offers another after a failure. */
export function ReadingStatus({ brand, standing, canReread, reread }: ReadingStatusProps) {
  const { standings, outOfTouch } = useStandings(brand, [standing])
  const { id, state, failure } = standings.get(standing.id) ?? standing
  return (
    <div className="space-y-2">
      <LiveRegion visible>
        <StateStatus state={state} />
        {state === 'failed' && failure ? (
          <p className="mt-1 max-w-measure text-ink-soft">{failure}</p>
        ) : null}
        {outOfTouch && isUnsettled(state) ? (
          <p className="mt-1 max-w-measure text-ink-soft">
            Woadmap does not answer just now. The reading goes on; this page keeps asking.
          </p>
        ) : null}
      </LiveRegion>
      {isUnsettled(state) ? (
        <p className="max-w-measure text-sm text-ink-faint">
          You can leave this page: the reading goes on without it.
        </p>
      ) : null}
      {state === 'failed' && canReread ? (
        <ReadAgainButton size="small" brand={brand} photographId={id} reread={reread} />
      ) : null}
    </div>
  )
}
