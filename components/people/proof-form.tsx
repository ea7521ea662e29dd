'use client'

import { useState } from 'react'
import { useForm } from 'react-hook-form'

import { reach } from '@/components/reach'
import type { ButtonVariant } from '@/components/ui/button-class'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { Notice } from '@/components/ui/notice'
import { SubmitButton } from '@/components/ui/submit-button'
import type { ActionResult } from '@/lib/errors'

import type { Proof } from './second-factor-types'

const EITHER = 'The six digits of your authenticator, or one of your recovery codes.'

/** Asks who it is, by password, by code or by both, and does what its button says. */
export function ProofForm<Asked extends keyof Proof, Data>({
  asks,
  codeHint = EITHER,
  send,
  onDone,
  label,
  pendingLabel,
  variant,
}: {
  asks: readonly Asked[]
  codeHint?: string
  send: (proof: Pick<Proof, Asked>) => Promise<ActionResult<Data>>
  onDone: (data: Data) => void
  /** The button: a verb with its object. */
  label: string
  pendingLabel: string
  variant?: ButtonVariant
}) {
  const [problem, setProblem] = useState<string>()
  const { register, handleSubmit, setError, formState } = useForm<Proof>({
    defaultValues: { password: '', code: '' },
    shouldUnregister: true,
  })
  const { errors, isSubmitting } = formState
  const wants = (field: keyof Proof) => (asks as readonly (keyof Proof)[]).includes(field)

  async function onSubmit(proof: Pick<Proof, Asked>) {
    setProblem(undefined)
    const answer = await reach(send(proof))
    if (answer.ok) return onDone(answer.data)
    const wrong = Object.entries(answer.fieldErrors ?? {})
    if (wrong.length === 0) setProblem(answer.message)
    for (const [field, messages] of wrong) {
      setError(field as Asked, { message: messages[0] }, { shouldFocus: true })
    }
  }

  return (
    <form
      noValidate
      method="post"
      className="space-y-5"
      onSubmit={(event) => void handleSubmit(onSubmit)(event)}
    >
      {problem ? <Notice kind="error">{problem}</Notice> : null}
      {wants('password') ? (
        <Field label="Password" required error={errors.password?.message}>
          <Input
            type="password"
            autoComplete="current-password"
            {...register('password', { required: 'Write your password.' })}
          />
        </Field>
      ) : null}
      {wants('code') ? (
        <Field label="Code" required hint={codeHint} error={errors.code?.message}>
          <Input
            autoComplete="one-time-code"
            autoCapitalize="off"
            spellCheck={false}
            inputMode={codeHint === EITHER ? undefined : 'numeric'}
            {...register('code', { required: 'Write a code.' })}
          />
        </Field>
      ) : null}
      <SubmitButton variant={variant} pending={isSubmitting} pendingLabel={pendingLabel}>
        {label}
      </SubmitButton>
    </form>
  )
}
