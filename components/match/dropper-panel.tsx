'use client'

import { Button } from '@/components/ui/button'
import { LiveRegion } from '@/components/ui/live-region'
import { nearestShades } from '@/lib/color/match'

import { PercentField } from './percent-field'
import { ShadeChoice } from './shade-choice'
import type { Point } from './touch'
import type { MatchShadeView, TouchedColor } from './types'
import type { WishesControl } from './use-wishes'

/** Props of {@link DropperPanel}. */
export interface DropperPanelProps {
  shades: readonly MatchShadeView[]
  point: Point | null
  touched: TouchedColor | null
  onMove: (point: Point) => void
  onAway: () => void
  control: WishesControl
}

const OFFERED = 3

/** Where the dropper is, and the three shades of the line nearest to what it touches. */
export function DropperPanel(props: DropperPanelProps) {
  const { shades, point, touched, onMove, onAway, control } = props
  const { x, y } = point ?? { x: 0.5, y: 0.5 }
  const byId = new Map(shades.map((shade) => [shade.id, shade]))
  const nearest = touched ? nearestShades(touched.lab, shades, OFFERED) : []
  return (
    <section aria-label="Dropper" className="print:hidden">
      <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-2">
        <p className="min-w-40 flex-1 text-sm text-ink-faint">
          Press the photograph to find the shades nearest there. The arrow keys move the cross.
        </p>
        <div className="flex gap-3">
          <PercentField label="Across, %" value={x} onChange={(to) => onMove({ x: to, y })} />
          <PercentField label="Down, %" value={y} onChange={(to) => onMove({ x, y: to })} />
        </div>
      </div>
      <LiveRegion>
        {nearest.length > 0
          ? `Nearest there: ${nearest.map(({ shadeId, deltaE }) => `${byId.get(shadeId)!.label}, ${deltaE.toFixed(1)}`).join('; ')}`
          : ''}
      </LiveRegion>
      {touched ? (
        <div className="mt-2 border-y border-hairline">
          <p className="flex items-center gap-2 pt-2 text-sm text-ink-soft">
            <svg width="20" height="20" viewBox="0 0 20 20" aria-hidden="true">
              <circle cx="10" cy="10" r="9" fill={touched.css} stroke="var(--rule)" />
            </svg>
            Nearest to the colour under the cross
            <Button size="small" variant="quiet" className="ml-auto" onClick={onAway}>
              Put dropper away
            </Button>
          </p>
          <ul role="list" className="divide-y divide-hairline">
            {nearest.map(({ shadeId, deltaE }) => {
              const shade = byId.get(shadeId)!
              const locked = control.wishes.lock.includes(shadeId)
              return (
                <ShadeChoice key={shadeId} shade={shade} deltaE={deltaE}>
                  <Button
                    size="small"
                    onClick={() => (locked ? control.unlock(shadeId) : control.lock(shadeId))}
                  >
                    {locked ? 'Unlock' : 'Lock'} <span className="sr-only">{shade.label}</span>
                  </Button>
                  <Button size="small" variant="quiet" onClick={() => control.exclude(shadeId)}>
                    Exclude <span className="sr-only">{shade.label}</span>
                  </Button>
                </ShadeChoice>
              )
            })}
          </ul>
        </div>
      ) : null}
    </section>
  )
}
