'use client'

import { Undo2, X } from 'lucide-react'
import { useState } from 'react'

import { Button } from '@/components/ui/button'
import { Slider } from '@/components/ui/slider'
import { DEFAULT_APART } from '@/lib/color/match'
import { MOST_APART } from '@/lib/photographs/wishes'

import type { MatchShadeView } from './types'
import type { WishesControl } from './use-wishes'

/** How far apart the five stand, which shades are left out, and the way back. */
export function WishesBar({
  control,
  shades,
  held,
}: {
  control: WishesControl
  shades: readonly MatchShadeView[]
  /** The ΔE00 that the match really held. */
  held: number | null
}) {
  const { apart = DEFAULT_APART, exclude } = control.wishes
  const [moving, setMoving] = useState<number>()
  const value = moving ?? apart
  const settle = () => {
    if (moving !== undefined && moving !== apart) control.change({ apart: moving })
    setMoving(undefined)
  }
  const byId = new Map(shades.map((shade) => [shade.id, shade]))
  const gaveWay = held !== null && held < apart - 1e-9
  return (
    <section aria-label="Wishes" className="space-y-4 print:hidden">
      <Slider
        label="Apart"
        reading={`ΔE00 ${value}`}
        hint={
          gaveWay
            ? `No five stand that far apart under these wishes; these are at least ${held.toFixed(1)} apart.`
            : 'The least difference between any two of the five.'
        }
        min={0}
        max={MOST_APART}
        step={1}
        value={value}
        onChange={({ target }) => setMoving(target.valueAsNumber)}
        onPointerUp={settle}
        onKeyUp={settle}
        onBlur={settle}
      />
      {exclude.length > 0 ? (
        <div>
          <h3 className="font-medium">Left out</h3>
          <ul role="list" className="mt-1 flex flex-wrap gap-2">
            {exclude.map((id) => {
              const label = byId.get(id)?.label ?? 'A shade that is gone'
              return (
                <li key={id}>
                  <Button
                    size="small"
                    icon={<X aria-hidden="true" />}
                    aria-label={`Allow ${label} again`}
                    onClick={() => control.allow(id)}
                  >
                    {label}
                  </Button>
                </li>
              )
            })}
          </ul>
        </div>
      ) : null}
      {control.any || control.undo ? (
        <div className="flex flex-wrap gap-2">
          {control.undo ? (
            <Button size="small" icon={<Undo2 aria-hidden="true" />} onClick={control.undo}>
              Undo last wish
            </Button>
          ) : null}
          {control.any ? (
            <Button size="small" variant="quiet" onClick={control.clear}>
              Clear wishes
            </Button>
          ) : null}
        </div>
      ) : null}
    </section>
  )
}
