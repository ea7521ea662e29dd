'use client'

import { memo, useId, useState } from 'react'

import { cn } from '@/components/ui/cn'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { Select } from '@/components/ui/select'
import { Ground } from '@/components/yarn/ground'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { ShadeView } from '@/lib/shades/present'

import { useHeldDrag } from './editor-drag'

/** A tonal family as the tray heads it. */
export interface TrayFamily {
  id: string
  name: string
}

const NO_FAMILY = 'none'

/** Shades by family, in the order of the sample book; those in no family come last. */
export function byFamily(
  shades: readonly ShadeView[],
  families: readonly TrayFamily[],
): { family: TrayFamily; shades: ShadeView[] }[] {
  const rest = families.length > 0 ? 'In no family' : 'All shades'
  const known = new Set(families.map(({ id }) => id))
  return [...families, { id: NO_FAMILY, name: rest }]
    .map((family) => ({
      family,
      shades: shades
        .filter(({ familyId }) =>
          family.id === NO_FAMILY
            ? familyId === null || !known.has(familyId)
            : familyId === family.id,
        )
        .sort(
          (one, other) => placeInFamily(one) - placeInFamily(other) || other.lab[0] - one.lab[0],
        ),
    }))
    .filter((group) => group.shades.length > 0)
}

/** By people's own order, then light to dark. */
const placeInFamily = ({ familyPosition }: ShadeView) => familyPosition ?? Number.MAX_SAFE_INTEGER

const holds = ({ label, number }: ShadeView, words: string) =>
  `${label} ${number}`.toLowerCase().includes(words)

/**
 * All shades of the line by tonal family, to be searched, chosen and dragged; those in use say in
 * which place.
 */
export function ShadeTray({
  shades,
  families,
  placeOf,
  chosen,
  onChoose,
}: {
  shades: readonly ShadeView[]
  families: readonly TrayFamily[]
  /** In which place (from 0) a shade stands; -1 for none. */
  placeOf: (shadeId: string) => number
  /** The shade in the hand. */
  chosen: string | null
  onChoose: (shadeId: string) => void
}) {
  const [words, setWords] = useState('')
  const [familyId, setFamilyId] = useState('')
  const id = useId()
  const sought = words.trim().toLowerCase()
  const groups = byFamily(shades, families)
  const shown = groups
    .filter(({ family }) => familyId === '' || family.id === familyId)
    .map((group) => ({ ...group, shades: group.shades.filter((one) => holds(one, sought)) }))
    .filter((group) => group.shades.length > 0)
  return (
    <section aria-labelledby={id} className="print:hidden">
      <div className="mb-3 flex flex-wrap items-end justify-between gap-x-4 gap-y-2">
        <h2 id={id} className="text-xl">
          Shades
        </h2>
        <div className="flex min-w-0 grow justify-end gap-2">
          <Field hideLabel label="Search shades" className="min-w-0 grow sm:max-w-40">
            <Input
              type="search"
              placeholder="Name or number"
              value={words}
              onChange={({ target }) => setWords(target.value)}
            />
          </Field>
          {groups.length > 1 ? (
            <Field hideLabel label="Family" className="min-w-0 grow sm:max-w-44">
              <Select value={familyId} onChange={({ target }) => setFamilyId(target.value)}>
                <option value="">All families</option>
                {groups.map(({ family }) => (
                  <option key={family.id} value={family.id}>
                    {family.name}
                  </option>
                ))}
              </Select>
            </Field>
          ) : null}
        </div>
      </div>
      <Ground className="border border-hairline px-3">
        {shown.length === 0 ? (
          <p className="py-4">No shade fits that. Clear the search to see all of them.</p>
        ) : null}
        {shown.map(({ family, shades: members }) => (
          <section
            key={family.id}
            aria-label={family.name}
            className="border-b border-hairline py-4 last:border-b-0"
          >
            {groups.length > 1 ? <h3 className="mb-1 px-1.5">{family.name}</h3> : null}
            <ul
              role="list"
              className="grid grid-cols-[repeat(auto-fill,minmax(6rem,1fr))] gap-x-1 gap-y-1"
            >
              {members.map((shade) => (
                <TrayShade
                  key={shade.id}
                  shade={shade}
                  place={placeOf(shade.id)}
                  chosen={shade.id === chosen}
                  onChoose={onChoose}
                />
              ))}
            </ul>
          </section>
        ))}
      </Ground>
    </section>
  )
}

const TrayShade = memo(function TrayShade({
  shade,
  place,
  chosen,
  onChoose,
}: {
  shade: ShadeView
  place: number
  chosen: boolean
  onChoose: (shadeId: string) => void
}) {
  const { setNode, listeners, isDragging } = useHeldDrag(
    { kind: 'shade', shadeId: shade.id },
    'tray',
    false,
  )
  return (
    // Padded, since what is not drawn out of sight is cut at its edges, outlines too.
    <li className="min-w-0 p-1 [contain-intrinsic-size:auto_5.5rem] [content-visibility:auto]">
      <button
        ref={setNode}
        type="button"
        {...listeners}
        data-shade={shade.id}
        aria-pressed={chosen}
        onClick={() => onChoose(shade.id)}
        className={cn(
          'block w-full cursor-grab touch-manipulation rounded p-0.5 text-left select-none hover:bg-wash',
          chosen && 'outline-focus outline-2 outline-dashed',
          isDragging && 'opacity-40',
        )}
      >
        <TraySample hex={shade.hex} />
        <span className="mt-1 block font-title text-sm leading-snug break-words">
          {shade.label}
        </span>
        <span className="block text-sm text-ink-soft">
          {place >= 0 ? `In place ${place + 1}` : shade.name ? `No. ${shade.number}` : ''}
        </span>
      </button>
    </li>
  )
})

const TraySample = memo(function TraySample({ hex }: { hex: string }) {
  return <WoundSample hex={hex} />
})
