'use client'

import { useRouter } from 'next/navigation'

import { AppLink } from '@/components/ui/app-link'
import { SearchField } from '@/components/ui/search-field'
import { SHADE_LIMITS } from '@/lib/shades/constants'
import type { HeapFilter as Filter } from '@/lib/names/schema'

import { heapHref } from './heap-address'
import type { NamesPlace } from './names-place'

/** Whether the heap is shown or what was put by, and what is searched for in it. */
export function HeapFilter({
  place,
  filter,
  counts,
}: {
  place: NamesPlace
  filter: Filter
  counts: { loose: number; putBy: number }
}) {
  const router = useRouter()
  const kinds = [
    { put: false, label: 'In the heap', count: counts.loose },
    { put: true, label: 'Put by', count: counts.putBy },
  ]
  return (
    <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-3 print:hidden">
      <nav aria-label="Which ideas are shown" className="flex gap-1">
        {kinds.map(({ put, label, count }) => (
          <AppLink
            key={label}
            href={heapHref(place, { q: '', put, page: 1 })}
            aria-current={put === filter.put ? 'page' : undefined}
            className="inline-flex min-h-8 items-center gap-1.5 rounded border border-transparent px-2 text-ink-soft hover:bg-wash aria-[current]:border-rule aria-[current]:text-ink pointer-coarse:min-h-11"
          >
            {label} <span className="text-ink-faint">{count}</span>
          </AppLink>
        ))}
      </nav>
      <search>
        <SearchField
          key={String(filter.put)}
          label="Search name or thought"
          value={filter.q}
          maxLength={SHADE_LIMITS.search}
          onSearch={(q) => router.push(heapHref(place, { ...filter, q, page: 1 }) as never)}
        />
      </search>
    </div>
  )
}
