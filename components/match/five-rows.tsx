'use client'

import { ArrowLeftRight, CircleMinus, Eye, Lock, LockOpen } from 'lucide-react'

import { Button } from '@/components/ui/button'
import { IconButton } from '@/components/ui/icon-button'
import { LedgerList } from '@/components/ui/ledger'
import { Popover } from '@/components/ui/popover'
import { WoundSample } from '@/components/yarn/wound-sample'
import { nearestShades, type Match, type MatchPlace } from '@/lib/color/match'

import { ShadeChoice } from './shade-choice'
import type { MatchShadeView } from './types'
import type { WishesControl } from './use-wishes'

/** Props of {@link FiveRows}. */
export interface FiveRowsProps {
  match: Match
  shades: readonly MatchShadeView[]
  control: WishesControl
  /** The place whose region is held on the picture, if one is. */
  held: number | null
  onHold: (place: number | null) => void
  /** The place that the pointer is over. */
  onPoint: (place: number | null) => void
}

const NEIGHBOURS = 5

/** The five as a ledger, light first: share of the picture, presence, difference, and wishes. */
export function FiveRows({ match, shades, control, held, onHold, onPoint }: FiveRowsProps) {
  const byId = new Map(shades.map((shade) => [shade.id, shade]))
  const chosen = new Set(match.places.map(({ shadeId }) => shadeId))
  return (
    <LedgerList aria-label="The five shades">
      {match.places.map((place, at) => {
        const shade = byId.get(place.shadeId)
        if (!shade) return null
        const others = shades.filter(({ id }) => !chosen.has(id))
        return (
          <li
            key={shade.id}
            onPointerEnter={() => onPoint(at)}
            onPointerLeave={() => onPoint(null)}
            className="flex items-start gap-4 py-3"
          >
            <WoundSample hex={shade.hex} className="mt-0.5" />
            <div className="min-w-0 grow">
              <p className="font-title text-lg leading-tight break-words">{shade.label}</p>
              <p className="text-sm text-ink-faint">
                {shade.name ? `No. ${shade.number} · ` : ''}
                <Standing place={place} />
              </p>
              <div className="mt-1 -ml-2 flex items-center gap-1 print:hidden">
                <IconButton
                  label={
                    held === at ? `Show the whole picture` : `Show ${shade.label} on the picture`
                  }
                  icon={<Eye />}
                  aria-pressed={held === at}
                  disabled={!place.inPhotograph}
                  onClick={() => onHold(held === at ? null : at)}
                />
                <IconButton
                  label={place.locked ? `Unlock ${shade.label}` : `Lock ${shade.label}`}
                  icon={place.locked ? <Lock /> : <LockOpen />}
                  aria-pressed={place.locked}
                  onClick={() => (place.locked ? control.unlock(shade.id) : control.lock(shade.id))}
                />
                <Popover
                  align="end"
                  label={`Neighbours of ${shade.label}`}
                  trigger={
                    <Button
                      size="small"
                      variant="quiet"
                      icon={<ArrowLeftRight aria-hidden="true" />}
                    >
                      Swap<span className="sr-only"> {shade.label}</span>
                    </Button>
                  }
                >
                  <p className="text-sm text-ink-faint">Nearest to {shade.label}</p>
                  <ul role="list" className="divide-y divide-hairline">
                    {nearestShades(shade.lab, others, NEIGHBOURS).map(({ shadeId, deltaE }) => {
                      const other = byId.get(shadeId)!
                      return (
                        <ShadeChoice key={shadeId} shade={other} deltaE={deltaE}>
                          <Button size="small" onClick={() => control.swap(shade.id, shadeId)}>
                            Take<span className="sr-only"> {other.label}</span>
                          </Button>
                        </ShadeChoice>
                      )
                    })}
                  </ul>
                </Popover>
                <IconButton
                  label={`Exclude ${shade.label}`}
                  icon={<CircleMinus />}
                  onClick={() => control.exclude(shade.id)}
                />
              </div>
            </div>
          </li>
        )
      })}
    </LedgerList>
  )
}

function Standing({ place }: { place: MatchPlace }) {
  if (!place.inPhotograph || place.deltaE === null) {
    return <>not in the photograph (nearest part ΔE00 {place.presence.toFixed(1)})</>
  }
  return (
    <>
      {Math.round(place.share * 100)} % of the picture ·{' '}
      <abbr title="Mean ΔE00 to the parts of the picture it stands for" className="no-underline">
        ΔE00 {place.deltaE.toFixed(1)}
      </abbr>{' '}
      ·{' '}
      <abbr title="ΔE00 within which at least 1 % of the picture lies" className="no-underline">
        presence {place.presence.toFixed(1)}
      </abbr>
    </>
  )
}
