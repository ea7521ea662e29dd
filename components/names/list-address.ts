import type { NameListFilter } from '@/lib/names/schema'

import { namesHref, type NamesPlace } from './names-place'

/** The address of the list as narrowed, sorted and paged; what is the default is left out. */
export function listHref(place: NamesPlace, filter: NameListFilter): string {
  const query = new URLSearchParams()
  if (filter.q) query.set('q', filter.q)
  if (filter.state.length > 0) query.set('state', filter.state.join(','))
  if (filter.family) query.set('family', filter.family)
  if (filter.warned) query.set('warned', '1')
  if (filter.sort !== 'order') query.set('sort', filter.sort)
  if (filter.dir !== 'asc') query.set('dir', filter.dir)
  if (filter.page > 1) query.set('page', String(filter.page))
  const asked = query.toString().replaceAll('%2C', ',')
  return namesHref(place, asked && `?${asked}`)
}
