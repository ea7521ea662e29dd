'use client'

import { useRouter } from 'next/navigation'
import { useEffect, useRef } from 'react'

import type { ActionResult } from '@/lib/errors'
import type { ShadeView } from '@/lib/shades/present'

import { reach } from '@/components/reach'
import { type LinePlace, type ShadesActions } from './shades-actions'

type Change = Omit<Parameters<ShadesActions['update']>[1], 'lineSlug' | 'shadeId' | 'version'>

/** Saves a change of one shade of the page. */
export type SaveShade = (shade: ShadeView, change: Change) => Promise<ActionResult<ShadeView>>

/**
 * Saves changes of a table's shades, those of one shade one after another, so that two quick edits
 * of one row do not take each other for somebody else's. After a conflict the page shows what
 * stands now, and the next save is against that.
 */
export function useSaveShade(
  place: LinePlace,
  shades: readonly ShadeView[],
  update: ShadesActions['update'],
): SaveShade {
  const router = useRouter()
  const versions = useRef(new Map<string, number>())
  const last = useRef(new Map<string, Promise<unknown>>())
  useEffect(() => {
    for (const { id, version } of shades) versions.current.set(id, version)
  }, [shades])

  return async (shade, change) => {
    const before = last.current.get(shade.id)
    const save = (async () => {
      await before
      const version = versions.current.get(shade.id) ?? shade.version
      const { lineSlug, brand } = place
      const answer = await reach(update(brand, { lineSlug, shadeId: shade.id, version, ...change }))
      if (answer.ok) versions.current.set(shade.id, answer.data.version)
      else if (answer.code === 'conflict') router.refresh()
      return answer
    })()
    last.current.set(shade.id, save)
    return save
  }
}
