import { AppLink } from '@/components/ui/app-link'
import { BOOK_ORDERS, type BookOrder } from '@/lib/shades/constants'

import { shadesHref, type LinePlace } from './shades-actions'

const WORDS: Record<BookOrder, string> = {
  family: 'Family',
  lightness: 'Lightness',
  number: 'Number',
}

/** Where the sample book stands in this order, at this page. */
export const bookHref = (place: LinePlace, order: BookOrder, page = 1): string => {
  const query = new URLSearchParams({
    ...(order !== 'family' && { order }),
    ...(page > 1 && { page: String(page) }),
  }).toString()
  return shadesHref(place, query && `?${query}`)
}

/** Chooses the order of the sample book; each has its address. */
export function BookOrderChoice({ place, order }: { place: LinePlace; order: BookOrder }) {
  return (
    <nav aria-label="Order of the sample book" className="flex items-center gap-1 text-sm">
      <span aria-hidden="true" className="mr-1 text-ink-soft">
        By
      </span>
      {BOOK_ORDERS.map((one) => (
        <AppLink
          key={one}
          href={bookHref(place, one)}
          aria-current={one === order ? 'page' : undefined}
          className="inline-flex min-h-8 items-center rounded border border-transparent px-2 text-ink-soft hover:bg-wash aria-[current]:border-rule aria-[current]:text-ink pointer-coarse:min-h-11"
        >
          {WORDS[one]}
        </AppLink>
      ))}
    </nav>
  )
}
