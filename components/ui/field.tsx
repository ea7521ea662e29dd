'use client'

import { CircleAlert } from 'lucide-react'
import { createContext, use, useId, type ReactNode } from 'react'
import { cn } from './cn'

interface FieldWiring {
  id: string
  'aria-describedby'?: string
  'aria-invalid'?: true
  required?: boolean
}

const FieldContext = createContext<FieldWiring | null>(null)

/** The id and aria attributes that the {@link Field} around a control gives it. */
export const useFieldWiring = (): Partial<FieldWiring> => use(FieldContext) ?? {}

/** Props of {@link Field}. */
export interface FieldProps {
  label: ReactNode
  hint?: ReactNode
  /** What is wrong and how to put it right; a list of messages shows its first. */
  error?: string | string[]
  required?: boolean
  /** Says "optional" beside the label, where most fields of a form are required. */
  optional?: boolean
  hideLabel?: boolean
  className?: string
  /** One Input, Textarea, Select or Slider. */
  children: ReactNode
}

/** A label, a hint and an error, wired to the one control inside. */
export function Field({
  label,
  hint,
  error,
  required,
  optional,
  hideLabel,
  className,
  children,
}: FieldProps) {
  const id = useId()
  const message = Array.isArray(error) ? error[0] : error
  const describedBy = [message && `${id}-error`, hint && `${id}-hint`].filter(Boolean).join(' ')
  return (
    <div className={className}>
      <label htmlFor={id} className={hideLabel ? 'sr-only' : 'mb-1 block font-medium'}>
        {label}
        {optional ? <span className="font-normal text-ink-faint"> (optional)</span> : null}
      </label>
      <FieldContext
        value={{
          id,
          'aria-describedby': describedBy || undefined,
          'aria-invalid': message ? true : undefined,
          required,
        }}
      >
        {children}
      </FieldContext>
      {message ? <FieldError id={`${id}-error`}>{message}</FieldError> : null}
      {hint ? (
        <p id={`${id}-hint`} className="mt-1 max-w-measure text-sm text-ink-faint">
          {hint}
        </p>
      ) : null}
    </div>
  )
}

/** The line under a control that says what is wrong. */
export function FieldError({ id, children }: { id: string; children: ReactNode }) {
  return (
    <p id={id} className="mt-1 flex items-start gap-1.5 text-sm font-semibold">
      <CircleAlert aria-hidden="true" className="mt-px size-4 shrink-0" />
      <span>{children}</span>
    </p>
  )
}

/** The look that input, textarea and select share. */
export const controlClass = (className?: string): string =>
  cn(
    'border-rule bg-sheet text-ink w-full min-w-0 rounded border px-3 py-2 text-base max-md:text-[1rem]',
    'hover:border-ink focus-visible:border-focus focus-visible:outline-offset-0',
    'aria-invalid:border-ink aria-invalid:border-2 disabled:bg-wash disabled:text-ink-faint [&:is(input,textarea):read-only]:bg-wash',
    className,
  )
