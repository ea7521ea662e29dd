'use client'

import { memo, useDeferredValue, useState } from 'react'

import { SegmentedControl } from '@/components/ui/radio-group'

import type { Band } from './bands'
import { clothInWords, FABRIC_KINDS, FABRIC_LABELS, type FabricKind } from './cloth-words'
import { Fabric } from './fabric'
import { Ground } from './ground'

/** One yarn of the cloth. */
export interface ClothBand {
  /** `#rrggbb`, for the screen. */
  color: string
  /** Its part of the whole; the parts need not sum to 1. */
  share: number
  name: string
}

const same = (one: readonly Band[], other: readonly Band[]) =>
  one.length === other.length &&
  one.every(({ hex, share, name }, at) => {
    const it = other[at]!
    return it.hex === hex && it.share === share && it.name === name
  })

/** Drawn anew only when a yarn, its share or the way of working is another. */
const Piece = memo(
  function Piece({ bands, kind }: { bands: readonly Band[]; kind: FabricKind }) {
    return (
      <figure className="space-y-3">
        <Ground className="flex justify-center border border-hairline p-4 print:border-0 print:p-0">
          <Fabric bands={bands} kind={kind} className="w-full max-w-[26rem]" />
        </Ground>
        <figcaption className="max-w-measure text-sm text-ink-soft">
          {clothInWords(kind, bands)}
        </figcaption>
      </figure>
    )
  },
  (one, other) => one.kind === other.kind && same(one.bands, other.bands),
)

/**
 * The yarns of a combination as cloth, worked in one of four ways; follows every edit, a moment
 * behind when the hand is quicker than the drawing.
 */
export function AsCloth({ bands }: { bands: readonly ClothBand[] }) {
  const [kind, setKind] = useState<FabricKind>('stripes')
  const shown = useDeferredValue(bands)
  return (
    <div className="space-y-4">
      <SegmentedControl
        legend="Worked as"
        hideLegend
        options={FABRIC_KINDS.map((value) => ({ value, label: FABRIC_LABELS[value] }))}
        value={kind}
        onValueChange={setKind}
        className="print:hidden"
      />
      {shown.length > 0 ? (
        <Piece
          kind={kind}
          bands={shown.map(({ color, share, name }) => ({ hex: color, share, name }))}
        />
      ) : (
        <p className="text-ink-soft">Put a shade in a place, and its cloth is drawn here.</p>
      )}
    </div>
  )
}
