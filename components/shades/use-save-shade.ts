'use client'

import { reach } from '@/components/reach'
import { useSaveInTurn } from '@/components/use-save-in-turn'
import type { ActionResult } from '@/lib/errors'
import type { ShadeView } from '@/lib/shades/present'

import type { LinePlace, ShadesActions } from './shades-actions'

type Change = Omit<Parameters<ShadesActions['update']>[1], 'lineSlug' | 'shadeId' | 'version'>

/** Saves a change of one shade of the page; it is made of the shade as last saved. */
export type SaveShade = (
  shade: ShadeView,
  change: (latest: ShadeView) => Change,
) => Promise<ActionResult<ShadeView>>

/** Saves changes of a table's shades, those of one shade in turn. */
export function useSaveShade(
  { brand, lineSlug }: LinePlace,
  shades: readonly ShadeView[],
  update: ShadesActions['update'],
): SaveShade {
  const save = useSaveInTurn(shades)
  return (shade, change) =>
    save(shade, (latest) => {
      const { id: shadeId, version } = latest
      return reach(update(brand, { lineSlug, shadeId, version, ...change(latest) }))
    })
}
