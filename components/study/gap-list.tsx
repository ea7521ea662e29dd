import { showReading } from '@/components/shades/shade-words'
import type { LinePlace, ShadesActions } from '@/components/shades/shades-actions'
import { Ground } from '@/components/yarn/ground'
import { WoundSample } from '@/components/yarn/wound-sample'
import { TERMS_WORDS, type ReadingTerms } from '@/lib/shades/constants'
import type { StudiedGap } from '@/lib/shades/present'

import { AddTarget } from './add-target'
import { gapLetter } from './color-plane'
import { ShadeLink, showNumber } from './study-words'

/** The gaps with the colour to aim for, and what adds it as a target where that may be done. */
export function GapList({
  place,
  gaps,
  terms,
  actions,
}: {
  place: LinePlace
  gaps: readonly StudiedGap[]
  terms: ReadingTerms
  /** Null for whoever may only read. */
  actions: Pick<ShadesActions, 'create' | 'remove'> | null
}) {
  return (
    <Ground>
      <ul
        role="list"
        className="grid grid-cols-[repeat(auto-fill,minmax(min(18rem,100%),1fr))] gap-x-8 gap-y-8"
      >
        {gaps.map(({ lab, hex, number, nearest }, index) => (
          // A number is proposed anew once one is taken, so the colour is the key.
          <li key={lab.join()}>
            <h3 className="mb-2 text-lg">Gap {gapLetter(index)}</h3>
            <div className="flex gap-4">
              <WoundSample
                hex={hex}
                size="card"
                label={`Target for gap ${gapLetter(index)}, wound on card`}
                className="h-auto w-32"
              />
              <div className="min-w-0 text-sm">
                <p className="text-base whitespace-nowrap">
                  L* {showReading(lab[0])}
                  <br />
                  a* {showReading(lab[1])}
                  <br />
                  b* {showReading(lab[2])}
                </p>
                <p className="text-ink-faint">{TERMS_WORDS[terms]}</p>
              </div>
            </div>
            <p className="mt-2 text-sm text-ink-soft">
              Nearest:{' '}
              {nearest.map(({ shade, deltaE }, at) => (
                <span key={shade.id}>
                  {at > 0 ? ', ' : null}
                  <ShadeLink place={place} shade={shade} />{' '}
                  <span className="whitespace-nowrap">
                    {at === 0 ? 'ΔE00 ' : null}
                    {showNumber(deltaE)}
                  </span>
                </span>
              ))}
            </p>
            {actions ? (
              <div className="print:hidden">
                <AddTarget
                  {...{ place, lab, terms, number, actions }}
                  gap={`gap ${gapLetter(index)}`}
                />
              </div>
            ) : null}
          </li>
        ))}
      </ul>
    </Ground>
  )
}
