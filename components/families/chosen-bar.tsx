'use client'

import { Pin, PinOff, X } from 'lucide-react'
import { useEffect, useRef, useState } from 'react'

import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { IconButton } from '@/components/ui/icon-button'
import { Select } from '@/components/ui/select'
import type { FamilyWithShades } from '@/lib/families/present'

import { shadesInWords } from './families-actions'

const NEW = 'new'

/** What can be done with the chosen shades; it stands at the foot of the window. */
export function ChosenBar({
  families,
  chosen,
  pending,
  sought,
  onMove,
  onPin,
  onClear,
}: {
  families: readonly FamilyWithShades[]
  chosen: ReadonlySet<string>
  pending: boolean
  /** Another number than before brings the keyboard to the choice of a family; 0 leaves it. */
  sought: number
  /** Null makes a new family. */
  onMove: (familyId: string | null) => void
  onPin: (pinned: boolean) => void
  onClear: () => void
}) {
  const [target, setTarget] = useState('')
  const bar = useRef<HTMLDivElement>(null)
  useEffect(() => {
    if (sought > 0) bar.current?.querySelector('select')?.focus()
  }, [sought])
  const shades = families.flatMap((family) => family.shades.filter(({ id }) => chosen.has(id)))
  // Where they all stand already is no place to go.
  const from = new Set(shades.map(({ familyId }) => familyId))
  const targets = families.filter(({ id }) => from.size > 1 || !from.has(id))
  const isTarget = target === NEW || targets.some(({ id }) => id === target)
  return (
    <div
      ref={bar}
      role="region"
      aria-label="Chosen shades"
      className="sticky bottom-0 z-20 mt-4 border border-rule bg-paper px-4 py-3 print:hidden"
    >
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <p className="grow font-medium sm:grow-0">{shadesInWords(shades.length)} chosen</p>
        <div className="flex">
          <IconButton label="Pin shades" icon={<Pin />} onClick={() => onPin(true)} />
          <IconButton label="Unpin shades" icon={<PinOff />} onClick={() => onPin(false)} />
          <IconButton label="Choose none" icon={<X />} onClick={onClear} />
        </div>
        <form
          className="flex min-w-0 grow items-center gap-2 max-sm:w-full sm:justify-end"
          onSubmit={(event) => {
            event.preventDefault()
            if (isTarget && !pending) onMove(target === NEW ? null : target)
          }}
        >
          <Field hideLabel label="Family to move them to" className="min-w-0 grow sm:max-w-64">
            <Select
              value={isTarget ? target : ''}
              onChange={(event) => setTarget(event.target.value)}
            >
              <option value="">Choose a family…</option>
              {targets.map(({ id, name }) => (
                <option key={id} value={id}>
                  {name}
                </option>
              ))}
              <option value={NEW}>A new family</option>
            </Select>
          </Field>
          <Button
            type="submit"
            variant="primary"
            className="shrink-0"
            disabled={!isTarget}
            pending={pending}
          >
            Move shades
          </Button>
        </form>
      </div>
    </div>
  )
}
