'use client'

import { signIn } from 'next-auth/react'
import { useState } from 'react'
import { useForm } from 'react-hook-form'

import { PasswordField } from '@/components/people/password-field'
import { reach } from '@/components/reach'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { LinkButton } from '@/components/ui/link-button'
import { Notice } from '@/components/ui/notice'
import { schemaResolver } from '@/components/ui/schema-resolver'
import { SubmitButton } from '@/components/ui/submit-button'
import type { ActionResult } from '@/lib/errors'
import { PEOPLE_LIMITS } from '@/lib/people/constants'
import type { JoinAsNewPersonValues } from '@/lib/team/schema'

type Answer = ActionResult<{ email: string; brandSlug: string }>

/** Makes an account for the invited address, then signs in with it as ever. */
export function NewPersonForm({
  token,
  email,
  brandName,
  signInHref,
  join,
}: {
  token: string
  email: string
  brandName: string
  signInHref: string
  join: (values: JoinAsNewPersonValues) => Promise<Answer>
}) {
  const [problem, setProblem] = useState<{ message: string; hasAccount: boolean }>()
  const { register, handleSubmit, setError, formState } = useForm<JoinAsNewPersonValues>({
    resolver: schemaResolver(() =>
      import('@/lib/team/schema').then((it) => it.joinAsNewPersonSchema),
    ),
    defaultValues: { token, name: '', password: '' },
  })
  const { errors, isSubmitting } = formState

  async function onSubmit(values: JoinAsNewPersonValues) {
    setProblem(undefined)
    const answer = await reach(join(values))
    if (answer.ok) {
      const { brandSlug } = answer.data
      const credentials = { email, password: values.password, redirect: false } as const
      const signedIn = await signIn('credentials', credentials).catch(() => undefined)
      const isIn = signedIn?.ok && !signedIn.error
      return window.location.assign(isIn ? `/${brandSlug}` : `/sign-in?next=/${brandSlug}`)
    }
    const wrong = Object.entries(answer.fieldErrors ?? {})
    for (const [name, messages] of wrong) {
      setError(name as keyof JoinAsNewPersonValues, { message: messages[0] }, { shouldFocus: true })
    }
    if (wrong.length === 0) {
      setProblem({ message: answer.message, hasAccount: answer.code === 'conflict' })
    }
  }

  return (
    <form
      noValidate
      method="post"
      className="space-y-5"
      onSubmit={(event) => void handleSubmit(onSubmit)(event)}
    >
      <Field label="E-mail">
        <Input type="email" autoComplete="username" readOnly value={email} />
      </Field>
      <Field label="Your name" required hint="As your team knows you." error={errors.name?.message}>
        <Input autoComplete="name" maxLength={PEOPLE_LIMITS.name} {...register('name')} />
      </Field>
      <PasswordField fresh error={errors.password?.message} {...register('password')} />
      {problem ? (
        <Notice
          kind="error"
          actions={
            problem.hasAccount ? <LinkButton href={signInHref}>Sign in</LinkButton> : undefined
          }
        >
          {problem.message}
        </Notice>
      ) : null}
      <SubmitButton pending={isSubmitting} pendingLabel="Making account…">
        Make account and join {brandName}
      </SubmitButton>
    </form>
  )
}
