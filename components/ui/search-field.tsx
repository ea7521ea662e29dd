'use client'

import { Search } from 'lucide-react'
import { useEffect, useRef, useState } from 'react'

import { Field } from './field'
import { Input } from './input'

/** How long typing must rest before it is searched for, in milliseconds. */
const REST = 300

/** What a list is searched by; it is asked once typing rests. */
export function SearchField({
  label,
  value,
  maxLength,
  onSearch,
}: {
  label: string
  /** What the list shows now. */
  value: string
  maxLength: number
  onSearch: (q: string) => void
}) {
  const [q, setQ] = useState(value)
  const search = useRef(onSearch)
  useEffect(() => {
    search.current = onSearch
  })
  useEffect(() => {
    if (q.trim() === value) return
    const timer = setTimeout(() => search.current(q.trim()), REST)
    return () => clearTimeout(timer)
  }, [q, value])

  return (
    <Field hideLabel label={label} className="relative w-full sm:w-60">
      <Input
        type="search"
        placeholder={label}
        className="pl-9"
        maxLength={maxLength}
        value={q}
        onChange={(event) => setQ(event.target.value)}
      />
      <Search
        aria-hidden="true"
        className="pointer-events-none absolute inset-y-0 left-3 my-auto size-4 text-ink-faint"
      />
    </Field>
  )
}
