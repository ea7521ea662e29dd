'use client'

import dynamic from 'next/dynamic'
import { useRouter } from 'next/navigation'
import { useState, type ReactNode } from 'react'

import { reach } from '@/components/reach'
import { toastDone, toastProblem, toastUndo } from '@/components/ui/toast'
import type { ShadeUses } from '@/lib/shades/present'

import { type LinePlace, type ShadesActions } from './shades-actions'

// Most deletions ask nothing.
const ConfirmDialog = dynamic(() =>
  import('@/components/ui/confirm-dialog').then((it) => it.ConfirmDialog),
)

interface Asked {
  shadeIds: string[]
  uses: ShadeUses
}

const count = (number: number, one: string, many = `${one}s`) =>
  `${number} ${number === 1 ? one : many}`

/**
 * Deletes shades: at once with an undo when no combination uses them, otherwise after saying where.
 * Render `dialog` somewhere.
 */
export function useDeleteShades({
  place,
  actions,
  onDeleted,
}: {
  place: LinePlace
  actions: Pick<ShadesActions, 'remove' | 'restore'>
  /** Leaves the page or refreshes it; by default it is refreshed. */
  onDeleted?: (shadeIds: string[]) => void
}): { remove: (shadeIds: string[]) => Promise<void>; pending: boolean; dialog: ReactNode } {
  const router = useRouter()
  const [asked, setAsked] = useState<Asked>()
  // Once asked, it stays to close by itself.
  const [asks, setAsks] = useState(false)
  const [pending, setPending] = useState(false)
  const { brand, lineSlug } = place

  async function undo(shadeIds: string[]) {
    const answer = await reach(actions.restore(brand, { lineSlug, shadeIds }))
    if (answer.ok) toastDone(`${count(shadeIds.length, 'shade')} put back.`)
    else toastProblem(answer.message)
    router.refresh()
  }

  async function send(shadeIds: string[], confirmed: boolean): Promise<boolean> {
    setPending(true)
    const answer = await reach(actions.remove(brand, { lineSlug, shadeIds, confirmed }))
    setPending(false)
    if (!answer.ok) {
      toastProblem(answer.message)
      return false
    }
    if (!answer.data.deleted) {
      setAsks(true)
      setAsked({ shadeIds, uses: answer.data.uses })
      return false
    }
    const deleted = answer.data.shadeIds
    toastUndo(`${count(deleted.length, 'shade')} deleted.`, () => void undo(deleted))
    if (onDeleted) onDeleted(deleted)
    else router.refresh()
    return true
  }

  const uses = asked?.uses
  const dialog = asks ? (
    <ConfirmDialog
      open={asked !== undefined}
      onOpenChange={(open) => {
        if (!open) setAsked(undefined)
      }}
      title={asked?.shadeIds.length === 1 ? 'Delete a shade in use?' : 'Delete shades in use?'}
      lost={
        uses ? (
          <>
            <p>
              {asked?.shadeIds.length === 1
                ? 'It stands'
                : count(uses.shadeIds.length, 'of them stands', 'of them stand')}{' '}
              in {count(uses.total, 'kept combination')}:
            </p>
            <ul className="mt-1 list-disc pl-5">
              {uses.combinations.map(({ combinationId, title }) => (
                <li key={combinationId}>{title}</li>
              ))}
            </ul>
            {uses.total > uses.combinations.length ? (
              <p className="mt-1">and {uses.total - uses.combinations.length} more.</p>
            ) : null}
          </>
        ) : null
      }
      kept="The combinations stay as they are and show these shades as deleted. You can take the deletion back right after."
      cancelLabel={asked?.shadeIds.length === 1 ? 'Keep it' : 'Keep them'}
      confirmLabel={
        asked?.shadeIds.length === 1
          ? 'Delete shade'
          : `Delete ${asked?.shadeIds.length ?? 0} shades`
      }
      onConfirm={() => (asked ? send(asked.shadeIds, true) : false)}
    />
  ) : null
  return {
    remove: async (shadeIds) => {
      await send(shadeIds, false)
    },
    pending,
    dialog,
  }
}
