'use client'

import { useRouter } from 'next/navigation'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { ConfirmDialog } from '@/components/ui/confirm-dialog'
import { toastProblem } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'

/** Takes the person out of the brand, after asking; the only owner is told why not. */
export function LeaveBrandButton({
  brand,
  isOnlyOwner,
  leave,
}: {
  brand: { slug: string; name: string }
  isOnlyOwner: boolean
  leave: (brand: string, input: Record<string, never>) => Promise<ActionResult<unknown>>
}) {
  const router = useRouter()

  async function send() {
    const answer = await reach(leave(brand.slug, {}))
    if (!answer.ok) return toastProblem(answer.message)
    router.replace('/')
    // Nothing of the brand is kept in this tab.
    router.refresh()
  }

  if (isOnlyOwner) {
    return (
      <p className="max-w-measure text-ink-soft">
        You are the only owner of {brand.name}, and a brand needs one. Make somebody else an owner;
        then you can leave.
      </p>
    )
  }
  return (
    <ConfirmDialog
      title={`Leave ${brand.name}?`}
      lost={`You see nothing of ${brand.name} any more. To come back you need a new invitation.`}
      kept="What you made stays with the brand, and your account stays yours."
      confirmLabel={`Leave ${brand.name}`}
      cancelLabel="Stay"
      onConfirm={send}
      trigger={<Button>Leave {brand.name}</Button>}
    />
  )
}
