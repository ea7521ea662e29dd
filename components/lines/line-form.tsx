'use client'

import { Minus, Plus } from 'lucide-react'
import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { useFieldArray, useForm, type FieldPath } from 'react-hook-form'
import type { z } from 'zod'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { Field, FieldError } from '@/components/ui/field'
import { IconButton } from '@/components/ui/icon-button'
import { Input } from '@/components/ui/input'
import { Notice } from '@/components/ui/notice'
import { Select } from '@/components/ui/select'
import { schemaResolver } from '@/components/ui/schema-resolver'
import { SubmitButton } from '@/components/ui/submit-button'
import { CURRENCIES, LINE_LIMITS, YARN_WEIGHTS } from '@/lib/lines/constants'
import type { createLineSchema, CreateLineValues, UpdateLineValues } from '@/lib/lines/schema'
import type { LineView } from '@/lib/lines/present'
import type { ActionResult } from '@/lib/errors'

type Save<Values> = (brand: string, values: Values) => Promise<ActionResult<{ slug: string }>>

/** Props of {@link LineForm}: with a line it changes that one, without it makes a new one. */
export type LineFormProps = { brand: string } & (
  | { line: LineView; save: Save<UpdateLineValues> }
  | { line?: undefined; save: Save<CreateLineValues> }
)

type Values = z.input<typeof createLineSchema>

const EMPTY = {
  name: '',
  fibres: [{ fibre: '', percent: 100 }],
  ply: '',
  weightNumber: 3,
  netGrams: '',
  length: '',
  lengthUnit: 'm',
  needleMm: '',
  gaugeStitches: '',
  gaugeRows: '',
  currency: 'GBP',
  price: '',
  launchDate: '',
} as const satisfies Omit<Values, 'requestKey' | 'fibres'> & { fibres: object }

/** The form of a line. What was typed stays through every refusal. */
export function LineForm(props: LineFormProps) {
  const { brand, line } = props
  const router = useRouter()
  const [problem, setProblem] = useState<string>()
  const [own] = useState(() =>
    line ? { lineSlug: line.slug, version: line.version } : { requestKey: crypto.randomUUID() },
  )
  const form = useForm({
    resolver: schemaResolver<Values>(() =>
      import('@/lib/lines/schema').then((it) => (line ? it.updateLineSchema : it.createLineSchema)),
    ),
    defaultValues: { ...(line?.values ?? EMPTY), ...own } as Values,
  })
  const { register, control, handleSubmit, setError } = form
  const { errors, isSubmitting } = form.formState
  const fibres = useFieldArray({ control, name: 'fibres' })

  async function onSubmit() {
    setProblem(undefined)
    const values = form.getValues()
    const answer = await reach((props.save as Save<unknown>)(brand, { ...values, ...own }))
    if (answer.ok) {
      router.push(`/${brand}/lines/${answer.data.slug}${line ? '' : '/shades'}` as never)
      return
    }
    for (const [name, messages] of Object.entries(answer.fieldErrors ?? {})) {
      setError(name as FieldPath<Values>, { message: messages[0] }, { shouldFocus: true })
    }
    setProblem(answer.message)
  }

  const error = (name: keyof Values) => errors[name]?.message
  const fibresError = errors.fibres?.root?.message ?? errors.fibres?.message

  return (
    <form
      noValidate
      className="max-w-measure space-y-6"
      onSubmit={(event) => void handleSubmit(onSubmit)(event)}
    >
      <Field label="Name" required error={error('name')}>
        <Input {...register('name')} maxLength={LINE_LIMITS.name} autoComplete="off" />
      </Field>

      <fieldset className="space-y-3">
        <legend className="mb-1 font-medium">Fibre content</legend>
        {fibres.fields.map((field, at) => (
          <div key={field.id} className="flex items-start gap-3">
            <Field
              hideLabel
              label={`Fibre ${at + 1}`}
              className="grow"
              error={errors.fibres?.[at]?.fibre?.message}
            >
              <Input placeholder={at === 0 ? 'wool' : 'silk'} {...register(`fibres.${at}.fibre`)} />
            </Field>
            <Field
              hideLabel
              label={`Per cent of fibre ${at + 1}`}
              className="w-24"
              error={errors.fibres?.[at]?.percent?.message}
            >
              <Input inputMode="numeric" {...register(`fibres.${at}.percent`)} />
            </Field>
            <span className="pt-2.5">%</span>
            <IconButton
              label={`Remove fibre ${at + 1}`}
              icon={<Minus />}
              disabled={fibres.fields.length === 1}
              onClick={() => fibres.remove(at)}
            />
          </div>
        ))}
        {fibresError ? <FieldError id="fibres-error">{fibresError}</FieldError> : null}
        <Button
          size="small"
          icon={<Plus aria-hidden="true" />}
          disabled={fibres.fields.length >= LINE_LIMITS.fibres}
          onClick={() => fibres.append({ fibre: '', percent: '' })}
        >
          Add fibre
        </Button>
      </fieldset>

      <div className="grid gap-x-4 gap-y-6 sm:grid-cols-2">
        <Field label="Yarn weight" error={error('weightNumber')}>
          <Select {...register('weightNumber')}>
            {YARN_WEIGHTS.map((name, number) => (
              <option key={name} value={number}>
                {number} · {name}
              </option>
            ))}
          </Select>
        </Field>
        <Field label="Ply" required error={error('ply')}>
          <Input inputMode="numeric" {...register('ply')} />
        </Field>
        <Field label="Net weight of a ball, g" required error={error('netGrams')}>
          <Input inputMode="decimal" {...register('netGrams')} />
        </Field>
        <div className="flex gap-3">
          <Field label="Length of a ball" required className="grow" error={error('length')}>
            <Input inputMode="decimal" {...register('length')} />
          </Field>
          <Field label="Unit" className="w-32" error={error('lengthUnit')}>
            <Select {...register('lengthUnit')}>
              <option value="m">metres</option>
              <option value="yd">yards</option>
            </Select>
          </Field>
        </div>
        <Field label="Needle, mm" required error={error('needleMm')}>
          <Input inputMode="decimal" {...register('needleMm')} />
        </Field>
        <div className="flex gap-3">
          <Field label="Stitches to 10 cm" required error={error('gaugeStitches')}>
            <Input inputMode="decimal" {...register('gaugeStitches')} />
          </Field>
          <Field label="Rows to 10 cm" required error={error('gaugeRows')}>
            <Input inputMode="decimal" {...register('gaugeRows')} />
          </Field>
        </div>
        <div className="flex gap-3">
          <Field label="Currency" className="w-28" error={error('currency')}>
            <Select {...register('currency')}>
              {CURRENCIES.map((currency) => (
                <option key={currency}>{currency}</option>
              ))}
            </Select>
          </Field>
          <Field label="Price of a ball" required className="grow" error={error('price')}>
            <Input inputMode="decimal" {...register('price')} />
          </Field>
        </div>
        <Field label="Launch date" optional error={error('launchDate')}>
          <Input type="date" {...register('launchDate')} />
        </Field>
      </div>

      {problem ? <Notice kind="error">{problem}</Notice> : null}
      <SubmitButton pending={isSubmitting} pendingLabel="Saving line…">
        {line ? 'Save line' : 'Make line'}
      </SubmitButton>
    </form>
  )
}
