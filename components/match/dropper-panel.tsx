'use client'

import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { LiveRegion } from '@/components/ui/live-region'
import { nearestShades } from '@/lib/color/match'

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
  control: WishesControl
}

const percent = (value: number) => String(Math.round(value * 1000) / 10)

/** Where the dropper is, and the three shades of the line nearest to what it touches. */
export function DropperPanel({ shades, point, touched, onMove, control }: DropperPanelProps) {
  const { x, y } = point ?? { x: 0.5, y: 0.5 }
  const byId = new Map(shades.map((shade) => [shade.id, shade]))
  const nearest = touched ? nearestShades(touched.lab, shades, 3) : []
  const field = (label: string, value: number, to: (fraction: number) => Point) => (
    <Field label={label} className="w-28">
      <Input
        type="number"
        min={0}
        max={100}
        step={0.5}
        value={percent(value)}
        onChange={({ target }) => {
          const fraction = target.valueAsNumber / 100
          if (fraction >= 0 && fraction <= 1) onMove(to(fraction))
        }}
      />
    </Field>
  )
  return (
    <section aria-label="Dropper" className="print:hidden">
      <div className="flex flex-wrap items-end gap-3">
        {field('Across, %', x, (fraction) => ({ x: fraction, y }))}
        {field('Down, %', y, (fraction) => ({ x, y: fraction }))}
        <p className="max-w-[22rem] pb-1 text-sm text-ink-faint">
          Press the photograph to ask which shades are nearest there. The arrow keys move the cross.
        </p>
      </div>
      <LiveRegion>
        {nearest.length > 0
          ? `Nearest there: ${nearest.map(({ shadeId, deltaE }) => `${byId.get(shadeId)!.label}, ${deltaE.toFixed(1)}`).join('; ')}`
          : ''}
      </LiveRegion>
      {touched ? (
        <div className="mt-3 flex gap-4">
          <svg width="36" height="36" viewBox="0 0 36 36" className="mt-3 shrink-0">
            <title>The colour there, on this screen</title>
            <circle cx="18" cy="18" r="16" fill={touched.hex} stroke="var(--rule)" />
          </svg>
          <ul role="list" className="grow divide-y divide-hairline">
            {nearest.map(({ shadeId, deltaE }) => {
              const shade = byId.get(shadeId)!
              const locked = control.wishes.lock.includes(shadeId)
              return (
                <ShadeChoice key={shadeId} shade={shade} deltaE={deltaE}>
                  <Button
                    size="small"
                    aria-pressed={locked}
                    onClick={() => (locked ? control.unlock(shadeId) : control.lock(shadeId))}
                  >
                    {locked ? 'Unlock' : 'Lock'}
                    <span className="sr-only"> {shade.label}</span>
                  </Button>
                  <Button size="small" variant="quiet" onClick={() => control.exclude(shadeId)}>
                    Exclude<span className="sr-only"> {shade.label}</span>
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
