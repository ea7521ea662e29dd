'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { useForm, type FieldPath } from 'react-hook-form'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { Notice } from '@/components/ui/notice'
import { SubmitButton } from '@/components/ui/submit-button'
import { Textarea } from '@/components/ui/textarea'
import { toastDone, toastProblem, toastUndo } from '@/components/ui/toast'
import { NAME_LIMITS } from '@/lib/names/constants'
import type { IdeaView } from '@/lib/names/present'

import type { WordsActions } from './idea-actions'
import { namesHref, type NamesPlace } from './names-place'

type Values = Pick<IdeaView, 'text' | 'note' | 'wordingReason'>

/** What an idea says and the thought behind it, to be changed while it is a draft. */
export function IdeaWords({
  place: { brand, lineSlug },
  idea,
  needsReason,
  edit,
}: {
  place: NamesPlace
  idea: IdeaView
  /** Its wording is warned of. */
  needsReason: boolean
  edit: WordsActions['edit']
}) {
  const router = useRouter()
  const [problem, setProblem] = useState<string>()
  const { text, note, wordingReason } = idea
  const { register, handleSubmit, setError, formState } = useForm<Values>({
    values: { text, note, wordingReason },
    // What somebody else saved meanwhile shows in the fields that were not touched here.
    resetOptions: { keepDirtyValues: true, keepErrors: true },
  })
  const { errors, isSubmitting, isDirty, dirtyFields } = formState

  async function save(values: Values) {
    setProblem(undefined)
    const answer = await reach(
      edit(brand, {
        lineSlug,
        ideaId: idea.id,
        version: idea.version,
        ...(dirtyFields.text && { text: values.text }),
        ...(dirtyFields.note && { note: values.note }),
        ...(dirtyFields.wordingReason && { wordingReason: values.wordingReason }),
      }),
    )
    if (answer.ok) {
      toastDone(`“${answer.data.text}” saved.`)
      return
    }
    if (answer.code === 'conflict') router.refresh()
    for (const [name, messages] of Object.entries(answer.fieldErrors ?? {}))
      setError(name as FieldPath<Values>, { message: messages[0] }, { shouldFocus: true })
    setProblem(answer.message)
  }

  return (
    <form
      noValidate
      className="max-w-measure space-y-5"
      onSubmit={(event) => void handleSubmit(save)(event)}
    >
      <Field label="Name" required error={errors.text?.message}>
        <Input {...register('text')} maxLength={NAME_LIMITS.text} autoComplete="off" />
      </Field>
      <Field label="The thought behind it" optional error={errors.note?.message}>
        <Textarea {...register('note')} rows={2} maxLength={NAME_LIMITS.note} />
      </Field>
      {needsReason || wordingReason ? (
        <Field
          label="Why the wording stands"
          required={needsReason}
          error={errors.wordingReason?.message}
          hint="The checks warn of its wording. Without a reason it cannot be sent for review; reviewers read it."
        >
          <Textarea {...register('wordingReason')} rows={2} maxLength={NAME_LIMITS.reason} />
        </Field>
      ) : null}
      {problem ? <Notice kind="error">{problem}</Notice> : null}
      <SubmitButton
        variant="secondary"
        pending={isSubmitting}
        pendingLabel="Saving name…"
        disabled={!isDirty}
      >
        Save words
      </SubmitButton>
    </form>
  )
}

/** Deletes the idea whose page this is, and goes back to the others. */
export function DeleteIdea({
  place,
  idea,
  remove,
  restore,
}: {
  place: NamesPlace
  idea: IdeaView
  remove: WordsActions['remove']
  restore: WordsActions['restore']
}) {
  const router = useRouter()
  const [pending, setPending] = useState(false)
  const { brand, lineSlug } = place
  const which = { lineSlug, ideaIds: [idea.id] }
  const bringBack = async () => {
    const answer = await reach(restore(brand, which))
    if (answer.ok) toastDone(`“${idea.text}” is back.`)
    else toastProblem(answer.message)
  }
  return (
    <Button
      variant="danger"
      pending={pending}
      pendingLabel="Deleting name…"
      onClick={async () => {
        setPending(true)
        const answer = await reach(remove(brand, which))
        setPending(false)
        if (!answer.ok) {
          toastProblem(answer.message)
          return
        }
        toastUndo(`“${idea.text}” deleted.`, () => void bringBack())
        router.push(namesHref(place, idea.shadeId === null ? '/heap' : '') as never)
      }}
    >
      Delete name
    </Button>
  )
}
