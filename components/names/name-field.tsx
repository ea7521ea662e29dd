'use client'

import { useId, useState, type Ref } from 'react'

import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { Textarea } from '@/components/ui/textarea'
import { NAME_LIMITS } from '@/lib/names/constants'

import type { CheckName } from './bench-actions'
import { NameChecks, type LabelTerms } from './name-checks'
import type { NamesPlace } from './names-place'
import { useNameCheck } from './use-name-check'

/** What is typed of a name. */
export interface NameDraft {
  text: string
  note: string
  /** Why it may stand although its wording is warned of. */
  wordingReason: string
}

/** Nothing typed yet. */
export const NO_DRAFT: NameDraft = { text: '', note: '', wordingReason: '' }

/**
 * A name being written, with the thought behind it and its checks as it is typed. A reason is asked
 * for once its wording is warned of, where `reasons` says that one can be kept.
 */
export function NameField({
  place,
  shadeId,
  ideaId = null,
  draft,
  onChange,
  errors = {},
  check,
  label,
  reasons = false,
  inputRef,
}: {
  place: NamesPlace
  shadeId: string
  /** The idea that is being changed; null for a new one. */
  ideaId?: string | null
  draft: NameDraft
  onChange: (change: Partial<NameDraft>) => void
  errors?: Readonly<Record<string, string[]>>
  check: CheckName
  label: LabelTerms
  reasons?: boolean
  inputRef?: Ref<HTMLInputElement>
}) {
  const { brand, lineSlug } = place
  const told = useNameCheck(draft.text, (text) => check(brand, { lineSlug, text, shadeId, ideaId }))
  const checksId = useId()
  const [had, setHad] = useState(draft.wordingReason !== '')
  const warned = told.checked?.findings.some(
    (finding) => finding.check === 'wording' && finding.grade === 'warning',
  )
  // What was asked for once does not vanish under the hand while the words change.
  if (warned && !had) setHad(true)

  return (
    <div className="space-y-4">
      <div className="grid gap-x-4 gap-y-4 sm:grid-cols-2">
        <Field label="Name" error={errors.text}>
          <Input
            ref={inputRef}
            value={draft.text}
            onChange={(event) => onChange({ text: event.target.value })}
            maxLength={NAME_LIMITS.text}
            autoComplete="off"
            aria-details={checksId}
            className="font-title text-lg"
          />
        </Field>
        <Field label="The thought behind it" optional error={errors.note}>
          <Textarea
            value={draft.note}
            onChange={(event) => onChange({ note: event.target.value })}
            maxLength={NAME_LIMITS.note}
            rows={1}
            className="min-h-10 max-md:min-h-11 pointer-coarse:min-h-11"
          />
        </Field>
      </div>
      {reasons && had ? (
        <Field
          label="Why the wording may stand"
          error={errors.wordingReason}
          hint="A name whose wording is warned of goes to review with a reason only."
        >
          <Textarea
            value={draft.wordingReason}
            onChange={(event) => onChange({ wordingReason: event.target.value })}
            maxLength={NAME_LIMITS.reason}
            rows={1}
          />
        </Field>
      ) : null}
      <div id={checksId}>
        <NameChecks check={told} label={label} />
      </div>
    </div>
  )
}
