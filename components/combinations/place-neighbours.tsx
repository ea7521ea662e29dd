'use client'

import { ArrowLeftRight } from 'lucide-react'
import dynamic from 'next/dynamic'
import { useState } from 'react'

import { IconButton } from '@/components/ui/icon-button'
import { Popover } from '@/components/ui/popover'
import type { ShadeView } from '@/lib/shades/present'

import type { DraftPlace } from './draft'
import type { ShadeOf } from './shade-of'

const NeighbourPanel = dynamic(() =>
  import('@/components/help/neighbour-panel').then((it) => it.NeighbourPanel),
)

/** Offers the nearest other shades for a place. */
export function PlaceNeighbours({
  shade,
  onChoose,
  ...rest
}: {
  /** From 0. */
  place: number
  places: readonly DraftPlace[]
  shade: ShadeView
  shades: readonly ShadeView[]
  shadeOf: ShadeOf
  onChoose: (shadeId: string) => void
}) {
  const [open, setOpen] = useState(false)
  const label = `Neighbours of ${shade.label}`
  return (
    <Popover
      label={label}
      align="end"
      open={open}
      onOpenChange={setOpen}
      trigger={<IconButton label={label} icon={<ArrowLeftRight />} />}
    >
      <NeighbourPanel
        {...rest}
        onChoose={(shadeId) => {
          setOpen(false)
          onChoose(shadeId)
        }}
      />
    </Popover>
  )
}
