import type { ReactNode } from 'react'

import { WoundSample } from '@/components/yarn/wound-sample'

import type { MatchShadeView } from './types'

/** A shade offered for a colour, with how far it is and what can be done with it. */
export function ShadeChoice({
  shade,
  deltaE,
  note,
  children,
}: {
  shade: MatchShadeView
  deltaE: number
  /** What more is said of it. */
  note?: ReactNode
  children: ReactNode
}) {
  return (
    <li className="flex items-center gap-x-3 py-2 max-[23rem]:flex-wrap">
      <WoundSample hex={shade.hex} className="h-8 w-auto" />
      <span className="min-w-0 flex-1">
        <span className="block font-title leading-tight break-words">{shade.label}</span>
        <span className="text-sm text-ink-faint">
          {shade.name ? `No. ${shade.number} · ` : ''}
          <span className="whitespace-nowrap">ΔE00 {deltaE.toFixed(1)}</span>
        </span>
        {note ? <span className="flex flex-col">{note}</span> : null}
      </span>
      <span className="flex shrink-0 gap-1 max-[23rem]:w-full">{children}</span>
    </li>
  )
}
