'use client'

import { useRouter } from 'next/navigation'
import { useEffect, useRef } from 'react'

import type { ActionResult } from '@/lib/errors'

/** How long a refusal waits for what stands now, in milliseconds. */
const PATIENCE = 5_000

/** Saves a change of one row of the page; it is made of the row as last saved. */
export type SaveInTurn<Row> = (
  row: Row,
  save: (latest: Row) => Promise<ActionResult<Row>>,
) => Promise<ActionResult<Row>>

/**
 * Saves changes of a table's rows, those of one row one after another, so that two quick edits of
 * one row neither undo each other nor take each other for somebody else's. A conflict is answered
 * once the page shows what stands now; the next save is against that.
 */
export function useSaveInTurn<Row extends { id: string }>(rows: readonly Row[]): SaveInTurn<Row> {
  const router = useRouter()
  const latest = useRef(new Map<string, Row>())
  const last = useRef(new Map<string, Promise<unknown>>())
  const waiting = useRef<(() => void)[]>([])
  useEffect(() => {
    for (const row of rows) latest.current.set(row.id, row)
    for (const goOn of waiting.current.splice(0)) goOn()
  }, [rows])

  function refresh(): Promise<void> {
    return new Promise((resolve) => {
      waiting.current.push(resolve)
      setTimeout(resolve, PATIENCE)
      router.refresh()
    })
  }

  return async (row, save) => {
    const before = last.current.get(row.id)
    const saving = (async () => {
      await before
      const answer = await save(latest.current.get(row.id) ?? row)
      if (answer.ok) latest.current.set(row.id, answer.data)
      else if (answer.code === 'conflict') await refresh()
      return answer
    })()
    last.current.set(row.id, saving)
    return saving
  }
}
