import type { HeapFilter } from '@/lib/names/schema'

import { namesHref, type NamesPlace } from './names-place'

/** The heap's address as filtered and paged; what is the default is left out. */
export function heapHref(place: NamesPlace, { q, put, page }: HeapFilter): string {
  const query = new URLSearchParams({
    ...(q && { q }),
    ...(put && { put: 'by' }),
    ...(page > 1 && { page: String(page) }),
  }).toString()
  return namesHref(place, `/heap${query && `?${query}`}`)
}
