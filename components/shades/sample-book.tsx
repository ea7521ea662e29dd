import { AppLink } from '@/components/ui/app-link'
import { Ground } from '@/components/yarn/ground'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { ShadeView } from '@/lib/shades/present'

import { BeyondScreen, ShadeStatusWord } from './shade-words'
import { shadesHref, type LinePlace } from './shades-actions'

/** A part of the book: a family, a step of lightness, or all of it. */
export interface BookPart {
  id: string
  /** What stands in the margin; null for all of it. */
  heading: string | null
  /** How many shades it has on all pages of the book. */
  total: number
  shades: readonly ShadeView[]
}

/** A line's shades wound on card; what holds a part together stands in the margin. */
export function SampleBook({ place, groups }: { place: LinePlace; groups: readonly BookPart[] }) {
  return (
    <Ground className="border border-hairline p-4 sm:p-6 print:border-0 print:p-0">
      {groups.map(({ id, heading, total, shades }) =>
        heading === null ? (
          <section key={id} aria-label="All shades">
            <Samples place={place} shades={shades} />
          </section>
        ) : (
          <section
            key={id}
            aria-label={heading}
            className="gap-x-6 border-b border-hairline py-5 first:pt-0 last:border-b-0 last:pb-0 lg:grid lg:grid-cols-[7rem_minmax(0,1fr)] print:grid print:grid-cols-[7rem_minmax(0,1fr)] print:py-4"
          >
            <div className="mb-3 lg:mb-0 print:mb-0">
              <h2 className="text-lg">{heading}</h2>
              <p className="text-sm text-ink-faint">
                {total === 1 ? '1 shade' : `${total} shades`}
              </p>
            </div>
            <Samples place={place} shades={shades} />
          </section>
        ),
      )}
    </Ground>
  )
}

/** Samples in rows, as many as the sheet is wide. */
function Samples({ place, shades }: { place: LinePlace; shades: readonly ShadeView[] }) {
  return (
    <ul
      role="list"
      className="grid grid-cols-[repeat(auto-fill,minmax(7rem,1fr))] gap-x-4 gap-y-6 sm:grid-cols-[repeat(auto-fill,minmax(8.25rem,1fr))] sm:gap-x-4 print:grid-cols-[repeat(auto-fill,minmax(6.5rem,1fr))] print:gap-x-4 print:gap-y-4"
    >
      {shades.map((shade) => (
        <li key={shade.id} className="min-w-0">
          <AppLink href={shadesHref(place, `/${shade.id}`)} className="group block">
            <WoundSample hex={shade.hex} size="card" className="h-auto w-full max-w-37" />
            <span className="mt-1.5 block font-title leading-snug break-words group-hover:underline">
              {shade.label}
            </span>
            {shade.name ? (
              <span className="block text-sm text-ink-soft">No. {shade.number}</span>
            ) : null}
          </AppLink>
          {shade.status === 'approved' ? null : (
            <div className="mt-0.5">
              <ShadeStatusWord status={shade.status} />
            </div>
          )}
          {shade.inGamut ? null : <BeyondScreen className="mt-0.5" />}
        </li>
      ))}
    </ul>
  )
}
