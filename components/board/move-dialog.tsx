'use client'

import { useState } from 'react'

import { Button } from '@/components/ui/button'
import { Dialog, DialogClose } from '@/components/ui/dialog'
import { Field } from '@/components/ui/field'
import { RadioGroup } from '@/components/ui/radio-group'
import { Select } from '@/components/ui/select'
import { LANES, LANE_WORDS, type Lane } from '@/lib/combinations/constants'
import type { BoardCard } from '@/lib/combinations/present'

import { find, placeAmong, type Order, type Place } from './order'

/** Chooses where a card goes: the lane, then the card it lies under. */
export function MoveDialog({
  card: { id, title },
  order,
  titleOf,
  onMove,
  onClose,
}: {
  card: BoardCard
  order: Order
  titleOf: (id: string) => string
  onMove: (place: Place) => void
  onClose: () => void
}) {
  const now = find(order, id)
  const [lane, setLane] = useState<Lane>(now?.lane ?? 'sketched')
  const others = order[lane].filter((other) => other !== id)
  const own = now?.lane === lane ? now.at : 0
  const [chosen, setChosen] = useState<{ lane: Lane; at: number }>()
  const at = Math.min(chosen?.lane === lane ? chosen.at : own, others.length)
  const of = others.length + 1
  return (
    <Dialog
      open
      onOpenChange={(open) => {
        if (!open) onClose()
      }}
      title={`Move ${title}`}
      footer={
        <>
          <DialogClose>
            <Button>Leave it</Button>
          </DialogClose>
          <Button
            variant="primary"
            onClick={() => {
              onMove(placeAmong(order, id, { lane, at, shown: others }))
              onClose()
            }}
          >
            Move combination
          </Button>
        </>
      }
    >
      <div className="space-y-4">
        <RadioGroup
          legend="Lane"
          value={lane}
          onValueChange={setLane}
          options={LANES.map((one) => ({ value: one, label: LANE_WORDS[one] }))}
        />
        <Field label="Place">
          <Select
            value={at}
            onChange={(event) => setChosen({ lane, at: Number(event.target.value) })}
          >
            <option value={0}>1 of {of}: at the top</option>
            {others.map((other, index) => (
              <option key={other} value={index + 1}>
                {index + 2} of {of}: under {titleOf(other)}
              </option>
            ))}
          </Select>
        </Field>
      </div>
    </Dialog>
  )
}
