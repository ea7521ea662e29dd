'use client'

import { useState } from 'react'

import { Button } from '@/components/ui/button'
import { Popover } from '@/components/ui/popover'
import { nearestShades } from '@/lib/color/match'

import { ShadeChoice } from './shade-choice'
import type { MatchShadeView } from './types'

const NEIGHBOURS = 5

/** Offers the nearest other shades to take a shade's place. */
export function SwapShade({
  shade,
  others,
  onSwap,
}: {
  shade: MatchShadeView
  others: readonly MatchShadeView[]
  onSwap: (shadeId: string) => void
}) {
  const [open, setOpen] = useState(false)
  const byId = new Map(others.map((other) => [other.id, other]))
  return (
    <Popover
      label={`Neighbours of ${shade.label}`}
      open={open}
      onOpenChange={setOpen}
      trigger={
        <Button size="small" variant="quiet">
          Swap <span className="sr-only">{shade.label}</span>
        </Button>
      }
    >
      <p className="text-sm text-ink-faint">Nearest to {shade.label}</p>
      <ul role="list" className="divide-y divide-hairline">
        {nearestShades(shade.lab, others, NEIGHBOURS).map(({ shadeId, deltaE }) => {
          const other = byId.get(shadeId)!
          return (
            <ShadeChoice key={shadeId} shade={other} deltaE={deltaE}>
              <Button
                size="small"
                onClick={() => {
                  setOpen(false)
                  onSwap(shadeId)
                }}
              >
                Take <span className="sr-only">{other.label}</span>
              </Button>
            </ShadeChoice>
          )
        })}
      </ul>
    </Popover>
  )
}
