'use client'

import dynamic from 'next/dynamic'
import { useRouter } from 'next/navigation'
import { useRef, useState } from 'react'
import { useForm, useWatch, type FieldPath } from 'react-hook-form'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { Field, FieldError } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { Notice } from '@/components/ui/notice'
import { SegmentedControl } from '@/components/ui/radio-group'
import { Select } from '@/components/ui/select'
import { schemaResolver } from '@/components/ui/schema-resolver'
import { SubmitButton } from '@/components/ui/submit-button'
import { toastDone } from '@/components/ui/toast'
import { NAME_LIMITS } from '@/lib/names/constants'
import type { ShadeView } from '@/lib/shades/present'
import {
  READING_TERMS,
  SHADE_LIMITS,
  SHADE_STATUSES,
  TERMS_WORDS,
  type ShadeStatus,
} from '@/lib/shades/constants'

import { ShadeNameLink } from './shade-name-link'
import { STATUS_WORDS } from './shade-words'
import { shadesHref, type LinePlace, type ShadesActions } from './shades-actions'

// Typing can begin before there is a sample to show.
const LiveSample = dynamic(() => import('./live-sample').then((it) => it.LiveSample), {
  loading: () => <div className="h-33 w-37" />,
})

/** What the form holds while it is being filled in. */
export interface ShadeFormValues {
  number: string
  /** Of a new shade only. */
  name: string
  status: ShadeStatus
  color: { kind: 'lab' | 'hex'; L: string; a: string; b: string; terms: string; hex: string }
}

const EMPTY: ShadeFormValues = {
  number: '',
  name: '',
  status: 'target',
  color: { kind: 'lab', L: '', a: '', b: '', terms: '', hex: '' },
}

function valuesOf(shade: ShadeView): ShadeFormValues {
  const { number, status, enteredHex, lab, observer } = shade
  const color = enteredHex
    ? { ...EMPTY.color, kind: 'hex' as const, hex: enteredHex }
    : {
        ...EMPTY.color,
        L: String(lab[0]),
        a: String(lab[1]),
        b: String(lab[2]),
        terms: `D65/${observer}`,
      }
  return { number, name: '', status, color }
}

/** Props of {@link ShadeForm}: with a shade it changes that one, without it adds a new one. */
export type ShadeFormProps = { place: LinePlace } & (
  | { shade: ShadeView; save: ShadesActions['update'] }
  | { shade?: undefined; save: ShadesActions['create'] }
)

