'use client'

import { useRef, useState } from 'react'
import { useForm, type FieldPath } from 'react-hook-form'

import { dayInWords } from '@/components/date-words'
import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { ConfirmDialog } from '@/components/ui/confirm-dialog'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { LedgerList } from '@/components/ui/ledger'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { schemaResolver } from '@/components/ui/schema-resolver'
import { Select } from '@/components/ui/select'
import { Status } from '@/components/ui/status'
import { SubmitButton } from '@/components/ui/submit-button'
import { Textarea } from '@/components/ui/textarea'
import {
  MARKS_CAUTION,
  NAME_LIMITS,
  SEARCH_OUTCOMES,
  type SearchOutcome,
} from '@/lib/names/constants'
import type { RecordedSearch } from '@/lib/names/present'

import type { SearchActions } from './idea-actions'
import type { NamesPlace } from './names-place'

const OUTCOME_WORDS: Record<SearchOutcome, string> = {
  'nothing found': 'Nothing found',
  'something found': 'Something found',
}

interface Values {
  register: string
  searchedBy: string
  searchedOn: string
  outcome: SearchOutcome
  note: string
}

const EMPTY: Values = {
  register: '',
  searchedBy: '',
  searchedOn: '',
  outcome: 'nothing found',
  note: '',
}

/** Who searched which register of marks for a name, and when; searches to add and to remove. */
export function Searches({
  place: { brand, lineSlug },
  ideaId,
  searches,
  actions,
}: {
  place: NamesPlace
  ideaId: string
  searches: readonly RecordedSearch[]
  actions: SearchActions
}) {
  const [open, setOpen] = useState(false)
  const [said, setSaid] = useState('')
  const list = useRef<HTMLDivElement>(null)
  return (
    <div ref={list} tabIndex={-1} className="space-y-4 outline-none">
      <LiveRegion>{said}</LiveRegion>
      <Notice kind="warning">{MARKS_CAUTION}</Notice>
      {searches.length === 0 ? (
        <p className="text-ink-faint">No search in a register of marks is recorded.</p>
      ) : (
        <LedgerList className="max-w-measure">
          {searches.map((search) => (
            <li key={search.id} className="flex flex-wrap items-start justify-between gap-3 py-3">
              <div className="min-w-0 grow basis-56">
                <p className="font-semibold break-words">{search.register}</p>
                <p className="text-ink-soft">
                  {search.searchedBy}, {dayInWords(search.searchedOn)}
                </p>
                <Status kind={search.outcome === 'nothing found' ? 'none' : 'attention'}>
                  {OUTCOME_WORDS[search.outcome]}
                </Status>
                {search.note ? (
                  <p className="mt-1 break-words whitespace-pre-line">{search.note}</p>
                ) : null}
              </div>
              {search.canRemove ? (
                <ConfirmDialog
                  title="Remove this search?"
                  lost={<p>The record of the search in {search.register}.</p>}
                  kept={<p>That it stood here stays in the activity record.</p>}
                  confirmLabel="Remove search"
                  focusAfter={list}
                  trigger={
                    <Button size="small" aria-label={`Remove the search in ${search.register}`}>
                      Remove search
                    </Button>
                  }
                  onConfirm={async () => {
                    const answer = await reach(
                      actions.remove(brand, { lineSlug, searchId: search.id }),
                    )
                    if (answer.ok) setSaid('The search is removed.')
                    return answer.ok
                  }}
                />
              ) : null}
            </li>
          ))}
        </LedgerList>
      )}
      {open ? (
        <SearchForm
          record={(values, requestKey) =>
            actions.record(brand, { lineSlug, ideaId, requestKey, ...values })
          }
          onDone={(recorded) => {
            setOpen(false)
            if (recorded) setSaid('The search is recorded.')
            list.current?.focus()
          }}
        />
      ) : (
        <Button onClick={() => setOpen(true)}>Record search</Button>
      )}
    </div>
  )
}

function SearchForm({
  record,
  onDone,
}: {
  record: (values: Values, requestKey: string) => ReturnType<SearchActions['record']>
  onDone: (recorded: boolean) => void
}) {
  const [problem, setProblem] = useState<string>()
  const requestKey = useRef<string>(undefined)
  const { register, handleSubmit, setError, getValues, formState } = useForm<Values>({
    // The parsed values are not used: the action parses what was typed, by the same schema.
    resolver: schemaResolver(() =>
      import('@/lib/names/schema').then((it) =>
        it.recordSearchSchema.omit({ lineSlug: true, ideaId: true, requestKey: true }),
      ),
    ),
    defaultValues: EMPTY,
  })
  const { errors, isSubmitting } = formState

  async function send() {
    setProblem(undefined)
    requestKey.current ??= crypto.randomUUID()
    const answer = await reach(record(getValues(), requestKey.current))
    if (answer.ok) {
      onDone(true)
      return
    }
    for (const [name, messages] of Object.entries(answer.fieldErrors ?? {}))
      setError(name as FieldPath<Values>, { message: messages[0] }, { shouldFocus: true })
    setProblem(answer.message)
  }

  return (
    <form
      noValidate
      aria-label="Record search"
      className="max-w-measure space-y-4"
      onChange={() => {
        // Another search than the one that was sent.
        requestKey.current = undefined
      }}
      onSubmit={(event) => void handleSubmit(send)(event)}
    >
      <div className="grid gap-4 sm:grid-cols-2">
        <Field label="Register" required error={errors.register?.message}>
          <Input
            {...register('register')}
            autoFocus
            maxLength={NAME_LIMITS.register}
            autoComplete="off"
          />
        </Field>
        <Field label="Searched by" required error={errors.searchedBy?.message}>
          <Input
            {...register('searchedBy')}
            maxLength={NAME_LIMITS.searchedBy}
            autoComplete="off"
          />
        </Field>
        <Field label="Searched on" required error={errors.searchedOn?.message}>
          <Input {...register('searchedOn')} type="date" />
        </Field>
        <Field label="Outcome" required error={errors.outcome?.message}>
          <Select {...register('outcome')}>
            {SEARCH_OUTCOMES.map((outcome) => (
              <option key={outcome} value={outcome}>
                {OUTCOME_WORDS[outcome]}
              </option>
            ))}
          </Select>
        </Field>
      </div>
      <Field label="Note" optional error={errors.note?.message}>
        <Textarea {...register('note')} rows={2} maxLength={NAME_LIMITS.note} />
      </Field>
      {problem ? <Notice kind="error">{problem}</Notice> : null}
      <div className="flex flex-wrap gap-3">
        <SubmitButton pending={isSubmitting} pendingLabel="Recording search…">
          Record search
        </SubmitButton>
        <Button onClick={() => onDone(false)}>Leave it</Button>
      </div>
    </form>
  )
}
