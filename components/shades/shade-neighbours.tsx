import { AppLink } from '@/components/ui/app-link'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { ShadeView } from '@/lib/shades/present'

import { shadesHref, type LinePlace } from './shades-actions'

/** The shades of the line nearest to one, with how far they are. */
export function ShadeNeighbours({
  place,
  shade,
  neighbours,
  hrefOf = (id) => shadesHref(place, `/${id}`),
}: {
  place: LinePlace
  shade: ShadeView
  neighbours: readonly { shade: ShadeView; difference: number }[]
  /** Where a neighbour leads; its own page unless told. */
  hrefOf?: (shadeId: string) => string
}) {
  if (neighbours.length === 0) return <p>It is the only shade of the line.</p>
  const isMixed = neighbours.some((neighbour) => neighbour.shade.observer !== shade.observer)
  return (
    <>
      <ul role="list" className="space-y-2 pt-1">
        {neighbours.map(({ shade: neighbour, difference }) => (
          <li key={neighbour.id}>
            <AppLink href={hrefOf(neighbour.id)} className="group flex items-center gap-3">
              <WoundSample hex={neighbour.hex} className="h-8 w-auto" />
              <span className="min-w-0 grow">
                <span className="block font-title leading-tight break-words text-ink group-hover:underline">
                  {neighbour.label}
                </span>
                {neighbour.name ? (
                  <span className="text-sm text-ink-faint">No. {neighbour.number}</span>
                ) : null}
              </span>
              <span className="text-right text-sm whitespace-nowrap">
                ΔE00 {difference.toFixed(1)}
              </span>
            </AppLink>
          </li>
        ))}
      </ul>
      {isMixed ? (
        <p className="text-sm">
          Some of these were read with the other observer; their figures are a guide only.
        </p>
      ) : null}
    </>
  )
}
