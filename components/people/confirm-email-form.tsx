'use client'

import { useState } from 'react'

import { LinkButton } from '@/components/ui/link-button'
import type { ActionResult } from '@/lib/errors'
import type { ConfirmEmailChangeInput } from '@/lib/people/schema'

import { Done } from './done'
import { PersonForm } from './person-form'
import { usePersonForm } from './use-person-form'

/** One button, since what opens links of letters for people must not confirm anything. */
export function ConfirmEmailForm({
  token,
  email,
  confirm,
}: {
  token: string
  email: string
  confirm: (input: ConfirmEmailChangeInput) => Promise<ActionResult<void>>
}) {
  const [done, setDone] = useState(false)
  const form = usePersonForm<ConfirmEmailChangeInput, void>({
    schema: () => import('@/lib/people/schema').then((it) => it.confirmEmailChangeSchema),
    values: { token },
    send: confirm,
    done: () => setDone(true),
  })
  if (done) {
    return (
      <Done
        title={`From now on you sign in with ${email}.`}
        action={
          <LinkButton href="/account" variant="primary">
            Go to your account
          </LinkButton>
        }
      />
    )
  }
  return (
    <PersonForm form={form} submit="Use this address" pendingLabel="Changing address…">
      <p className="break-words text-ink-soft">
        {email} is to be the address of your account on Woadmap. The one you had no longer signs you
        in.
      </p>
    </PersonForm>
  )
}
