'use client'

import { useEffect, useId, useRef, useState, type ReactNode } from 'react'

import type { ActionResult } from '@/lib/errors'

import { cn } from './cn'
import { controlClass, FieldError } from './field'

/** Props of {@link EditableCell}. */
export interface EditableCellProps {
  /** "Name of Moss", for those who listen. */
  label: string
  /** What is typed into the field to begin with. */
  value: string
  /** What stands there while nobody edits. */
  children: ReactNode
  /** Choices make it a select. */
  options?: readonly { value: string; label: string }[]
  /** Something to know before saving. */
  hint?: string
  onSave: (typed: string) => Promise<ActionResult<unknown>>
  className?: string
}

/**
 * A cell that turns into a field when pressed. Enter or leaving it saves, Escape restores; what was
 * refused stays with the reason.
 */
export function EditableCell({
  label,
  value,
  children,
  options,
  hint,
  onSave,
  className,
}: EditableCellProps) {
  const id = useId()
  const [typed, setTyped] = useState<string>()
  const [error, setError] = useState<string>()
  const [saving, setSaving] = useState(false)
  const button = useRef<HTMLButtonElement>(null)
  const field = useRef<HTMLInputElement & HTMLSelectElement>(null)
  const returnFocus = useRef(false)
  const editing = typed !== undefined

  useEffect(() => {
    if (editing) {
      field.current?.focus()
      field.current?.select?.()
    } else if (returnFocus.current) {
      returnFocus.current = false
      button.current?.focus()
    }
  }, [editing])

  function close(keyboard: boolean) {
    returnFocus.current = keyboard
    setTyped(undefined)
    setError(undefined)
  }

  async function save(keyboard: boolean) {
    if (typed === undefined || saving) return
    if (typed === value) return close(keyboard)
    setSaving(true)
    const answer = await onSave(typed)
    setSaving(false)
    if (answer.ok) close(keyboard)
    else setError(Object.values(answer.fieldErrors ?? {})[0]?.[0] ?? answer.message)
  }

  if (!editing) {
    return (
      <button
        ref={button}
        type="button"
        aria-label={`${label}: edit`}
        onClick={() => setTyped(value)}
        className={cn(
          '-mx-1.5 min-h-8 w-[calc(100%+0.75rem)] rounded border border-transparent px-1.5 text-left hover:border-rule pointer-coarse:min-h-11',
          className,
        )}
      >
        {children}
      </button>
    )
  }

  const control = {
    ref: field,
    'aria-label': label,
    'aria-invalid': error ? (true as const) : undefined,
    'aria-describedby':
      [error && `${id}-error`, hint && `${id}-hint`].filter(Boolean).join(' ') || undefined,
    'aria-busy': saving || undefined,
    value: typed,
    className: controlClass(cn('-mx-1.5 !px-1.5 !py-1', className)),
    onChange: (event: { target: { value: string } }) => setTyped(event.target.value),
    onBlur: () => {
      // A refused text waits for its owner; leaving it does not send it again.
      if (!error) void save(false)
    },
    onKeyDown: (event: React.KeyboardEvent) => {
      if (event.key === 'Enter') {
        event.preventDefault()
        void save(true)
      } else if (event.key === 'Escape') {
        event.stopPropagation()
        close(true)
      }
    },
  }
  return (
    <div className={error ? 'min-w-44 text-left whitespace-normal' : 'min-w-16'}>
      {options ? (
        <select {...control}>
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </select>
      ) : (
        <input {...control} autoComplete="off" spellCheck={false} />
      )}
      {error ? <FieldError id={`${id}-error`}>{error}</FieldError> : null}
      {hint ? (
        <p id={`${id}-hint`} className="mt-1 text-sm text-ink-faint">
          {hint}
        </p>
      ) : null}
    </div>
  )
}
