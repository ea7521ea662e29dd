import { NavTabs } from '@/components/ui/nav-tabs'

import { namesHref, type NamesPlace } from './names-place'

/** The pages of a line's names, and where each stands under them. */
const TABS = {
  list: { label: 'List', under: '' },
  heap: { label: 'Heap', under: '/heap' },
  review: { label: 'Review', under: '/review' },
  together: { label: 'All together', under: '/together' },
  label: { label: 'Labels', under: '/labels' },
  history: { label: 'History', under: '/history' },
} as const

/** The ways to look at a line's names. */
export function NamesTabs({ place, current }: { place: NamesPlace; current: keyof typeof TABS }) {
  return (
    <NavTabs
      label="The names of the line"
      items={Object.entries(TABS).map(([tab, { label, under }]) => ({
        href: namesHref(place, under),
        label,
        current: tab === current,
      }))}
    />
  )
}
