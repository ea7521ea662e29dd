'use client'

import { useState } from 'react'
import { useForm, useWatch } from 'react-hook-form'

import { reach } from '@/components/reach'
import { Field } from '@/components/ui/field'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { schemaResolver } from '@/components/ui/schema-resolver'
import { Select } from '@/components/ui/select'
import { SubmitButton } from '@/components/ui/submit-button'
import { Textarea } from '@/components/ui/textarea'
import type { ActionResult } from '@/lib/errors'
import { ROLES, ROLE_WORDS } from '@/lib/people/constants'
import { INVITATION_DAYS, ROLE_HINTS, TEAM_LIMITS } from '@/lib/team/constants'
import type { InviteMembersValues } from '@/lib/team/schema'

/** What became of each address. */
interface Answer {
  invited: string[]
  members: string[]
  waiting: string[]
}

const newForm = (role: InviteMembersValues['role'] = 'designer'): InviteMembersValues => ({
  emails: '',
  role,
  requestKey: crypto.randomUUID(),
})

/** Invites one or several addresses in one role, and says what became of each. */
export function InviteForm({
  brand,
  invite,
}: {
  brand: string
  invite: (brand: string, values: InviteMembersValues) => Promise<ActionResult<Answer>>
}) {
  const [problem, setProblem] = useState<string>()
  const [answer, setAnswer] = useState<Answer>()
  const [defaultValues] = useState(newForm)
  const form = useForm<InviteMembersValues>({
    resolver: schemaResolver(() =>
      import('@/lib/team/schema').then((it) => it.inviteMembersSchema),
    ),
    defaultValues,
  })
  const { register, handleSubmit, setError, formState } = form
  const role = useWatch({ control: form.control, name: 'role' })

  async function onSubmit() {
    setProblem(undefined)
    setAnswer(undefined)
    // As they were written: the action reads them by the same schema.
    const values = form.getValues()
    const result = await reach(invite(brand, values))
    if (result.ok) {
      setAnswer(result.data)
      form.reset(newForm(values.role))
      form.setFocus('emails')
      return
    }
    const wrong = result.fieldErrors?.emails?.[0]
    if (wrong) setError('emails', { message: wrong }, { shouldFocus: true })
    else setProblem(result.message)
  }

  return (
    <form
      noValidate
      className="max-w-measure space-y-5"
      onSubmit={(event) => void handleSubmit(onSubmit)(event)}
    >
      <Field
        label="E-mail addresses"
        required
        hint={`One a line, or with commas; at most ${TEAM_LIMITS.addresses} at once. Each gets a letter with a link of its own, good for ${INVITATION_DAYS} days.`}
        error={formState.errors.emails?.message}
      >
        <Textarea
          rows={2}
          className="min-h-16"
          autoComplete="off"
          autoCapitalize="off"
          spellCheck={false}
          {...register('emails')}
        />
      </Field>
      <Field label="Role" hint={ROLE_HINTS[role]} className="sm:max-w-sm">
        <Select {...register('role')}>
          {ROLES.map((one) => (
            <option key={one} value={one}>
              {ROLE_WORDS[one]}
            </option>
          ))}
        </Select>
      </Field>
      {problem ? <Notice kind="error">{problem}</Notice> : null}
      <LiveRegion visible>{answer ? <Outcome answer={answer} /> : null}</LiveRegion>
      <SubmitButton pending={formState.isSubmitting} pendingLabel="Sending invitations…">
        Send invitations
      </SubmitButton>
    </form>
  )
}

function Outcome({ answer: { invited, members, waiting } }: { answer: Answer }) {
  return (
    <Notice kind={invited.length > 0 ? 'info' : 'warning'}>
      <div className="space-y-1 break-words">
        {invited.length > 0 ? <p>Invited: {invited.join(', ')}.</p> : null}
        {members.length > 0 ? <p>In the team already: {members.join(', ')}.</p> : null}
        {waiting.length > 0 ? (
          <p>Invited before, and not answered yet: {waiting.join(', ')}.</p>
        ) : null}
      </div>
    </Notice>
  )
}
