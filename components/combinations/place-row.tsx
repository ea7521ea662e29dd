import type { ReactNode } from 'react'

import { WoundSample } from '@/components/yarn/wound-sample'
import { PLACE_ROLES } from '@/lib/combinations/constants'

import type { FilledPlace } from './words'

/** One of the five in running text: its role by its place, name, number and share. */
export function PlaceRow({
  place: { shade, share, gone },
  at,
  before,
  after,
}: {
  place: FilledPlace
  /** 0 to 4. */
  at: number
  before?: ReactNode
  after?: ReactNode
}) {
  return (
    <div className="flex items-center gap-3 py-3">
      {before}
      <WoundSample hex={shade.hex} />
      <div className="min-w-0 grow">
        <p className="font-title text-lg leading-tight break-words">{shade.label}</p>
        <p className="text-sm text-ink-faint">
          {PLACE_ROLES[at]}
          {shade.name ? ` · No. ${shade.number}` : ''} · {Math.round(share * 100)} %
          {gone ? ' · no longer in the line' : ''}
        </p>
      </div>
      {after}
    </div>
  )
}
