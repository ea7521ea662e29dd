'use client'

import { Checkbox } from '@/components/ui/checkbox'
import { Field } from '@/components/ui/field'
import { SearchField } from '@/components/ui/search-field'
import { Select } from '@/components/ui/select'
import type { FamilyView } from '@/lib/families/present'
import { LISTED_STATES, NAME_SORTS, type ListedState, type NameSort } from '@/lib/names/constants'
import type { NameListFilter } from '@/lib/names/schema'
import { SHADE_LIMITS } from '@/lib/shades/constants'

import { LISTED_WORDS, SORT_WORDS } from './list-words'

/** What the list is narrowed to. */
export function ListFilter({
  filter,
  families,
  onChange,
}: {
  filter: NameListFilter
  families: readonly Pick<FamilyView, 'id' | 'name'>[]
  onChange: (change: Partial<NameListFilter>) => void
}) {
  const toggle = (state: ListedState, on: boolean) =>
    onChange({
      state: LISTED_STATES.filter((one) => (one === state ? on : filter.state.includes(one))),
    })

  return (
    <search className="flex flex-wrap items-center gap-x-6 gap-y-2 print:hidden">
      <SearchField
        label="Search number or name"
        value={filter.q}
        maxLength={SHADE_LIMITS.search}
        onSearch={(q) => onChange({ q })}
      />
      {families.length > 0 ? (
        <Field hideLabel label="Family" className="w-full sm:w-48">
          <Select
            value={filter.family}
            onChange={(event) => onChange({ family: event.target.value })}
          >
            <option value="">All families</option>
            {families.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
            <option value="none">In no family</option>
          </Select>
        </Field>
      ) : null}
      {/* A phone shows not all of the heads that sort. */}
      <Field hideLabel label="Sort by" className="w-full sm:hidden">
        <Select
          value={filter.sort}
          onChange={(event) => {
            const sort = event.target.value as NameSort
            onChange({ sort, dir: sort === 'checks' ? 'desc' : 'asc' })
          }}
        >
          {NAME_SORTS.map((sort) => (
            <option key={sort} value={sort}>
              Sort by: {SORT_WORDS[sort].toLowerCase()}
            </option>
          ))}
        </Select>
      </Field>
      <fieldset className="flex flex-wrap gap-x-4">
        <legend className="sr-only">State</legend>
        {LISTED_STATES.map((state) => (
          <Checkbox
            key={state}
            label={LISTED_WORDS[state]}
            checked={filter.state.includes(state)}
            onChange={(event) => toggle(state, event.target.checked)}
          />
        ))}
        <Checkbox
          label="With a warning"
          checked={filter.warned}
          onChange={(event) => onChange({ warned: event.target.checked })}
        />
      </fieldset>
    </search>
  )
}
