import { NavTabs } from '@/components/ui/nav-tabs'

import { shadesHref, type LinePlace } from './shades-actions'

/** The pages of a line's shades, and where each stands under them. */
const TABS = {
  book: { label: 'Sample book', under: '' },
  table: { label: 'Table', under: '?view=table' },
  families: { label: 'Families', under: '/families' },
  study: { label: 'Range study', under: '/study' },
} as const

/** The ways to look at a line's shades. */
export function ShadesTabs({ place, current }: { place: LinePlace; current: keyof typeof TABS }) {
  return (
    <NavTabs
      label="How the shades are shown"
      items={Object.entries(TABS).map(([tab, { label, under }]) => ({
        href: shadesHref(place, under),
        label,
        current: tab === current,
      }))}
    />
  )
}
