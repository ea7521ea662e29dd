'use client'

import { LedgerList } from '@/components/ui/ledger'
import type { Match } from '@/lib/color/match'

import { FiveRow } from './five-row'
import type { MatchShadeView } from './types'
import type { WishesControl } from './use-wishes'

/** Props of {@link FiveRows}. */
export interface FiveRowsProps {
  match: Match
  shades: readonly MatchShadeView[]
  control: WishesControl
  /** The shade whose region is held on the picture, if one is. */
  held: string | null
  onHold: (shadeId: string | null) => void
  /** The place that the pointer or the keyboard is at. */
  onPoint: (place: number | null) => void
}

/** The five as a ledger, light first: share of the picture, presence, difference, and wishes. */
export function FiveRows({ match, shades, control, held, onHold, onPoint }: FiveRowsProps) {
  const byId = new Map(shades.map((shade) => [shade.id, shade]))
  const chosen = new Set(match.places.map(({ shadeId }) => shadeId))
  const others = shades.filter(({ id }) => !chosen.has(id))
  return (
    <LedgerList aria-label="The five shades">
      {match.places.map((place, at) => {
        const shade = byId.get(place.shadeId)
        if (!shade) return null
        return (
          // By its place, not its shade: after a swap the keyboard stands where it stood.
          <FiveRow
            key={at}
            place={place}
            shade={shade}
            others={others}
            control={control}
            held={held === shade.id}
            onHold={(holds) => onHold(holds ? shade.id : null)}
            onPoint={(points) => onPoint(points ? at : null)}
          />
        )
      })}
    </LedgerList>
  )
}
