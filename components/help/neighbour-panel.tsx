'use client'

import type { DraftPlace } from '@/components/combinations/draft'
import type { ShadeOf } from '@/components/combinations/shade-of'
import { ShadeChoice } from '@/components/match/shade-choice'
import { Button } from '@/components/ui/button'
import { LedgerList } from '@/components/ui/ledger'
import { Status } from '@/components/ui/status'
import { neighboursOf, type Neighbour } from '@/lib/color/clashes'
import type { ShadeView } from '@/lib/shades/present'

import { clashFrom, inList, shadesIn, type NameOf } from './help-words'

/** How many neighbours of a shade are offered. */
const NEIGHBOURS = 5

/** The nearest other shades for a place, and what each would change. */
export function NeighbourPanel({
  place,
  places,
  shades,
  shadeOf,
  onChoose,
}: {
  /** From 0. */
  place: number
  places: readonly DraftPlace[]
  /** Of the line, neither deleted nor retired. */
  shades: readonly ShadeView[]
  shadeOf: ShadeOf
  onChoose: (shadeId: string) => void
}) {
  const five = shadesIn(places, shadeOf)
  const here = five[place]
  const { locked } = places[place]!
  if (!here) {
    return (
      <p className="max-w-measure text-ink-soft">
        Place {place + 1} is empty: put a shade there, or have the five completed.
      </p>
    )
  }
  const byId = new Map(shades.map((shade) => [shade.id, shade]))
  const neighbours = neighboursOf(place, five, shades, NEIGHBOURS)
  const nameOf: NameOf = (at) => five[at]!.label
  return (
    <div className="space-y-2">
      <p className="max-w-measure text-ink-soft">
        {neighbours.length === 0
          ? 'The line has no other shades.'
          : `The nearest to ${here.label} that are not among the five.`}
        {locked ? ` ${here.label} is locked; unlock it to exchange it.` : ''}
      </p>
      <LedgerList>
        {neighbours.map((neighbour) => {
          const shade = byId.get(neighbour.shadeId)!
          return (
            <ShadeChoice
              key={shade.id}
              shade={shade}
              deltaE={neighbour.deltaE}
              note={<Change {...{ place, neighbour, nameOf }} />}
            >
              <Button size="small" disabled={locked} onClick={() => onChoose(shade.id)}>
                Take <span className="sr-only">{shade.label}</span>
              </Button>
            </ShadeChoice>
          )
        })}
      </LedgerList>
    </div>
  )
}

/** What a neighbour ends and brings among the five. */
function Change({
  place,
  neighbour: { gained, ended },
  nameOf,
}: {
  place: number
  neighbour: Neighbour
  nameOf: NameOf
}) {
  const told = (clashes: Neighbour['gained']) =>
    inList(clashes.map((clash) => clashFrom(place, clash, nameOf)))
  if (gained.length + ended.length === 0) {
    return <Status kind="none">Changes no clash</Status>
  }
  return (
    <>
      {ended.length > 0 ? <Status kind="done">No longer {told(ended)}</Status> : null}
      {gained.length > 0 ? <Status kind="attention">New: {told(gained)}</Status> : null}
    </>
  )
}
