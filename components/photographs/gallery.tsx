'use client'

import { Trash2 } from 'lucide-react'
import { useRouter } from 'next/navigation'
import { useState } from 'react'

import { reach } from '@/components/reach'
import { AppLink } from '@/components/ui/app-link'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { Status } from '@/components/ui/status'
import { toastDone, toastProblem, toastUndo } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'
import type { PhotographView } from '@/lib/photographs/present'
import { LICENCE_LABELS } from '@/lib/photographs/constants'

import { PhotographPicture } from './photograph-picture'
import { StateStatus } from './state-status'
import { useStandings } from './use-standings'

type OnSome = (
  brand: string,
  input: { photographIds: string[] },
) => Promise<ActionResult<{ count: number }>>

const count = (number: number) => (number === 1 ? '1 photograph' : `${number} photographs`)

/** A page of the line's photographs as a contact sheet; follows those that are being read. */
export function Gallery({
  brand,
  lineSlug,
  photographs,
  remove,
  restore,
}: {
  brand: string
  lineSlug: string
  photographs: readonly PhotographView[]
  remove: OnSome
  restore: OnSome
}) {
  const router = useRouter()
  const { standings } = useStandings(brand, photographs)
  const [chosen, setChosen] = useState<ReadonlySet<string>>(new Set())
  const [pending, setPending] = useState(false)
  const selected = photographs.filter(({ id }) => chosen.has(id)).map(({ id }) => id)
  const canDelete = photographs.some((photograph) => photograph.canDelete)

  function toggle(id: string) {
    const next = new Set(chosen)
    if (!next.delete(id)) next.add(id)
    setChosen(next)
  }

  async function undo(photographIds: string[]) {
    const answer = await reach(restore(brand, { photographIds }))
    if (answer.ok) toastDone(`${count(answer.data.count)} put back.`)
    else toastProblem(answer.message)
    router.refresh()
  }

  async function removeSelected() {
    setPending(true)
    const answer = await reach(remove(brand, { photographIds: selected }))
    setPending(false)
    if (!answer.ok) {
      toastProblem(answer.message)
      return
    }
    setChosen(new Set())
    toastUndo(`${count(answer.data.count)} deleted.`, () => void undo(selected))
  }

  return (
    <>
      <ul
        role="list"
        className="grid grid-cols-1 gap-x-8 gap-y-8 min-[480px]:grid-cols-2 lg:grid-cols-3"
      >
        {photographs.map((photograph) => {
          const { id, title, altText, licence, photographer } = photograph
          const { state } = standings.get(id) ?? photograph
          return (
            <li key={id} className="min-w-0">
              <AppLink
                href={`/${brand}/lines/${lineSlug}/photographs/${id}`}
                className="group block"
              >
                <span className="block aspect-[3/2] bg-wash">
                  <PhotographPicture
                    fit="frame"
                    photograph={photograph}
                    sizes="(min-width: 1152px) 20rem, (min-width: 480px) 45vw, 92vw"
                  />
                </span>
                <span className="mt-2 block font-title text-lg leading-tight break-words group-hover:underline">
                  {title}
                </span>
              </AppLink>
              <p className="mt-0.5 text-sm text-ink-faint">
                {[photographer, licence && LICENCE_LABELS[licence]].filter(Boolean).join(' · ')}
              </p>
              <div className="mt-1 flex flex-wrap gap-x-4 gap-y-1">
                {state === 'ready' ? null : <StateStatus state={state} />}
                {licence ? null : <Status kind="attention">No licence</Status>}
                {altText ? null : <Status kind="draft">No alt text</Status>}
              </div>
              {photograph.canDelete ? (
                <Checkbox
                  className="print:hidden"
                  label={
                    <>
                      Select <span className="sr-only">{title}</span>
                    </>
                  }
                  checked={chosen.has(id)}
                  onChange={() => toggle(id)}
                />
              ) : null}
            </li>
          )
        })}
      </ul>
      {canDelete && selected.length > 0 ? (
        <div className="sticky bottom-0 mt-6 flex flex-wrap items-center gap-3 border-t border-rule bg-paper py-3 print:hidden">
          <p className="grow">{count(selected.length)} selected</p>
          <Button onClick={() => setChosen(new Set())}>Select none</Button>
          <Button
            icon={<Trash2 aria-hidden="true" />}
            pending={pending}
            pendingLabel="Deleting…"
            onClick={() => void removeSelected()}
          >
            Delete photographs
          </Button>
        </div>
      ) : null}
    </>
  )
}
