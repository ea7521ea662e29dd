'use client'

import { Pencil } from 'lucide-react'
import { useRef, useState, type KeyboardEvent } from 'react'

import { Field } from '@/components/ui/field'
import { IconButton } from '@/components/ui/icon-button'
import { Input } from '@/components/ui/input'
import { COMBINATION_LIMITS } from '@/lib/combinations/constants'

/**
 * The title, and the field that changes it as one types: Enter is done, Escape leaves it as it was.
 * One that is left empty goes back to what it was.
 */
export function TitleField({
  title,
  onChange,
  onDone,
}: {
  title: string
  onChange: (title: string) => void
  onDone: () => void
}) {
  // What it was when the field was opened; null while it is closed.
  const [before, setBefore] = useState<string | null>(null)
  const button = useRef<HTMLButtonElement>(null)

  function close(back: boolean) {
    if (before !== null && (back || title.trim() === '')) onChange(before)
    setBefore(null)
    onDone()
  }

  function onKeyDown(event: KeyboardEvent) {
    if (event.key !== 'Enter' && event.key !== 'Escape') return
    event.preventDefault()
    close(event.key === 'Escape')
    // The keyboard goes back to the button that opened the field.
    requestAnimationFrame(() => button.current?.focus())
  }

  if (before === null) {
    return (
      <>
        {title}{' '}
        <span className="print:hidden">
          <IconButton
            ref={button}
            label="Rename combination"
            icon={<Pencil />}
            onClick={() => setBefore(title)}
          />
        </span>
      </>
    )
  }
  return (
    <Field
      hideLabel
      label="Title"
      error={title.trim() ? undefined : 'Give the combination a title.'}
      className="w-full max-w-lg font-body text-base"
    >
      <Input
        autoFocus
        value={title}
        maxLength={COMBINATION_LIMITS.title}
        autoComplete="off"
        onChange={({ target }) => onChange(target.value)}
        onKeyDown={onKeyDown}
        onBlur={() => close(false)}
      />
    </Field>
  )
}
