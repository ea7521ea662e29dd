'use client'

import { ArrowDown, ArrowUp } from 'lucide-react'
import { useState, type FormEvent } from 'react'

import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { Select } from '@/components/ui/select'
import { FAMILY_LIMITS } from '@/lib/families/constants'
import type { FamilyWithShades } from '@/lib/families/present'

import type { FamiliesActions, FamiliesRights } from './families-actions'
import type { SendEdit } from './use-families'

/** Everything that can be done with one family, opened beside its name. */
export function FamilyTools({
  brand,
  family,
  families,
  actions,
  can,
  edit,
  onOrder,
  onDone,
}: {
  brand: string
  family: FamilyWithShades
  families: readonly FamilyWithShades[]
  actions: FamiliesActions
  can: FamiliesRights
  edit: SendEdit
  /** Opens the order of its shades. */
  onOrder: () => void
  onDone: () => void
}) {
  const { id: familyId } = family
  const [name, setName] = useState(family.name)
  const [error, setError] = useState<string>()
  const [into, setInto] = useState('')
  const others = families.filter(({ id }) => id !== familyId)
  const at = families.findIndex(({ id }) => id === familyId)

  async function rename(event: FormEvent) {
    event.preventDefault()
    setError(undefined)
    const answer = await edit({
      send: (base) => actions.rename(brand, { ...base, familyId, name }),
      done: `The family is called ${name.trim()} now.`,
      quiet: true,
    })
    if (answer.ok) onDone()
    else setError(answer.fieldErrors?.name?.[0] ?? answer.message)
  }

  async function merge(event: FormEvent) {
    event.preventDefault()
    const target = others.find(({ id }) => id === into)
    if (!target) return
    const answer = await edit({
      send: (base) => actions.merge(brand, { ...base, familyId, intoId: target.id }),
      done: `${family.name} went into ${target.name}.`,
    })
    if (answer.ok) onDone()
  }

  async function shift(by: 1 | -1) {
    const ids = families.map(({ id }) => id)
    ids.splice(at, 1)
    ids.splice(at + by, 0, familyId)
    const moved = ids.map((id) => families.find((one) => one.id === id)!)
    await edit({
      send: (base) => actions.orderFamilies(brand, { ...base, familyIds: ids }),
      done: `${family.name} is family ${at + by + 1} of ${families.length} now.`,
      meanwhile: moved,
    })
  }

  return (
    <div className="mb-4 grid gap-4 border-y border-hairline py-4 xl:grid-cols-2">
      <form className="flex items-end gap-2" onSubmit={(event) => void rename(event)}>
        <Field label="Name" error={error} className="min-w-0 grow">
          <Input
            value={name}
            maxLength={FAMILY_LIMITS.name}
            autoComplete="off"
            autoFocus
            onChange={({ target }) => setName(target.value)}
            onKeyDown={(event) => {
              if (event.key === 'Escape') onDone()
            }}
          />
        </Field>
        <Button type="submit" className="shrink-0">
          Rename family
        </Button>
      </form>
      {can.edit ? (
        <>
          <form className="flex items-end gap-2" onSubmit={(event) => void merge(event)}>
            <Field label="Put all its shades into" className="min-w-0 grow">
              <Select value={into} onChange={(event) => setInto(event.target.value)}>
                <option value="">Choose…</option>
                {others.map((other) => (
                  <option key={other.id} value={other.id}>
                    {other.name}
                  </option>
                ))}
              </Select>
            </Field>
            <Button type="submit" disabled={into === ''} className="shrink-0">
              Merge families
            </Button>
          </form>
          <div className="flex flex-wrap gap-2 xl:col-span-2">
            <Button
              disabled={family.shades.length < 2}
              onClick={() =>
                void edit({
                  send: (base) => actions.split(brand, { ...base, familyId }),
                  done: `${family.name} is split in two.`,
                })
              }
            >
              Split family
            </Button>
            <Button disabled={family.shades.length < 2} onClick={onOrder}>
              Order shades
            </Button>
            <Button
              icon={<ArrowUp aria-hidden="true" />}
              disabled={at === 0}
              onClick={() => void shift(-1)}
            >
              Move family up
            </Button>
            <Button
              icon={<ArrowDown aria-hidden="true" />}
              disabled={at === families.length - 1}
              onClick={() => void shift(1)}
            >
              Move family down
            </Button>
          </div>
        </>
      ) : null}
    </div>
  )
}
