'use client'

import { signIn } from 'next-auth/react'
import { useState } from 'react'
import { useForm } from 'react-hook-form'

import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { Notice } from '@/components/ui/notice'
import { schemaResolver } from '@/components/ui/schema-resolver'
import { SubmitButton } from '@/components/ui/submit-button'
import type { SignInInput } from '@/lib/people/schema'

import { PasswordField } from './password-field'

/** Why somebody was not let in. */
function inWords(error: string | null | undefined): string {
  const [kind, seconds] = error?.split(':') ?? []
  if (kind === 'CredentialsSignin')
    return 'That e-mail and password do not fit together. Check both and sign in again.'
  if (kind === 'code-refused')
    return 'That code is not good, or was used before. Wait for the next one, or use a recovery code.'
  if (kind === 'too-many')
    return `There were too many wrong attempts. Nothing is lost; try again in ${Math.ceil(Number(seconds) / 60)} minutes.`
  if (error && kind === 'failed') return error.slice('failed:'.length)
  return 'Signing in did not work just now; nothing you typed is wrong. Try again in a moment.'
}

/** Where to go on to: who used a recovery code hears how many are left. */
const onwards = (next: string, code = '') =>
  code === '' || /^\d{6}$/.test(code.replace(/[\s-]/g, ''))
    ? next
    : `/account/second-factor?recovery=used&next=${encodeURIComponent(next)}`

/** E-mail, password and, where it is asked for, a code; on success goes to `next`, an address within Woadmap. */
export function SignInForm({ next }: { next: string }) {
  const [problem, setProblem] = useState<string>()
  const [asksForCode, setAsksForCode] = useState(false)
  const { register, handleSubmit, setError, formState } = useForm<SignInInput>({
    resolver: schemaResolver(() => import('@/lib/people/schema').then((it) => it.signInSchema)),
    defaultValues: { email: '', password: '', code: '' },
  })

  async function onSubmit(input: SignInInput) {
    setProblem(undefined)
    if (asksForCode && !input.code) {
      return setError('code', { message: 'Write a code.' }, { shouldFocus: true })
    }
    try {
      const answer = await signIn('credentials', { ...input, redirect: false })
      // A whole page load, so that nothing rendered for the previous person is kept.
      if (answer?.ok && !answer.error) return window.location.assign(onwards(next, input.code))
      const { error } = answer ?? {}
      if (error === 'code-wanted') return setAsksForCode(true)
      setProblem(inWords(error))
    } catch {
      setProblem('Woadmap could not be reached. Check the connection and sign in again.')
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
      <Field label="E-mail" required error={formState.errors.email?.message}>
        <Input type="email" autoComplete="username" {...register('email')} />
      </Field>
      <PasswordField error={formState.errors.password?.message} {...register('password')} />
      {asksForCode ? (
        <Field
          label="Code"
          required
          hint="The six digits of your authenticator, or one of your recovery codes."
          error={formState.errors.code?.message}
        >
          <Input
            // It appears because the password fits: the next thing to type.
            autoFocus
            autoComplete="one-time-code"
            autoCapitalize="off"
            spellCheck={false}
            {...register('code')}
          />
        </Field>
      ) : null}
      <SubmitButton pending={formState.isSubmitting} pendingLabel="Signing in…">
        Sign in
      </SubmitButton>
    </form>
  )
}
