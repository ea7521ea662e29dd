'use client'

import { Pencil } from 'lucide-react'
import { useRouter } from 'next/navigation'
import { useState, type FormEvent, type KeyboardEvent } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { IconButton } from '@/components/ui/icon-button'
import { Input } from '@/components/ui/input'
import { SubmitButton } from '@/components/ui/submit-button'
import { toastDone } from '@/components/ui/toast'
import type { CombinationView } from '@/lib/combinations/present'
import { COMBINATION_LIMITS } from '@/lib/combinations/constants'
import type { RenameCombinationValues } from '@/lib/combinations/schema'
import type { ActionResult } from '@/lib/errors'

/**
 * The title, and the form that changes it: Enter saves, Escape leaves it as it was. When somebody
 * saved in between, what was typed stays beside the title of now, and can be saved over it.
 */
export function CombinationTitle({
  brand,
  combination: { id, title, version },
  rename,
}: {
  brand: string
  combination: Pick<CombinationView, 'id' | 'title' | 'version'>
  rename: (brand: string, values: RenameCombinationValues) => Promise<ActionResult<unknown>>
}) {
  const router = useRouter()
  const [text, setText] = useState<string>()
  const [problem, setProblem] = useState<string>()
  const [overtaken, setOvertaken] = useState(false)
  const [pending, setPending] = useState(false)
  // The keyboard goes back to the button that opened the form.
  const [closed, setClosed] = useState(false)

  function begin(start?: string) {
    setText(start)
    setProblem(undefined)
    setOvertaken(false)
    setClosed(start === undefined)
  }

  if (text === undefined) {
    return (
      <>
        {title}{' '}
        <span className="print:hidden">
          <IconButton
            autoFocus={closed}
            label="Rename combination"
            icon={<Pencil />}
            onClick={() => begin(title)}
          />
        </span>
      </>
    )
  }

  async function save(event: FormEvent) {
    event.preventDefault()
    if (pending) return
    setPending(true)
    const answer = await reach(rename(brand, { combinationId: id, version, title: text ?? '' }))
    setPending(false)
    if (!answer.ok) {
      setProblem(answer.fieldErrors?.title?.[0] ?? answer.message)
      setOvertaken(answer.code === 'conflict')
      if (answer.code === 'conflict') router.refresh()
      return
    }
    begin()
    toastDone('Title saved')
  }

  function onKeyDown(event: KeyboardEvent) {
    if (event.key === 'Escape') begin()
  }

  return (
    <form onSubmit={(event) => void save(event)} className="flex flex-wrap items-start gap-2">
      <Field
        hideLabel
        label="Title"
        hint={overtaken ? `It is now called “${title}”.` : undefined}
        error={problem}
        className="w-full max-w-lg font-body text-base"
      >
        <Input
          autoFocus
          value={text}
          maxLength={COMBINATION_LIMITS.title}
          autoComplete="off"
          onChange={({ target }) => setText(target.value)}
          onKeyDown={onKeyDown}
        />
      </Field>
      <span className="flex gap-2 font-body">
        <SubmitButton pending={pending} pendingLabel="Saving…">
          Save title
        </SubmitButton>
        <Button onClick={() => begin()}>Leave it</Button>
      </span>
    </form>
  )
}
