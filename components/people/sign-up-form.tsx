'use client'

import { useState } from 'react'

import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import type { ActionResult } from '@/lib/errors'
import type { SignUpInput } from '@/lib/people/schema'

import { LetterSent } from './letter-sent'
import { PasswordField } from './password-field'
import { PersonForm } from './person-form'
import { usePersonForm } from './use-person-form'

/** Asks for an account and a brand; then says that a letter is on its way, whoever has the address. */
export function SignUpForm({
  signUp,
}: {
  signUp: (input: SignUpInput) => Promise<ActionResult<void>>
}) {
  const [sentTo, setSentTo] = useState<string>()
  const form = usePersonForm<SignUpInput, void>({
    schema: () => import('@/lib/people/schema').then((it) => it.signUpSchema),
    values: { name: '', email: '', password: '', brandName: '' },
    send: signUp,
    done: (_, { email }) => setSentTo(email),
  })
  const { register, errorOf } = form
  if (sentTo) {
    return (
      <LetterSent to={sentTo}>
        <p>Confirm your address with the link in it, and your brand is there.</p>
      </LetterSent>
    )
  }
  return (
    <PersonForm form={form} submit="Sign up" pendingLabel="Signing up…">
      <Field label="Name of your brand" required error={errorOf('brandName')}>
        <Input autoComplete="organization" {...register('brandName')} />
      </Field>
      <Field label="Your name" required error={errorOf('name')}>
        <Input autoComplete="name" {...register('name')} />
      </Field>
      <Field label="E-mail" required error={errorOf('email')}>
        <Input type="email" autoComplete="username" {...register('email')} />
      </Field>
      <PasswordField fresh error={errorOf('password')} {...register('password')} />
    </PersonForm>
  )
}
