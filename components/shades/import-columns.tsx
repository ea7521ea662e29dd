'use client'

import { SheetSection } from '@/components/layout/sheet-header'
import { Field } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { Select } from '@/components/ui/select'
import type { ImportPreview } from '@/lib/shades/present'
import {
  CSV_FIELDS,
  READING_TERMS,
  TERMS_WORDS,
  type CsvField,
  type CsvMapping,
  type ReadingTerms,
} from '@/lib/shades/constants'

const FIELD_WORDS: Record<CsvField, string> = {
  number: 'Number',
  name: 'Name',
  status: 'Status',
  L: 'L*',
  a: 'a*',
  b: 'b*',
  illuminant: 'Illuminant',
  observer: 'Observer',
  hex: 'Hex',
  order: 'Order',
}

/** Which column of the file holds what, as guessed and as set right. */
export function ImportColumns({
  preview,
  terms,
  onMapping,
  onTerms,
}: {
  preview: ImportPreview
  terms: ReadingTerms | null
  onMapping: (mapping: CsvMapping) => void
  onTerms: (terms: ReadingTerms | null) => void
}) {
  const { header, examples, mapping, problems, rowCount } = preview
  const hasReadings = mapping.L !== null || mapping.a !== null || mapping.b !== null
  return (
    <SheetSection
      title="Which column holds what"
      aside={rowCount === 1 ? '1 row' : `${rowCount.toLocaleString('en-GB')} rows`}
    >
      <div className="grid grid-cols-[repeat(auto-fill,minmax(10.5rem,1fr))] gap-x-4 gap-y-4">
        {CSV_FIELDS.map((field) => {
          const column = mapping[field]
          const example =
            column === null ? undefined : examples.map((row) => row[column]).find(Boolean)
          return (
            <Field
              key={field}
              label={FIELD_WORDS[field]}
              required={field === 'number'}
              hint={example ? <span className="break-words">such as “{example}”</span> : undefined}
            >
              <Select
                value={column ?? ''}
                onChange={({ target: { value } }) =>
                  onMapping({ ...mapping, [field]: value === '' ? null : Number(value) })
                }
              >
                <option value="">Not in the file</option>
                {header.map((name, at) => (
                  <option key={at} value={at}>
                    {name || `Column ${at + 1}`}
                  </option>
                ))}
              </Select>
            </Field>
          )
        })}
      </div>
      {hasReadings ? (
        <Field
          label="Light and observer, where a row does not say"
          hint="As the instrument was set. What a row itself says goes first."
          className="mt-5 max-w-96"
        >
          <Select
            value={terms ?? ''}
            onChange={({ target: { value } }) =>
              onTerms(READING_TERMS.find((one) => one === value) ?? null)
            }
          >
            <option value="">Not said: take none of them</option>
            {READING_TERMS.map((one) => (
              <option key={one} value={one}>
                {TERMS_WORDS[one]}
              </option>
            ))}
          </Select>
        </Field>
      ) : null}
      {problems.length > 0 ? (
        <Notice kind="warning" title="Before the rows can be read" className="mt-5">
          <ul className="space-y-1">
            {problems.map((problem) => (
              <li key={problem}>{problem}</li>
            ))}
          </ul>
        </Notice>
      ) : null}
    </SheetSection>
  )
}
