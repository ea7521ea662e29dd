'use client'

import { useRouter } from 'next/navigation'
import { useState, type FormEvent } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { Dialog, DialogClose } from '@/components/ui/dialog'
import { Notice } from '@/components/ui/notice'
import { RadioGroup } from '@/components/ui/radio-group'
import { SubmitButton } from '@/components/ui/submit-button'
import { toastDone } from '@/components/ui/toast'
import { ROLES, ROLE_WORDS, type Role } from '@/lib/people/constants'
import { ROLE_HINTS, ROLE_PHRASES } from '@/lib/team/constants'
import type { MemberView } from '@/lib/team/present'

import type { MemberActions } from './members'

const OPTIONS = ROLES.map((role) => ({
  value: role,
  label: ROLE_WORDS[role],
  hint: ROLE_HINTS[role],
}))

/** The roles to choose from for one member; open while there is one. */
export function ChangeRoleDialog({
  brand,
  member,
  changeRole,
  onClose,
}: {
  brand: { slug: string; name: string }
  member?: MemberView
  changeRole: MemberActions['changeRole']
  onClose: () => void
}) {
  const router = useRouter()
  const [role, setRole] = useState<Role | undefined>(member?.role)
  const [pending, setPending] = useState(false)
  const [problem, setProblem] = useState<string>()

  async function save(event: FormEvent) {
    event.preventDefault()
    if (!member || !role || pending) return
    setPending(true)
    setProblem(undefined)
    const input = { membershipId: member.id, role, was: member.role }
    const answer = await reach(changeRole(brand.slug, input))
    setPending(false)
    if (!answer.ok) {
      setProblem(answer.message)
      router.refresh()
      return
    }
    toastDone(`${member.isYou ? 'You are' : `${member.name} is`} ${ROLE_PHRASES[role]} now.`)
    onClose()
  }

  return (
    <Dialog
      open={member !== undefined}
      onOpenChange={(open) => {
        if (!open && !pending) onClose()
      }}
      title={member?.isYou ? 'Change your own role' : `Change role of ${member?.name ?? ''}`}
      description={
        member?.isYou
          ? 'It holds at once. Another owner can give the role back to you.'
          : 'It holds from their next click on. A letter tells them.'
      }
      footer={
        <>
          <DialogClose>
            <Button>Keep role</Button>
          </DialogClose>
          <SubmitButton
            form="change-role"
            disabled={role === member?.role}
            pending={pending}
            pendingLabel="Changing role…"
          >
            Change role
          </SubmitButton>
        </>
      }
    >
      <form id="change-role" onSubmit={(event) => void save(event)} className="space-y-4">
        {problem ? <Notice kind="error">{problem}</Notice> : null}
        <RadioGroup
          legend="Role"
          hideLegend
          options={OPTIONS}
          value={role}
          onValueChange={setRole}
        />
      </form>
    </Dialog>
  )
}
