'use client'

import { ListFilter, Search } from 'lucide-react'
import { useEffect, useRef, useState, type ReactNode } from 'react'

import { Button } from '@/components/ui/button'
import { cn } from '@/components/ui/cn'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { Select } from '@/components/ui/select'
import { COMBINATION_LIMITS } from '@/lib/combinations/constants'
import type { BoardView } from '@/lib/combinations/present'

import type { BoardFilter } from './board-filter'

/** How long typing must rest before it is searched for, in milliseconds. */
const REST = 200

/** What the board is narrowed to: the address holds it, so that a link shares it. */
export function BoardFilterFields({
  here,
  board,
  filter,
  onChange,
  children,
}: {
  /** The address of the whole board. */
  here: string
  board: BoardView
  filter: BoardFilter
  onChange: (change: Partial<BoardFilter>) => void
  /** What stands at the end of the row. */
  children?: ReactNode
}) {
  const [q, setQ] = useState(filter.q)
  const [heard, setHeard] = useState(filter.q)
  // The address was changed by something else than typing.
  if (heard !== filter.q) {
    setHeard(filter.q)
    if (q.trim() !== filter.q) setQ(filter.q)
  }
  const change = useRef(onChange)
  useEffect(() => {
    change.current = onChange
  })
  useEffect(() => {
    if (q.trim() === filter.q) return
    const timer = setTimeout(() => change.current({ q: q.trim() }), REST)
    return () => clearTimeout(timer)
  }, [q, filter.q])

  const [open, setOpen] = useState(false)
  const narrowed = [filter.family, filter.photograph, filter.author].filter(Boolean).length
  return (
    <form
      action={here}
      role="search"
      onSubmit={(event) => {
        event.preventDefault()
        onChange({ q: q.trim() })
      }}
      className="mb-5 flex flex-wrap items-end gap-3 print:hidden"
    >
      <Field hideLabel label="Search title or shade" className="relative min-w-44 grow basis-44">
        <Input
          type="search"
          name="q"
          placeholder="Search title or shade"
          className="pl-9"
          maxLength={COMBINATION_LIMITS.search}
          value={q}
          onChange={(event) => setQ(event.target.value)}
        />
        <Search
          aria-hidden="true"
          className="pointer-events-none absolute inset-y-0 left-3 my-auto size-4 text-ink-faint"
        />
      </Field>
      <Button
        className="md:hidden"
        icon={<ListFilter aria-hidden="true" />}
        aria-expanded={open}
        onClick={() => setOpen(!open)}
      >
        {narrowed > 0 ? `Filter (${narrowed})` : 'Filter'}
      </Button>
      <div className={cn('contents', !open && 'max-md:hidden')}>
        <Choice
          label="Family"
          all="All families"
          name="family"
          value={filter.family}
          choices={board.families.map(({ id, name }) => [id, name])}
          onChange={(family) => onChange({ family })}
        />
        <Choice
          label="Photograph"
          all="All photographs"
          name="photograph"
          value={filter.photograph}
          choices={board.photographs.map(({ id, title }) => [id, title])}
          onChange={(photograph) => onChange({ photograph })}
        />
        <Choice
          label="Author"
          all="All authors"
          name="author"
          value={filter.author}
          choices={board.authors.map(({ id, name }) => [id, name])}
          onChange={(author) => onChange({ author })}
        />
      </div>
      {children}
    </form>
  )
}

/** One of a list, or all; nothing where there is nothing to choose between. */
function Choice({
  label,
  all,
  name,
  value,
  choices,
  onChange,
}: {
  label: string
  all: string
  name: string
  value: string
  choices: readonly (readonly [id: string, words: string])[]
  onChange: (id: string) => void
}) {
  if (choices.length === 0) return null
  return (
    <Field hideLabel label={label} className="min-w-36 grow basis-36 sm:max-w-56">
      <Select name={name} value={value} onChange={(event) => onChange(event.target.value)}>
        <option value="">{all}</option>
        {choices.map(([id, words]) => (
          <option key={id} value={id}>
            {words}
          </option>
        ))}
      </Select>
    </Field>
  )
}
