'use client'

import { Trash2 } from 'lucide-react'
import { useRouter } from 'next/navigation'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { ConfirmDialog } from '@/components/ui/confirm-dialog'
import { toastDone, toastProblem } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'
import type { KitView } from '@/lib/kits/present'
import { kitInWords } from './words'

/** The action that deletes a kit. */
export type DeleteKitAction = (
  brand: string,
  input: { kitId: string },
) => Promise<ActionResult<unknown>>

/** Deletes a kit once that is confirmed, and goes to the list. */
export function DeleteKit({
  brand,
  kit,
  kits,
  remove,
}: {
  brand: string
  kit: Pick<KitView, 'id' | 'count' | 'askedAt'>
  /** The address of the line's kits. */
  kits: string
  remove: DeleteKitAction
}) {
  const router = useRouter()

  async function confirm() {
    const answer = await reach(remove(brand, { kitId: kit.id }))
    if (!answer.ok) {
      toastProblem(answer.message)
      return false
    }
    toastDone('Kit deleted.')
    router.push(kits as never)
    router.refresh()
    return true
  }

  return (
    <ConfirmDialog
      title="Delete this kit?"
      lost={<p>{kitInWords(kit)}: its file is removed, and links to it end.</p>}
      kept={<p>The combinations stay. The same kit can be built again.</p>}
      confirmLabel="Delete kit"
      onConfirm={confirm}
      trigger={
        <Button icon={<Trash2 aria-hidden="true" />} aria-label={`Delete ${kitInWords(kit)}`}>
          Delete kit
        </Button>
      }
    />
  )
}
