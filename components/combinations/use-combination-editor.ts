'use client'

import { unstable_isUnrecognizedActionError as isUnknownAction } from 'next/navigation'
import { useEffect, useMemo, useState, useSyncExternalStore } from 'react'
import useSWR from 'swr'

import { reach } from '@/components/reach'
import type { CombinationView } from '@/lib/combinations/present'
import type { SaveCombinationValues } from '@/lib/combinations/schema'
import type { ActionResult, Failure } from '@/lib/errors'
import type { ShadeView } from '@/lib/shades/present'

import { draftOf } from './draft'
import { createEditorStore, type EditorStore, type SavedDraft } from './editor-store'

/** The action that saves an open combination; answers the version it made. */
export type SaveCombination = (
  brand: string,
  values: SaveCombinationValues,
) => Promise<ActionResult<{ version: number }>>

/** Milliseconds between two looks at what others did. */
const LOOK_EVERY = 3_000

const UPDATED: Failure = {
  ok: false,
  code: 'invalid',
  message: 'Woadmap was updated. Reload the page; what you did is kept in this tab.',
}

const savedOf = (view: CombinationView): SavedDraft => ({
  version: view.version,
  draft: draftOf(view),
})

/** What the server has when it is newer than `version`; null when it is not. */
async function fetchNewer(address: string, version: number): Promise<CombinationView | null> {
  const answer = await fetch(`${address}?version=${version}`)
  if (!answer.ok) throw new Error(`the combination answered ${answer.status}`)
  return (await answer.json()) as CombinationView | null
}

/**
 * Opens a combination for editing: what is done is kept in this tab and saved by itself, and what
 * others save is heard of every three seconds.
 * @param view as the server rendered it
 * @returns the store, and every shade heard of since by its id
 */
export function useCombinationEditor({
  brand,
  personId,
  view,
  save,
}: {
  brand: string
  personId: string
  view: CombinationView
  save: SaveCombination
}): { store: EditorStore; heard: ReadonlyMap<string, ShadeView> } {
  const { id, canEdit } = view
  const address = `/api/brands/${brand}/combinations/${id}`
  const [heard, setHeard] = useState<ReadonlyMap<string, ShadeView>>(new Map())
  const [store] = useState(() =>
    createEditorStore({
      initial: savedOf(view),
      key: `woadmap:combination:${personId}:${id}`,
      storage: () => window.sessionStorage,
      save: ({ version, draft: { title, ...more } }) => {
        const values = { combinationId: id, version, title, ...(canEdit && more) }
        return reach(
          save(brand, values).catch((error: unknown) => {
            if (isUnknownAction(error)) return UPDATED
            throw error
          }),
        )
      },
      load: async () => {
        const newer = await fetchNewer(address, 0).catch(() => null)
        if (newer) note(newer)
        return newer && savedOf(newer)
      },
    }),
  )

  function note({ places }: CombinationView) {
    const shades = places.flatMap(({ shade }) => shade ?? [])
    setHeard((known) => new Map([...known, ...shades.map((one) => [one.id, one] as const)]))
  }

  useEffect(() => store.start(), [store])
  // A page rendered anew is news like any other.
  useEffect(() => store.hear(savedOf(view)), [store, view])

  useSWR(address, () => fetchNewer(address, store.getState().base.version), {
    refreshInterval: LOOK_EVERY,
    dedupingInterval: 1_000,
    errorRetryInterval: LOOK_EVERY,
    onSuccess: (newer) => {
      if (!newer) return
      note(newer)
      store.hear(savedOf(newer))
    },
  })
  return useMemo(() => ({ store, heard }), [store, heard])
}

/** The state of an editor, for whoever draws it. */
export const useEditorState = (store: EditorStore) =>
  useSyncExternalStore(store.subscribe, store.getState, store.getState)
