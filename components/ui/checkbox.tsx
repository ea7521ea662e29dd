'use client'

import { Check } from 'lucide-react'
import { useId, type ComponentProps, type ReactNode } from 'react'
import { cn } from './cn'
import { FieldError } from './field'

/** Props of {@link Checkbox} and {@link Switch}. */
export interface CheckboxProps extends Omit<ComponentProps<'input'>, 'type' | 'children'> {
  label: ReactNode
  hint?: ReactNode
  error?: string
  hideLabel?: boolean
}

const ROW = 'group flex min-h-8 cursor-pointer items-start gap-2.5 py-1 pointer-coarse:min-h-11'

function Labelled({
  id,
  control,
  label,
  hint,
  error,
  hideLabel,
  className,
}: Pick<CheckboxProps, 'label' | 'hint' | 'error' | 'hideLabel' | 'className'> & {
  id: string
  control: ReactNode
}) {
  return (
    <div className={className}>
      <label className={ROW}>
        {control}
        <span className={hideLabel ? 'sr-only' : undefined}>{label}</span>
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="max-w-measure text-sm text-ink-faint">
          {hint}
        </p>
      ) : null}
      {error ? <FieldError id={`${id}-error`}>{error}</FieldError> : null}
    </div>
  )
}

function describe(id: string, { hint, error }: Pick<CheckboxProps, 'hint' | 'error'>) {
  const ids = [error && `${id}-error`, hint && `${id}-hint`].filter(Boolean).join(' ')
  return { 'aria-describedby': ids || undefined, 'aria-invalid': error ? true : undefined } as const
}

/** Yes or no, sent with a form. */
export function Checkbox({ label, hint, error, hideLabel, className, ...rest }: CheckboxProps) {
  const id = useId()
  const box = (
    <span className="relative mt-0.5 inline-flex size-[1.125rem] shrink-0">
      <input
        type="checkbox"
        {...describe(id, { hint, error })}
        className="peer size-full cursor-[inherit] appearance-none rounded border border-rule bg-sheet group-hover:border-ink checked:border-woad checked:bg-woad disabled:opacity-50"
        {...rest}
      />
      <Check
        aria-hidden="true"
        strokeWidth={3}
        className="pointer-events-none absolute inset-0 m-auto size-3.5 text-on-woad opacity-0 peer-checked:opacity-100"
      />
    </span>
  )
  return <Labelled {...{ id, label, hint, error, hideLabel, className }} control={box} />
}

/** On or off, at once. */
export function Switch({ label, hint, error, hideLabel, className, ...rest }: CheckboxProps) {
  const id = useId()
  const track = (
    <span className="relative mt-0.5 inline-flex h-5 w-9 shrink-0">
      <input
        type="checkbox"
        role="switch"
        {...describe(id, { hint, error })}
        className="peer size-full cursor-[inherit] appearance-none rounded-full border border-rule bg-sheet group-hover:border-ink checked:border-woad checked:bg-woad disabled:opacity-50"
        {...rest}
      />
      <span
        aria-hidden="true"
        className={cn(
          'pointer-events-none absolute top-1 left-1 size-3 rounded-full bg-ink-soft peer-checked:bg-on-woad',
          'transition-transform peer-checked:translate-x-4',
        )}
      />
    </span>
  )
  return <Labelled {...{ id, label, hint, error, hideLabel, className }} control={track} />
}
