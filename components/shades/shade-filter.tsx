'use client'

import { Search } from 'lucide-react'
import { useEffect, useRef, useState } from 'react'

import { Checkbox } from '@/components/ui/checkbox'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { SHADE_LIMITS, SHADE_STATUSES, type ShadeStatus } from '@/lib/shades/constants'
import type { ShadeTableFilter } from '@/lib/shades/schema'

import { STATUS_WORDS } from './shade-words'

/** How long typing must rest before it is searched for, in milliseconds. */
const REST = 300

/** What the table is narrowed to. */
export function ShadeFilter({
  filter,
  onChange,
}: {
  filter: ShadeTableFilter
  onChange: (change: Partial<ShadeTableFilter>) => void
}) {
  const [q, setQ] = useState(filter.q)
  const change = useRef(onChange)
  useEffect(() => {
    change.current = onChange
  })
  useEffect(() => {
    if (q.trim() === filter.q) return
    const timer = setTimeout(() => change.current({ q: q.trim() }), REST)
    return () => clearTimeout(timer)
  }, [q, filter.q])

  const toggle = (status: ShadeStatus, on: boolean) =>
    onChange({
      status: SHADE_STATUSES.filter((one) => (one === status ? on : filter.status.includes(one))),
    })

  return (
    <search className="flex flex-wrap items-center gap-x-6 gap-y-2 print:hidden">
      <Field hideLabel label="Search number or name" className="relative w-full sm:w-60">
        <Input
          type="search"
          placeholder="Search number or name"
          className="pl-9"
          maxLength={SHADE_LIMITS.search}
          value={q}
          onChange={(event) => setQ(event.target.value)}
        />
        <Search
          aria-hidden="true"
          className="pointer-events-none absolute inset-y-0 left-3 my-auto size-4 text-ink-faint"
        />
      </Field>
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
