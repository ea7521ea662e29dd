'use client'

import { Trash2 } from 'lucide-react'
import { useRouter } from 'next/navigation'
import { useState } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { toastDone, toastProblem, toastUndo } from '@/components/ui/toast'
import type { CombinationView } from '@/lib/combinations/present'
import type { ActionResult } from '@/lib/errors'

type OnOne = (brand: string, input: { combinationId: string }) => Promise<ActionResult<unknown>>

/** Deletes the combination at once, goes to the list, and offers to take it back. */
export function DeleteCombination({
  brand,
  combination: { id, title },
  list,
  remove,
  restore,
}: {
  brand: string
  combination: Pick<CombinationView, 'id' | 'title'>
  /** The address of the list. */
  list: string
  remove: OnOne
  restore: OnOne
}) {
  const router = useRouter()
  const [pending, setPending] = useState(false)
  const input = { combinationId: id }

  async function undo() {
    const answer = await reach(restore(brand, input))
    if (answer.ok) toastDone(`${title} is back.`)
    else toastProblem(answer.message)
    router.refresh()
  }

  async function send() {
    setPending(true)
    const answer = await reach(remove(brand, input))
    if (!answer.ok) {
      setPending(false)
      toastProblem(answer.message)
      return
    }
    toastUndo(`${title} deleted.`, () => void undo())
    router.push(list as never)
    router.refresh()
  }

  return (
    <Button
      icon={<Trash2 aria-hidden="true" />}
      pending={pending}
      pendingLabel="Deleting…"
      onClick={() => void send()}
    >
      Delete combination
    </Button>
  )
}
