'use client'

import { useState, type ComponentProps } from 'react'

import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { VisuallyHidden } from '@/components/ui/visually-hidden'
import { PASSWORD_LENGTH } from '@/lib/people/constants'

/** Props of {@link PasswordField}: those of the input, and of the field around it. */
export interface PasswordFieldProps extends Omit<ComponentProps<'input'>, 'type'> {
  label?: string
  error?: string
  /** A password to be, rather than one that somebody has: says its one rule. */
  fresh?: boolean
}

/** A password, with a button that shows what was typed. */
export function PasswordField({
  label = 'Password',
  error,
  fresh = false,
  ...input
}: PasswordFieldProps) {
  const [shown, setShown] = useState(false)
  return (
    <div className="relative">
      <Field
        label={label}
        required
        error={error}
        hint={
          fresh
            ? `At least ${PASSWORD_LENGTH.min} characters. Three or four words are easy to keep in mind.`
            : undefined
        }
      >
        <Input
          type={shown ? 'text' : 'password'}
          autoComplete={fresh ? 'new-password' : 'current-password'}
          autoCapitalize="off"
          autoCorrect="off"
          spellCheck={false}
          {...input}
        />
      </Field>
      {/* After the field for the keyboard, beside its label for the eye. */}
      <Button
        variant="quiet"
        size="small"
        className="absolute -top-1.5 -right-2.5"
        onClick={() => setShown(!shown)}
      >
        {shown ? 'Hide' : 'Show'}
        <VisuallyHidden> {label.toLowerCase()}</VisuallyHidden>
      </Button>
    </div>
  )
}
