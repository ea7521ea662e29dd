'use client'

import dynamic from 'next/dynamic'
import { useRouter } from 'next/navigation'
import { useState } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { LedgerList } from '@/components/ui/ledger'
import { Notice } from '@/components/ui/notice'
import { toastDone } from '@/components/ui/toast'
import type { CombinationView, PlaceView } from '@/lib/combinations/present'
import type { ActionResult } from '@/lib/errors'

import { PlaceRow } from './place-row'

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
  const [places, setPlaces] = useState<PlaceView[]>(combination.places)
  const [sorting, setSorting] = useState(false)
  const [pending, setPending] = useState(false)
  const [problem, setProblem] = useState<string>()
  const [overtaken, setOvertaken] = useState(false)
  const router = useRouter()
  const changed = places.some(({ shade }, at) => shade.id !== combination.places[at]?.shade.id)

  async function save() {
    setPending(true)
    setProblem(undefined)
    const answer = await reach(
      reorder(brand, {
        combinationId: combination.id,
        version: combination.version,
        shadeIds: places.map(({ shade }) => shade.id),
      }),
    )
    setPending(false)
    if (answer.ok) {
      toastDone('Order saved')
      return
    }
    const conflict = answer.code === 'conflict'
    setOvertaken(conflict)
    setProblem(conflict ? OVERTAKEN : answer.message)
  }

  return (
    <section aria-label="The five shades" className="min-w-0">
      {sorting ? (
        <SortablePlaces places={places} onChange={setPlaces} />
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
                overtaken && (
                  <Button size="small" onClick={() => router.refresh()}>
                    Show theirs
                  </Button>
                )
              }
            >
              {problem}
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
                    setPlaces(combination.places)
                    setSorting(false)
                    setProblem(undefined)
                  }}
                >
                  Leave it as it was
                </Button>
              </>
            ) : (
              <Button onClick={() => setSorting(true)}>Change order</Button>
            )}
          </div>
        </div>
      ) : null}
    </section>
  )
}
