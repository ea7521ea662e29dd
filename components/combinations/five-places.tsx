'use client'

import dynamic from 'next/dynamic'
import { useRouter } from 'next/navigation'
import { useState } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { LedgerList } from '@/components/ui/ledger'
import { Notice } from '@/components/ui/notice'
import { toastDone } from '@/components/ui/toast'
import type { CombinationView } from '@/lib/combinations/present'
import type { ActionResult } from '@/lib/errors'

import { PlaceRow } from './place-row'
import { filled, type FilledPlace } from './words'

// Only those who change the order need what drags.
const SortablePlaces = dynamic(() =>
  import('./sortable-places').then(({ SortablePlaces: Places }) => Places),
)

const OVERTAKEN =
  'Somebody else saved this combination first. Your order is not saved: look at theirs, then change it again if it needs to be.'

/** The action that puts the five in a new order. */
export type ReorderCombination = (
  brand: string,
  values: { combinationId: string; version: number; shadeIds: string[] },
) => Promise<ActionResult<{ version: number }>>

/** An order that was made from a version of the combination. */
interface Draft {
  version: number
  places: FilledPlace[]
}

/** The five places in their order; changing it is kept until it is saved. */
export function FivePlaces({
  brand,
  combination,
  reorder,
}: {
  brand: string
  combination: CombinationView
  reorder: ReorderCombination
}) {
  const router = useRouter()
  // Both are about one version: when a newer one comes, it is shown and they are of the past.
  const [draft, setDraft] = useState<Draft>()
  const [failure, setFailure] = useState<{ version: number; words: string; overtaken: boolean }>()
  const [sorting, setSorting] = useState(false)
  // The keyboard goes back to the button that began it.
  const [closed, setClosed] = useState(false)
  const [pending, setPending] = useState(false)
  const { id, version } = combination
  const places = draft?.version === version ? draft.places : filled(combination.places)
  const problem = failure?.version === version ? failure : undefined
  const changed = places.some(
    ({ shade }, at) => shade.id !== filled(combination.places)[at]?.shade.id,
  )

  function close() {
    setSorting(false)
    setClosed(true)
  }

  async function save() {
    setPending(true)
    setFailure(undefined)
    const shadeIds = places.map(({ shade }) => shade.id)
    const answer = await reach(reorder(brand, { combinationId: id, version, shadeIds }))
    setPending(false)
    if (answer.ok) {
      toastDone('Order saved')
      close()
      return
    }
    const overtaken = answer.code === 'conflict'
    setFailure({ version, overtaken, words: overtaken ? OVERTAKEN : answer.message })
  }

  return (
    <section aria-label="The five shades" className="min-w-0">
      {sorting ? (
        <SortablePlaces
          places={places}
          onChange={(moved) => setDraft({ version, places: moved })}
        />
      ) : (
        <LedgerList>
          {places.map((place, at) => (
            <li key={place.shade.id}>
              <PlaceRow place={place} at={at} />
            </li>
          ))}
        </LedgerList>
      )}
      {combination.canReorder ? (
        <div className="mt-4 space-y-3 print:hidden">
          {problem ? (
            <Notice
              kind="error"
              actions={
                problem.overtaken && (
                  <Button size="small" onClick={() => router.refresh()}>
                    Show theirs
                  </Button>
                )
              }
            >
              {problem.words}
            </Notice>
          ) : null}
          <div className="flex flex-wrap gap-3">
            {sorting ? (
              <>
                <Button
                  variant="primary"
                  disabled={!changed}
                  pending={pending}
                  pendingLabel="Saving order…"
                  onClick={() => void save()}
                >
                  Save order
                </Button>
                <Button
                  onClick={() => {
                    setDraft(undefined)
                    setFailure(undefined)
                    close()
                  }}
                >
                  Leave it as it was
                </Button>
              </>
            ) : (
              <Button autoFocus={closed} onClick={() => setSorting(true)}>
                Change order
              </Button>
            )}
          </div>
        </div>
      ) : null}
    </section>
  )
}
