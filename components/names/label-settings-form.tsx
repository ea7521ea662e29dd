'use client'

import { useRouter } from 'next/navigation'
import { useEffect, useState } from 'react'
import { useForm, useWatch, type FieldPath } from 'react-hook-form'
import useSWR from 'swr'

import { reach } from '@/components/reach'
import { Checkbox } from '@/components/ui/checkbox'
import { Field, FieldError } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { SegmentedControl } from '@/components/ui/radio-group'
import { schemaResolver } from '@/components/ui/schema-resolver'
import { SubmitButton } from '@/components/ui/submit-button'
import { Textarea } from '@/components/ui/textarea'
import { toastDone } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'
import type { LabelSetting } from '@/lib/naming/label'
import { LABEL_RANGES, NAME_LIMITS } from '@/lib/names/constants'
import type { LabelsPreview, NamingSettingsView, ReviewerView } from '@/lib/names/present'
import type { NamingSettingsValues, PreviewLabelsInput } from '@/lib/names/schema'
import { ROLE_WORDS } from '@/lib/people/constants'

import { LabelPreview } from './label-preview'
import type { NamesPlace } from './names-place'

/** What saves the settings of a line's names, and what shows a label before. */
export interface LabelSettingsActions {
  save: (brand: string, values: NamingSettingsValues) => Promise<ActionResult<NamingSettingsView>>
  preview: (brand: string, input: PreviewLabelsInput) => Promise<ActionResult<LabelsPreview>>
}

type Values = Omit<NamingSettingsValues, 'lineSlug' | 'version' | 'themes'> & { themes: string }

const valuesOf = (
  { label, care, themes, printOn }: NamingSettingsView,
  reviewerIds: string[],
): Values => ({
  labelWidth: String(label.width),
  labelSize: String(label.size),
  labelLines: label.lines,
  care,
  themes: themes.join(', '),
  printOn: printOn ?? '',
  reviewerIds,
})