/** The form of a shade with its sample as it is typed. What was typed stays through every refusal. */
export function ShadeForm(props: ShadeFormProps) {
  const { place, shade } = props
  const router = useRouter()
  const [problem, setProblem] = useState<string>()
  const requestKey = useRef<string>(undefined)
  const another = useRef(false)
  const form = useForm<ShadeFormValues>({
    // The parsed values are not used: the action parses what was typed, by the same schema.
    resolver: schemaResolver(() => import('@/lib/shades/schema').then((it) => it.shadeFormSchema)),
    values: shade ? valuesOf(shade) : undefined,
    defaultValues: EMPTY,
    // What somebody else saved meanwhile shows in the fields that were not touched here.
    resetOptions: { keepDirtyValues: true, keepErrors: true },
  })
  const { register, control, handleSubmit, setError, setFocus, reset } = form
  const { errors, isSubmitting, dirtyFields, isDirty } = form.formState
  const color = useWatch({ control, name: 'color' })

  function send(values: ShadeFormValues) {
    const typed = { ...values, color: chosenOf(values) } as never as Parameters<
      ShadesActions['create']
    >[1]
    if (!props.shade) {
      // One key a filled-in form: pressed twice, it makes one shade.
      requestKey.current ??= crypto.randomUUID()
      const own = { lineSlug: place.lineSlug, requestKey: requestKey.current }
      return reach(props.save(place.brand, { ...typed, ...own }))
    }
    const { number, status } = typed
    return reach(
      props.save(place.brand, {
        lineSlug: place.lineSlug,
        shadeId: props.shade.id,
        version: props.shade.version,
        ...(dirtyFields.number && { number }),
        ...(dirtyFields.status && { status }),
        ...(dirtyFields.color && { color: typed.color }),
      }),
    )
  }

  async function onSubmit() {
    setProblem(undefined)
    const values = form.getValues()
    const answer = await send(values)
    if (answer.ok) {
      requestKey.current = undefined
      toastDone(shade ? `${answer.data.label} saved.` : doneOf(answer.data, values))
      if (shade) reset(valuesOf(answer.data), { keepDirtyValues: false, keepErrors: false })
      else if (another.current) {
        reset({ ...EMPTY, status: values.status, color: { ...EMPTY.color, ...keptOf(values) } })
        setFocus('number')
      } else router.push(shadesHref(place) as never)
      return
    }
    if (answer.code === 'conflict') router.refresh()
    for (const [name, messages] of Object.entries(answer.fieldErrors ?? {})) {
      setError(name as FieldPath<ShadeFormValues>, { message: messages[0] }, { shouldFocus: true })
    }
    setProblem(answer.message)
  }

  const colorErrors = errors.color as
    | Partial<Record<keyof ShadeFormValues['color'] | 'message', { message?: string } & string>>
    | undefined
  const colorError = (name: 'L' | 'a' | 'b' | 'terms' | 'hex') => colorErrors?.[name]?.message

  return (
    <form
      noValidate
      className="max-w-measure space-y-6"
      onSubmit={(event) => void handleSubmit(onSubmit)(event)}
    >
      <div className="grid gap-x-4 gap-y-6 sm:grid-cols-[9rem_minmax(0,1fr)]">
        <Field label="Number" required error={errors.number?.message}>
          <Input {...register('number')} maxLength={SHADE_LIMITS.number} autoComplete="off" />
        </Field>
        {shade ? (
          <div>
            <p className="mb-1 font-medium">Name</p>
            <p className="py-2">
              <ShadeNameLink place={place} shade={shade} />
            </p>
          </div>
        ) : (
          <Field
            label="Name"
            optional
            error={errors.name?.message}
            hint="It begins as a draft. Once it is approved it stands wherever the shade does."
          >
            <Input {...register('name')} maxLength={NAME_LIMITS.text} autoComplete="off" />
          </Field>
        )}
      </div>

      <fieldset className="space-y-4">
        <legend className="sr-only">Colour</legend>
        <SegmentedControl
          legend="Colour"
          value={color.kind}
          onValueChange={(kind) => form.setValue('color.kind', kind, { shouldDirty: true })}
          options={[
            { value: 'lab', label: 'Reading (Lab)' },
            { value: 'hex', label: 'Screen colour (hex)' },
          ]}
        />
        <div className="flex flex-wrap items-start gap-x-6 gap-y-4">
          <div className="min-w-0 grow basis-72 space-y-4">
            {color.kind === 'lab' ? (
              <>
                <div className="grid grid-cols-3 gap-3">
                  {(['L', 'a', 'b'] as const).map((name) => (
                    <Field key={name} label={`${name}*`} required error={colorError(name)}>
                      <Input
                        // Phones offer no minus sign on their number pad.
                        inputMode={name === 'L' ? 'decimal' : 'text'}
                        autoComplete="off"
                        {...register(`color.${name}`)}
                      />
                    </Field>
                  ))}
                </div>
                <Field
                  label="Read under"
                  required
                  error={colorError('terms')}
                  hint="As the instrument says. Readings under another light are not taken, and none is converted."
                >
                  <Select {...register('color.terms')}>
                    <option value="">Choose light and observer</option>
                    {READING_TERMS.map((terms) => (
                      <option key={terms} value={terms}>
                        {TERMS_WORDS[terms]}
                      </option>
                    ))}
                  </Select>
                </Field>
              </>
            ) : (
              <Field
                label="Hex"
                required
                error={colorError('hex')}
                hint="Six digits such as #7a8b4f. Its Lab is computed for D65 and 2°; a reading of the yarn is better."
              >
                <Input autoComplete="off" spellCheck={false} {...register('color.hex')} />
              </Field>
            )}
            {colorErrors?.message ? (
              <FieldError id="color-error">{colorErrors.message}</FieldError>
            ) : null}
          </div>
          <LiveSample color={color} />
        </div>
      </fieldset>

      <Field label="Status" error={errors.status?.message} className="sm:max-w-60">
        <Select {...register('status')}>
          {SHADE_STATUSES.map((status) => (
            <option key={status} value={status}>
              {STATUS_WORDS[status]}
            </option>
          ))}
        </Select>
      </Field>

      {problem ? <Notice kind="error">{problem}</Notice> : null}
      <div className="flex flex-wrap gap-3">
        <SubmitButton
          pending={isSubmitting}
          pendingLabel="Saving shade…"
          disabled={Boolean(shade) && !isDirty}
          onClick={() => {
            another.current = false
          }}
        >
          {shade ? 'Save shade' : 'Add shade'}
        </SubmitButton>
        {shade ? null : (
          <Button
            type="submit"
            pending={isSubmitting}
            onClick={() => {
              another.current = true
            }}
          >
            Add shade and start another
          </Button>
        )}
      </div>
    </form>
  )
}

const doneOf = ({ label }: ShadeView, { name }: ShadeFormValues) =>
  name.trim() ? `${label} added, with “${name.trim()}” as a draft of its name.` : `${label} added.`

/** The colour as it is entered, without the fields of the other kind. */
const chosenOf = ({ color: { kind, hex, ...lab } }: ShadeFormValues) =>
  kind === 'hex' ? { kind, hex } : { kind, ...lab }

/** What stays for the next shade: how it is entered, and under which light. */
const keptOf = ({ color: { kind, terms } }: ShadeFormValues) => ({ kind, terms })
