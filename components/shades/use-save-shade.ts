'use client'

import { useRouter } from 'next/navigation'
import { useEffect, useRef } from 'react'

import { reach } from '@/components/reach'
import type { ActionResult } from '@/lib/errors'
import type { ShadeView } from '@/lib/shades/present'

import type { LinePlace, ShadesActions } from './shades-actions'

type Change = Omit<Parameters<ShadesActions['update']>[1], 'lineSlug' | 'shadeId' | 'version'>

/** Saves a change of one shade of the page; it is made of the shade as last saved. */
export type SaveShade = (
  shade: ShadeView,
  change: (latest: ShadeView) => Change,
) => Promise<ActionResult<ShadeView>>

/** How long a refusal waits for what stands now, in milliseconds. */
const PATIENCE = 5_000

/**
 * Saves changes of a table's shades, those of one shade one after another, so that two quick edits
 * of one row neither undo each other nor take each other for somebody else's. A conflict is
 * answered once the page shows what stands now; the next save is against that.
 */
export function useSaveShade(
  place: LinePlace,
  shades: readonly ShadeView[],
  update: ShadesActions['update'],
): SaveShade {
  const router = useRouter()
  const latest = useRef(new Map<string, ShadeView>())
  const last = useRef(new Map<string, Promise<unknown>>())
  const waiting = useRef<(() => void)[]>([])
  useEffect(() => {
    for (const shade of shades) latest.current.set(shade.id, shade)
    for (const goOn of waiting.current.splice(0)) goOn()
  }, [shades])

  function refresh(): Promise<void> {
    return new Promise((resolve) => {
      waiting.current.push(resolve)
      setTimeout(resolve, PATIENCE)
      router.refresh()
    })
  }

  return async (shade, change) => {
    const before = last.current.get(shade.id)
    const save = (async () => {
      await before
      const { lineSlug, brand } = place
      const current = latest.current.get(shade.id) ?? shade
      const { id: shadeId, version } = current
      const answer = await reach(update(brand, { lineSlug, shadeId, version, ...change(current) }))
      if (answer.ok) latest.current.set(shadeId, answer.data)
      else if (answer.code === 'conflict') await refresh()
      return answer
    })()
    last.current.set(shade.id, save)
    return save
  }
}