/** How a line's names are printed, when, and who decides; the label changes as it is typed. */
export function LabelSettingsForm({
  place: { brand, lineSlug },
  settings,
  reviewers,
  first,
  fibre,
  actions,
}: {
  place: NamesPlace
  settings: NamingSettingsView
  /** Owners, and whoever can be appointed. */
  reviewers: readonly ReviewerView[]
  /** The label as it is set now. */
  first: LabelsPreview
  fibre: string
  actions: LabelSettingsActions
}) {
  const router = useRouter()
  const [problem, setProblem] = useState<string>()
  const { version } = settings
  const appointed = reviewers.filter(({ isReviewer, role }) => isReviewer && role !== 'owner')
  const form = useForm<Values>({
    resolver: schemaResolver<Values>(() =>
      import('@/lib/names/schema').then(({ namingSettingsSchema }) =>
        namingSettingsSchema.omit({ lineSlug: true, version: true }),
      ),
    ),
    // What somebody else saved comes in, but not over what was typed here.
    values: valuesOf(
      settings,
      appointed.map(({ personId }) => personId),
    ),
    resetOptions: { keepDirtyValues: true },
  })
  const { register, control, handleSubmit, setError, setValue } = form
  const { errors, isSubmitting } = form.formState
  const [labelWidth, labelSize, labelLines, care, reviewerIds] = useWatch({
    control,
    name: ['labelWidth', 'labelSize', 'labelLines', 'care', 'reviewerIds'],
  })
  const preview = useLabelPreview(
    { brand, lineSlug },
    { width: Number(labelWidth), size: Number(labelSize), lines: labelLines },
    first,
    actions.preview,
  )

  async function onSubmit() {
    setProblem(undefined)
    const values = form.getValues()
    const answer = await reach(actions.save(brand, { ...values, lineSlug, version }))
    if (answer.ok) {
      form.reset(valuesOf(answer.data, values.reviewerIds))
      toastDone('The settings of names are saved.')
      return
    }
    for (const [name, messages] of Object.entries(answer.fieldErrors ?? {})) {
      setError(name as FieldPath<Values>, { message: messages[0] }, { shouldFocus: true })
    }
    setProblem(answer.message)
    router.refresh()
  }

  const error = (name: keyof Values) => errors[name]?.message
  const owners = reviewers.filter(({ role }) => role === 'owner').map(({ name }) => name)
  const choices = reviewers.filter(({ role }) => role !== 'owner')

  return (
    <form
      noValidate
      aria-label="Settings of names"
      className="space-y-6"
      onSubmit={(event) => void handleSubmit(onSubmit)(event)}
    >
      <LabelPreview preview={preview} fibre={fibre} care={care} />
      <LiveRegion>
        {preview === first
          ? null
          : preview.misfitCount === 0
            ? 'All names fit.'
            : `${preview.misfitCount} of ${preview.total} names do not fit.`}
      </LiveRegion>

      <div className="grid max-w-measure gap-x-4 gap-y-6 sm:grid-cols-3">
        <Field label="Room for the name, mm" required error={error('labelWidth')}>
          <Input inputMode="decimal" {...register('labelWidth')} />
        </Field>
        <Field label="Letters, pt" required error={error('labelSize')}>
          <Input inputMode="decimal" {...register('labelSize')} />
        </Field>
        <SegmentedControl
          legend="Lines"
          options={[
            { value: '1', label: 'One' },
            { value: '2', label: 'Up to two' },
          ]}
          value={String(labelLines)}
          onValueChange={(lines) =>
            setValue('labelLines', lines === '1' ? 1 : 2, { shouldDirty: true })
          }
        />
      </div>
      <div className="max-w-measure space-y-6">
        <Field
          label="Care in words"
          optional
          hint="As it stands on the band, such as “Wash by hand, dry flat”."
          error={error('care')}
        >
          <Textarea rows={2} maxLength={NAME_LIMITS.care} {...register('care')} />
        </Field>
        <Field
          label="Print date"
          optional
          hint="The label printer’s day. From then on (UTC) approved names are locked."
          error={error('printOn')}
          className="max-w-56"
        >
          <Input type="date" {...register('printOn')} />
        </Field>
        <Field
          label="Theme words"
          optional
          hint={`Words of the world the line tells of, with commas between; at most ${NAME_LIMITS.themes}. Names are made up from them.`}
          error={errors.themes?.message ?? listError(errors.themes)}
        >
          <Input autoComplete="off" {...register('themes')} />
        </Field>
        <fieldset>
          <legend className="mb-1 font-medium">Reviewers</legend>
          <p className="text-sm text-ink-faint">
            They decide on names beside {owners.length === 1 ? 'the owner' : 'the owners'},{' '}
            {owners.join(', ')}. Nobody approves an idea of their own.
          </p>
          {choices.map(({ personId, name, role }) => (
            <Checkbox
              key={personId}
              label={
                <>
                  {name} <span className="text-ink-faint">({ROLE_WORDS[role].toLowerCase()})</span>
                </>
              }
              checked={reviewerIds.includes(personId)}
              onChange={({ target }) =>
                setValue(
                  'reviewerIds',
                  target.checked
                    ? [...reviewerIds, personId]
                    : reviewerIds.filter((id) => id !== personId),
                  { shouldDirty: true },
                )
              }
            />
          ))}
          {choices.length === 0 ? (
            <p className="mt-1">Invite a marketer or a designer to appoint one.</p>
          ) : null}
          {errors.reviewerIds?.message ? (
            <FieldError id="reviewers-error">{errors.reviewerIds.message}</FieldError>
          ) : null}
        </fieldset>
      </div>

      {problem ? <Notice kind="error">{problem}</Notice> : null}
      <SubmitButton pending={isSubmitting} pendingLabel="Saving settings…">
        Save settings
      </SubmitButton>
    </form>
  )
}

/** What is wrong with one of several words. */
const listError = (errors: unknown): string | undefined =>
  Array.isArray(errors)
    ? (errors as ({ message?: string } | undefined)[]).find((one) => one?.message)?.message
    : undefined

/** How long typing must rest before the label is asked for, ms. */
const REST = 250

const isBetween = (value: number, [least, most]: readonly [number, number]) =>
  value >= least && value <= most

/** The label as these settings would have it; the last one that could be set while they cannot. */
function useLabelPreview(
  { brand, lineSlug }: NamesPlace,
  { width, size, lines }: LabelSetting,
  first: LabelsPreview,
  ask: LabelSettingsActions['preview'],
): LabelsPreview {
  const [setting, setSetting] = useState(first.setting)
  useEffect(() => {
    if (!isBetween(width, LABEL_RANGES.width) || !isBetween(size, LABEL_RANGES.size)) return
    const timer = setTimeout(() => setSetting({ width, size, lines }), REST)
    return () => clearTimeout(timer)
  }, [width, size, lines])
  const isFirst =
    setting.width === first.setting.width &&
    setting.size === first.setting.size &&
    setting.lines === first.setting.lines
  const { data } = useSWR(
    isFirst ? null : ['the label', brand, lineSlug, setting.width, setting.size, setting.lines],
    () =>
      reach(
        ask(brand, {
          lineSlug,
          labelWidth: setting.width,
          labelSize: setting.size,
          labelLines: setting.lines,
        }),
      ),
    { revalidateOnFocus: false, keepPreviousData: true },
  )
  return !isFirst && data?.ok ? data.data : first
}
