'use client'

import { Checkbox } from '@/components/ui/checkbox'
import { SearchField } from '@/components/ui/search-field'
import { SHADE_LIMITS, SHADE_STATUSES, type ShadeStatus } from '@/lib/shades/constants'
import type { ShadeTableFilter } from '@/lib/shades/schema'

import { STATUS_WORDS } from './shade-words'

/** What the table is narrowed to. */
export function ShadeFilter({
  filter,
  onChange,
}: {
  filter: ShadeTableFilter
  onChange: (change: Partial<ShadeTableFilter>) => void
}) {
  const toggle = (status: ShadeStatus, on: boolean) =>
    onChange({
      status: SHADE_STATUSES.filter((one) => (one === status ? on : filter.status.includes(one))),
    })

  return (
    <search className="flex flex-wrap items-center gap-x-6 gap-y-2 print:hidden">
      <SearchField
        label="Search number or name"
        value={filter.q}
        maxLength={SHADE_LIMITS.search}
        onSearch={(q) => onChange({ q })}
      />
      <fieldset className="flex flex-wrap gap-x-4">
        <legend className="sr-only">Status</legend>
        {SHADE_STATUSES.map((status) => (
          <Checkbox
            key={status}
            label={STATUS_WORDS[status]}
            checked={filter.status.includes(status)}
            onChange={(event) => toggle(status, event.target.checked)}
          />
        ))}
        <Checkbox
          label="Beyond the screen"
          checked={filter.outside}
          onChange={(event) => onChange({ outside: event.target.checked })}
        />
      </fieldset>
    </search>
  )
}
