'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { LinkButton } from '@/components/ui/link-button'
import { toastDone, toastProblem, toastUndo } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'
import { KIT_LIMITS } from '@/lib/kits/constants'

/** An action about one combination. */
export type OnOne = (
  brand: string,
  input: { combinationId: string },
) => Promise<ActionResult<unknown>>

interface Named {
  id: string
  title: string
}

const named = (all: readonly Named[]) =>
  all.length === 1 ? all[0]!.title : `${all.length} combinations`

/** What can be done with the cards that are selected; it stays in sight while there are any. */
export function SelectionBar({
  brand,
  kitsHref,
  selected,
  onClear,
  remove,
  restore,
  onChanged,
}: {
  brand: string
  kitsHref: string
  selected: readonly Named[]
  onClear: () => void
  /** Null for those who may not delete. */
  remove: OnOne | null
  restore: OnOne
  /** The board has changed on the server. */
  onChanged: () => void
}) {
  const router = useRouter()
  const [pending, setPending] = useState(false)

  /** Does it to each. @returns those it was done to, after saying what went wrong with the others */
  async function toEach(all: readonly Named[], action: OnOne): Promise<Named[]> {
    const done: Named[] = []
    let problem: string | undefined
    for (const one of all) {
      const answer = await reach(action(brand, { combinationId: one.id }))
      if (answer.ok) done.push(one)
      else problem ??= answer.message
    }
    if (problem) toastProblem(problem)
    onChanged()
    return done
  }

  async function bringBack(all: readonly Named[]) {
    const back = await toEach(all, restore)
    if (back.length > 0)
      toastDone(back.length === 1 ? `${named(back)} is back.` : `${named(back)} are back.`)
    router.refresh()
  }

  async function removeAll(action: OnOne) {
    setPending(true)
    const gone = await toEach(selected, action)
    setPending(false)
    if (gone.length === 0) return
    onClear()
    toastUndo(`${named(gone)} deleted.`, () => void bringBack(gone))
  }

  if (selected.length === 0) return null
  const query = `?combinations=${selected.map(({ id }) => id).join(',')}`
  return (
    <section
      aria-label="Selected combinations"
      className="sticky bottom-0 z-10 mt-4 flex flex-wrap items-center gap-3 border-t border-rule bg-paper py-3 print:hidden"
    >
      <p className="mr-auto font-semibold">
        {selected.length === 1 ? '1 selected' : `${selected.length} selected`}
      </p>
      <Button variant="quiet" onClick={onClear}>
        Clear selection
      </Button>
      {remove ? (
        <Button pending={pending} pendingLabel="Deleting…" onClick={() => void removeAll(remove)}>
          {selected.length === 1 ? 'Delete combination' : 'Delete combinations'}
        </Button>
      ) : null}
      {selected.length > KIT_LIMITS.combinations ? (
        <p className="text-ink-soft">A kit holds {KIT_LIMITS.combinations} at most.</p>
      ) : (
        <LinkButton href={kitsHref + query}>Build a kit</LinkButton>
      )}
    </section>
  )
}
