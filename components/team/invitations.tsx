'use client'

import { useRouter } from 'next/navigation'
import { useRef, useState } from 'react'

import { SheetSection } from '@/components/layout/sheet-header'
import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { ConfirmDialog } from '@/components/ui/confirm-dialog'
import { LedgerList } from '@/components/ui/ledger'
import { Status } from '@/components/ui/status'
import { toastDone, toastProblem } from '@/components/ui/toast'
import { VisuallyHidden } from '@/components/ui/visually-hidden'
import type { ActionResult } from '@/lib/errors'
import { ROLE_WORDS } from '@/lib/people/constants'
import type { InvitationView } from '@/lib/team/present'
import type { InvitationIdInput } from '@/lib/team/schema'

type OnOne = (brand: string, input: InvitationIdInput) => Promise<ActionResult<unknown>>

/** The invitations without an answer, to be sent again or withdrawn. */
export function Invitations({
  brand,
  invitations,
  resend,
  withdraw,
}: {
  brand: string
  invitations: readonly InvitationView[]
  resend: OnOne
  withdraw: OnOne
}) {
  const router = useRouter()
  const part = useRef<HTMLDivElement>(null)
  const [sending, setSending] = useState<string>()
  const [withdrawing, setWithdrawing] = useState<InvitationView>()

  async function send(act: OnOne, { id }: InvitationView, done: string) {
    const answer = await reach(act(brand, { invitationId: id }))
    if (answer.ok) toastDone(done)
    else {
      toastProblem(answer.message)
      router.refresh()
    }
  }

  async function sendAgain(invitation: InvitationView) {
    setSending(invitation.id)
    await send(
      resend,
      invitation,
      `Sent again to ${invitation.email}. The link before is void now.`,
    )
    setSending(undefined)
  }

  async function takeBack(invitation: InvitationView) {
    await send(withdraw, invitation, `The invitation of ${invitation.email} is withdrawn.`)
  }

  return (
    <SheetSection title="Open invitations">
      <div ref={part} tabIndex={-1} className="outline-none">
        {invitations.length === 0 ? (
          <p className="text-ink-soft">
            Nobody has an invitation that waits for an answer. Those you send stand here until they
            are accepted.
          </p>
        ) : (
          <LedgerList aria-label="Open invitations" className="border-y-0">
            {invitations.map((invitation) => (
              <li
                key={invitation.id}
                className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 py-3"
              >
                <div className="min-w-0">
                  <p className="break-all">{invitation.email}</p>
                  <p className="flex flex-wrap items-center gap-x-3 gap-y-1 text-sm text-ink-faint">
                    <span>
                      <span className="text-ink-soft">{ROLE_WORDS[invitation.role]}</span>
                      {invitation.invitedBy ? `, invited by ${invitation.invitedBy}` : null}
                    </span>
                    <Status kind={invitation.expired ? 'attention' : 'waiting'}>
                      {invitation.expired ? 'Expired' : 'Good until'} {invitation.until}
                    </Status>
                  </p>
                </div>
                <div className="flex flex-wrap gap-2">
                  <Button
                    size="small"
                    pending={sending === invitation.id}
                    pendingLabel="Sending…"
                    onClick={() => void sendAgain(invitation)}
                  >
                    Send again<VisuallyHidden> to {invitation.email}</VisuallyHidden>
                  </Button>
                  <Button size="small" variant="quiet" onClick={() => setWithdrawing(invitation)}>
                    Withdraw
                    <VisuallyHidden> the invitation of {invitation.email}</VisuallyHidden>
                  </Button>
                </div>
              </li>
            ))}
          </LedgerList>
        )}
      </div>
      <ConfirmDialog
        open={withdrawing !== undefined}
        onOpenChange={(open) => {
          if (!open) setWithdrawing(undefined)
        }}
        title="Withdraw this invitation?"
        lost={`The link that ${withdrawing?.email} was sent opens nothing any more. They are not told.`}
        kept="You can invite them again."
        confirmLabel="Withdraw invitation"
        cancelLabel="Keep invitation"
        onConfirm={() => takeBack(withdrawing!)}
        focusAfter={part}
      />
    </SheetSection>
  )
}
