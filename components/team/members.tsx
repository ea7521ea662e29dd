'use client'

import { useRouter } from 'next/navigation'
import { useRef, useState } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { ConfirmDialog } from '@/components/ui/confirm-dialog'
import { LedgerList } from '@/components/ui/ledger'
import { Status } from '@/components/ui/status'
import { toastDone, toastProblem } from '@/components/ui/toast'
import { VisuallyHidden } from '@/components/ui/visually-hidden'
import type { ActionResult } from '@/lib/errors'
import { ROLE_WORDS } from '@/lib/people/constants'
import type { MemberView } from '@/lib/team/present'
import type { ChangeRoleInput, MembershipIdInput } from '@/lib/team/schema'

import { ChangeRoleDialog } from './change-role-dialog'

/** What an owner may have done to a member. */
export interface MemberActions {
  changeRole: (brand: string, input: ChangeRoleInput) => Promise<ActionResult<unknown>>
  remove: (brand: string, input: MembershipIdInput) => Promise<ActionResult<unknown>>
}

/** Who is of the brand; with actions also what an owner changes about it. */
export function Members({
  brand,
  members,
  actions,
}: {
  brand: { slug: string; name: string }
  members: readonly MemberView[]
  actions?: MemberActions
}) {
  const router = useRouter()
  const list = useRef<HTMLUListElement>(null)
  const [changing, setChanging] = useState<MemberView>()
  const [removing, setRemoving] = useState<MemberView>()
  const owners = members.filter(({ role }) => role === 'owner').length

  async function remove({ id, name }: MemberView) {
    const answer = await reach(actions!.remove(brand.slug, { membershipId: id }))
    if (answer.ok) toastDone(`${name} is no longer in the team.`)
    else {
      toastProblem(answer.message)
      router.refresh()
    }
  }

  return (
    <>
      <LedgerList ref={list} tabIndex={-1} aria-label="Members" className="outline-none">
        {members.map((member) => (
          <li
            key={member.id}
            className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 py-3"
          >
            <div className="min-w-0">
              <p className="font-title text-lg break-words">
                {member.name}
                {member.isYou ? <span className="text-ink-faint"> (you)</span> : null}
              </p>
              {member.account ? (
                <p className="break-all text-ink-soft">{member.account.email}</p>
              ) : null}
              <p className="flex flex-wrap items-center gap-x-3 gap-y-1 text-sm text-ink-faint">
                <span>
                  <span className="text-ink-soft">{ROLE_WORDS[member.role]}</span> since{' '}
                  {member.since}
                </span>
                {member.account ? (
                  <Status kind={member.account.hasSecondFactor ? 'locked' : 'none'}>
                    {member.account.hasSecondFactor ? 'Second factor in use' : 'No second factor'}
                  </Status>
                ) : null}
              </p>
            </div>
            {actions ? (
              <div className="flex flex-wrap gap-2">
                {member.role === 'owner' && owners === 1 ? (
                  <p className="text-sm text-ink-faint">The only owner</p>
                ) : (
                  <Button size="small" onClick={() => setChanging(member)}>
                    Change role<VisuallyHidden> of {member.name}</VisuallyHidden>
                  </Button>
                )}
                {member.isYou ? null : (
                  <Button size="small" variant="quiet" onClick={() => setRemoving(member)}>
                    Remove<VisuallyHidden> {member.name}</VisuallyHidden>
                  </Button>
                )}
              </div>
            ) : null}
          </li>
        ))}
      </LedgerList>
      {actions ? (
        <>
          <ChangeRoleDialog
            // Another member is another form.
            key={changing?.id}
            brand={brand}
            member={changing}
            changeRole={actions.changeRole}
            onClose={() => setChanging(undefined)}
          />
          <ConfirmDialog
            open={removing !== undefined}
            onOpenChange={(open) => {
              if (!open) setRemoving(undefined)
            }}
            title={`Remove ${removing?.name ?? 'a member'}?`}
            lost={`${removing?.name} sees nothing of ${brand.name} any more, from their next click on. A letter tells them.`}
            kept="What they made stays. You can invite them again."
            confirmLabel="Remove member"
            cancelLabel="Keep member"
            onConfirm={() => remove(removing!)}
            focusAfter={list}
          />
        </>
      ) : null}
    </>
  )
}
