'use client'

import { Lock } from 'lucide-react'
import dynamic from 'next/dynamic'

import { Button } from '@/components/ui/button'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { MatchPlace } from '@/lib/color/match'

import type { MatchShadeView } from './types'
import type { WishesControl } from './use-wishes'

// What places the popover is loaded after the page.
const SwapShade = dynamic(() => import('./swap-shade').then((it) => it.SwapShade))

/** Props of {@link FiveRow}. */
export interface FiveRowProps {
  place: MatchPlace
  shade: MatchShadeView
  /** The shades that are not of the five. */
  others: readonly MatchShadeView[]
  control: WishesControl
  /** Its region is held on the picture. */
  held: boolean
  onHold: (holds: boolean) => void
  onPoint: (points: boolean) => void
}

/** One of the five in running text, with what can be asked of it. */
export function FiveRow(props: FiveRowProps) {
  const { place, shade, others, control, held, onHold, onPoint } = props
  const of = <span className="sr-only">{shade.label}</span>
  return (
    <li
      onPointerEnter={() => onPoint(true)}
      onPointerLeave={() => onPoint(false)}
      onFocus={({ target }) => target.matches(':focus-visible') && onPoint(true)}
      onBlur={() => onPoint(false)}
      className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 pt-3 pb-1.5 print:pb-3"
    >
      <WoundSample hex={shade.hex} className="mt-0.5 sm:row-span-2" />
      <div className="flex flex-wrap justify-between gap-x-4 sm:flex-nowrap">
        <div className="min-w-0">
          <p className="font-title text-lg leading-tight break-words">{shade.label}</p>
          <p className="text-sm text-ink-soft">
            {shade.name ? `No. ${shade.number} · ` : ''}
            {place.inPhotograph ? `${inPercent(place.share)} of the picture` : 'not in the picture'}
            {place.locked ? (
              <span className="whitespace-nowrap">
                {' · '}
                <Lock aria-hidden="true" className="inline size-3.5 align-[-2px]" /> locked
              </span>
            ) : null}
          </p>
        </div>
        <Figures place={place} />
      </div>
      <div className="mt-0.5 -ml-2.5 flex flex-wrap max-sm:col-span-2 sm:col-start-2 print:hidden">
        <Button
          size="small"
          variant="quiet"
          aria-pressed={held}
          disabled={!place.inPhotograph}
          className="aria-pressed:underline"
          onClick={() => onHold(!held)}
        >
          Show <span className="sr-only">{shade.label} on the picture</span>
        </Button>
        <Button
          size="small"
          variant="quiet"
          onClick={() => (place.locked ? control.unlock(shade.id) : control.lock(shade.id))}
        >
          {place.locked ? 'Unlock' : 'Lock'} {of}
        </Button>
        <SwapShade shade={shade} others={others} onSwap={(to) => control.swap(shade.id, to)} />
        <Button size="small" variant="quiet" onClick={() => control.exclude(shade.id)}>
          Exclude {of}
        </Button>
      </div>
    </li>
  )
}

/** What little there is of a shade is still something. */
function inPercent(share: number): string {
  const percent = Math.round(share * 100)
  return percent === 0 ? 'less than 1 %' : `${percent} %`
}

function Figures({ place: { deltaE, presence } }: { place: MatchPlace }) {
  return (
    <p className="flex flex-wrap gap-x-3 text-sm text-ink-faint sm:block sm:shrink-0 sm:text-right">
      {deltaE === null ? null : (
        <abbr
          title="Mean ΔE00 to the parts of the picture it stands for"
          className="block whitespace-nowrap no-underline"
        >
          ΔE00 {deltaE.toFixed(1)}
        </abbr>
      )}
      <abbr
        title="ΔE00 within which at least 1 % of the picture lies"
        className="block whitespace-nowrap no-underline"
      >
        presence {presence.toFixed(1)}
      </abbr>
    </p>
  )
}
