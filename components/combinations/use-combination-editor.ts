'use client'

import { unstable_isUnrecognizedActionError as isUnknownAction, useRouter } from 'next/navigation'
import { useEffect, useState, useSyncExternalStore } from 'react'
import useSWR from 'swr'

import { reach } from '@/components/reach'
import type { CombinationView, PlaceView } from '@/lib/combinations/present'
import type { SaveCombinationValues } from '@/lib/combinations/schema'
import type { ActionResult, Failure } from '@/lib/errors'

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
 * @param knowsPhotograph whether a photograph is among those to choose from
 * @returns the store, and the places of all versions heard of, for the shades in them
 */
export function useCombinationEditor({
  brand,
  personId,
  view,
  save,
  knowsPhotograph,
}: {
  brand: string
  personId: string
  view: CombinationView
  save: SaveCombination
  knowsPhotograph: (id: string) => boolean
}): { store: EditorStore; heard: readonly PlaceView[] } {
  const { id, canEdit } = view
  const address = `/api/brands/${brand}/combinations/${id}`
  const router = useRouter()
  const [heard, setHeard] = useState<readonly PlaceView[]>(view.places)
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

  function note({ places, photographId, photograph }: CombinationView) {
    setHeard((known) => [
      ...known.filter((one) => !places.some(({ shade }) => shade?.id === one.shade?.id)),
      ...places,
    ])
    // One that was added since this page was made: its picture comes with the page.
    if (photograph && !knowsPhotograph(photographId!)) router.refresh()
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
  return { store, heard }
}

/** The state of an editor, for whoever draws it. */
export const useEditorState = (store: EditorStore) =>
  useSyncExternalStore(store.subscribe, store.getState, store.getState)
