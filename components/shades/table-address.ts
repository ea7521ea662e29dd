import type { ShadeTableFilter } from '@/lib/shades/schema'

import { shadesHref, type LinePlace } from './shades-actions'

/** The address of the table as filtered, sorted and paged; what is the default is left out. */
export function tableHref(place: LinePlace, filter: ShadeTableFilter): string {
  const query = new URLSearchParams({ view: 'table' })
  if (filter.q) query.set('q', filter.q)
  if (filter.status.length > 0) query.set('status', filter.status.join(','))
  if (filter.outside) query.set('outside', '1')
  if (filter.sort !== 'order') query.set('sort', filter.sort)
  if (filter.dir !== 'asc') query.set('dir', filter.dir)
  if (filter.page > 1) query.set('page', String(filter.page))
  return `${shadesHref(place)}?${query.toString().replaceAll('%2C', ',')}`
}
