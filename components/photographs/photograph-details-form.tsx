'use client'

import { useRouter } from 'next/navigation'
import { useEffect, useState } from 'react'
import { useForm, useWatch } from 'react-hook-form'

import { reach } from '@/components/reach'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { Notice } from '@/components/ui/notice'
import { Select } from '@/components/ui/select'
import { schemaResolver } from '@/components/ui/schema-resolver'
import { SubmitButton } from '@/components/ui/submit-button'
import { Textarea } from '@/components/ui/textarea'
import { toastDone } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'
import type { PhotographView } from '@/lib/photographs/present'
import { LICENCE_LABELS, LICENCES, PHOTOGRAPH_LIMITS } from '@/lib/photographs/constants'
import type { UpdatePhotographInput, UpdatePhotographValues } from '@/lib/photographs/schema'

import { DetailsConflict } from './details-conflict'

/** The action that saves the form; answers the version it made. */
export type SavePhotograph = (
  brand: string,
  values: UpdatePhotographValues,
) => Promise<ActionResult<{ version: number }>>

/** Props of {@link PhotographDetailsForm}. */
export interface PhotographDetailsFormProps {
  brand: string
  /** As last rendered by the server; a newer version than the form began from is a conflict. */
  photograph: PhotographView
  save: SavePhotograph
}

const LABELS = {
  title: 'Title',
  photographer: 'Photographer',
  licence: 'Licence',
  licenceNote: 'Note on the licence',
  licenceUrl: 'Link to the licence',
  sourceUrl: 'Link to the source',
  altText: 'Alt text',
} as const
type Detail = keyof typeof LABELS
const DETAILS = Object.keys(LABELS) as Detail[]

const NOTE_HINTS: Record<string, string> = {
  permission: 'Who gave permission, when, and for what.',
  other: 'Which licence it is and what it allows.',
}

const valuesOf = (photograph: PhotographView): UpdatePhotographValues => ({
  photographId: photograph.id,
  version: photograph.version,
  title: photograph.title,
  photographer: photograph.photographer,
  licence: photograph.licence ?? '',
  licenceNote: photograph.licenceNote,
  licenceUrl: photograph.licenceUrl,
  sourceUrl: photograph.sourceUrl,
  altText: photograph.altText,
})

const inWords = (values: UpdatePhotographValues, name: Detail): string =>
  name === 'licence' && values.licence ? LICENCE_LABELS[values.licence] : values[name]

/** The form with what is said about a photograph. */
export function PhotographDetailsForm({ brand, photograph, save }: PhotographDetailsFormProps) {
  const router = useRouter()
  const [problem, setProblem] = useState<string>()
  const form = useForm<UpdatePhotographValues, unknown, UpdatePhotographInput>({
    resolver: schemaResolver(() =>
      import('@/lib/photographs/schema').then((it) => it.updatePhotographSchema),
    ),
    defaultValues: valuesOf(photograph),
  })
  const { register, reset, handleSubmit, setError, getValues } = form
  const { errors, isSubmitting, isDirty, dirtyFields, defaultValues } = form.formState
  const licence = useWatch({ control: form.control, name: 'licence' })

  const theirs = valuesOf(photograph)
  const overtaken = photograph.version > (defaultValues?.version ?? 0) && !isSubmitting
  useEffect(() => {
    // Nothing typed, nothing to lose: show what was saved.
    if (overtaken && !isDirty) reset(valuesOf(photograph))
  }, [overtaken, isDirty, photograph, reset])

  async function send(input: UpdatePhotographInput) {
    setProblem(undefined)
    const values = { ...input, licence: input.licence ?? ('' as const) }
    const answer = await reach(save(brand, values))
    if (answer.ok) {
      reset({ ...values, version: answer.data.version })
      toastDone('Details saved')
      return
    }
    if (answer.code === 'conflict') router.refresh()
    for (const name of DETAILS) {
      const message = answer.fieldErrors?.[name]?.[0]
      if (message) setError(name, { message })
    }
    setProblem(answer.message)
  }
  const submit = handleSubmit(send)

  function takeTheirs() {
    setProblem(undefined)
    reset(theirs)
  }
  async function keepMine() {
    reset(theirs, { keepDirtyValues: true })
    await submit()
  }

  const inConflict = overtaken && isDirty
  return (
    <form
      noValidate
      aria-label="Details of the photograph"
      className="max-w-measure space-y-5"
      onSubmit={(event) => void submit(event)}
    >
      <Field label={LABELS.title} required error={errors.title?.message}>
        <Input {...register('title')} maxLength={PHOTOGRAPH_LIMITS.title} autoComplete="off" />
      </Field>
      <Field
        optional
        label={LABELS.altText}
        error={errors.altText?.message}
        hint="For those who cannot see it: what can be seen, in one or two plain sentences, without “picture of”. “Heather on a hillside at dusk, purple over brown stone.”"
      >
        <Textarea rows={3} {...register('altText')} />
      </Field>
      <Field
        label={LABELS.photographer}
        optional={licence !== 'cc-by'}
        required={licence === 'cc-by'}
        error={errors.photographer?.message}
      >
        <Input {...register('photographer')} autoComplete="off" />
      </Field>

      <Notice>
        You need the right to use a photograph you publish; when unsure ask the photographer, or a
        licensed professional about your local rules.
      </Notice>
      <Field label={LABELS.licence} error={errors.licence?.message}>
        <Select {...register('licence')}>
          <option value="">Not said yet</option>
          {LICENCES.map((one) => (
            <option key={one} value={one}>
              {LICENCE_LABELS[one]}
            </option>
          ))}
        </Select>
      </Field>
      <Field
        label={LABELS.licenceNote}
        optional={!NOTE_HINTS[licence]}
        required={Boolean(NOTE_HINTS[licence])}
        hint={NOTE_HINTS[licence]}
        error={errors.licenceNote?.message}
      >
        <Textarea rows={2} {...register('licenceNote')} />
      </Field>
      <Field
        label={LABELS.licenceUrl}
        optional={licence !== 'cc-by'}
        required={licence === 'cc-by'}
        error={errors.licenceUrl?.message}
      >
        <Input type="url" inputMode="url" {...register('licenceUrl')} />
      </Field>
      <Field
        optional
        label={LABELS.sourceUrl}
        hint="Where the photograph comes from, if it is on the web."
        error={errors.sourceUrl?.message}
      >
        <Input type="url" inputMode="url" {...register('sourceUrl')} />
      </Field>

      {inConflict ? (
        <DetailsConflict
          fields={DETAILS.filter(
            (name) => theirs[name] !== defaultValues?.[name] || dirtyFields[name],
          )
            .filter((name) => theirs[name] !== getValues(name))
            .map((name) => ({
              label: LABELS[name],
              theirs: inWords(theirs, name),
              mine: inWords(getValues(), name),
            }))}
          pending={isSubmitting}
          onTakeTheirs={takeTheirs}
          onKeepMine={() => void keepMine()}
        />
      ) : problem ? (
        <Notice kind="error">{problem}</Notice>
      ) : null}
      {inConflict ? null : (
        <SubmitButton pending={isSubmitting} pendingLabel="Saving details…">
          Save details
        </SubmitButton>
      )}
    </form>
  )
}
