'use client'

import { createContext, use } from 'react'

import { AppLink } from '@/components/ui/app-link'
import { EditableCell } from '@/components/ui/editable-cell'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { ActionResult } from '@/lib/errors'
import type { ShadeView } from '@/lib/shades/present'
import { SHADE_STATUSES, type ShadeStatus } from '@/lib/shades/constants'

import { ShadeNameLink } from './shade-name-link'
import {
  BeyondScreen,
  ShadeName,
  ShadeStatusWord,
  showReading,
  showTerms,
  STATUS_WORDS,
} from './shade-words'
import { shadesHref, type LinePlace } from './shades-actions'
import type { SaveShade } from './use-save-shade'

/** What the cells of the table stand in and, where they are edited, save with. */
export interface ShadeTableTerms {
  place: LinePlace
  /** Whether this person sees the ideas for names. */
  seesIdeas: boolean
  save: SaveShade
  move: (shade: ShadeView, place: string) => Promise<ActionResult<unknown>>
}

/** Hands the cells their terms: columns must stay the same objects, or an edit would be lost. */
export const ShadeTableContext = createContext<ShadeTableTerms | null>(null)

function useTerms(): ShadeTableTerms {
  const terms = use(ShadeTableContext)
  if (!terms) throw new Error('A cell of the shade table stands outside it.')
  return terms
}

interface CellProps {
  shade: ShadeView
  edits: boolean
}

/** The wound sample, which leads to the shade's page. */
export function SampleCell({ shade }: { shade: ShadeView }) {
  const { place } = useTerms()
  return (
    <AppLink
      href={shadesHref(place, `/${shade.id}`)}
      aria-label={`Open ${shade.label}`}
      className="inline-block rounded"
    >
      <WoundSample hex={shade.hex} />
    </AppLink>
  )
}

/** The shade's number. */
export function NumberCell({ shade, edits }: CellProps) {
  const { save } = useTerms()
  if (!edits) return shade.number
  return (
    <EditableCell
      label={`Number of ${shade.label}`}
      value={shade.number}
      onSave={(number) => save(shade, () => ({ number }))}
    >
      {shade.number}
    </EditableCell>
  )
}

/** The shade's name, which for those who see ideas leads to where it comes from. */
export function NameCell({ shade }: { shade: ShadeView }) {
  const { place, seesIdeas } = useTerms()
  return seesIdeas ? <ShadeNameLink place={place} shade={shade} /> : <ShadeName shade={shade} />
}

const STATUS_OPTIONS = SHADE_STATUSES.map((value) => ({ value, label: STATUS_WORDS[value] }))

/** How far the shade has come. */
export function StatusCell({ shade, edits }: CellProps) {
  const { save } = useTerms()
  const shown = <ShadeStatusWord status={shade.status} />
  if (!edits) return shown
  return (
    <EditableCell
      label={`Status of ${shade.label}`}
      value={shade.status}
      options={STATUS_OPTIONS}
      onSave={(status) => save(shade, () => ({ status: status as ShadeStatus }))}
      className="min-w-28"
    >
      {shown}
    </EditableCell>
  )
}

/** One coordinate of the shade's Lab. */
export function ReadingCell({ shade, edits, of }: CellProps & { of: 'L' | 'a' | 'b' }) {
  const { save } = useTerms()
  const [L, a, b] = shade.lab
  const value = { L, a, b }[of]
  if (!edits) return showReading(value)
  return (
    <EditableCell
      label={`${of} of ${shade.label}`}
      value={String(value)}
      hint={
        shade.enteredHex
          ? `Entered as ${shade.enteredHex}; saving makes it a reading, D65, 2°.`
          : undefined
      }
      onSave={(typed) =>
        save(shade, ({ lab, observer }) => ({
          color: {
            kind: 'lab',
            L: lab[0],
            a: lab[1],
            b: lab[2],
            terms: `D65/${observer}`,
            [of]: typed,
          },
        }))
      }
      className="text-right"
    >
      {showReading(value)}
    </EditableCell>
  )
}

/** Under which light the shade was read, and whether a screen can show it. */
export function TermsCell({ shade }: { shade: ShadeView }) {
  return (
    <span className="text-sm text-ink-soft">
      <span className="block whitespace-nowrap">{showTerms(shade)}</span>
      {shade.inGamut ? null : <BeyondScreen className="whitespace-nowrap" />}
    </span>
  )
}

/** The shade's place in the line's order; a new number moves it there. */
export function PlaceCell({ shade, edits }: CellProps) {
  const { move } = useTerms()
  const at = String(shade.position + 1)
  if (!edits) return at
  return (
    <EditableCell
      label={`Place of ${shade.label}`}
      value={at}
      onSave={(typed) => move(shade, typed.trim())}
      className="text-right"
    >
      {at}
    </EditableCell>
  )
}
