import { AppLink } from '@/components/ui/app-link'
import { Ground } from '@/components/yarn/ground'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { ShadeView } from '@/lib/shades/present'

import { BeyondScreen, ShadeStatusWord } from './shade-words'
import { shadesHref, type LinePlace } from './shades-actions'

/** A line's shades wound on card, by family, light to dark; the family stands in the margin. */
export function SampleBook({
  place,
  groups,
}: {
  place: LinePlace
  groups: readonly { family: string; shades: readonly ShadeView[] }[]
}) {
  return (
    <Ground>
      {groups.map(({ family, shades }) => (
        <section
          key={family}
          aria-label={family}
          className="gap-x-6 border-b border-hairline py-5 first:pt-0 last:border-b-0 last:pb-0 lg:grid lg:grid-cols-[7rem_minmax(0,1fr)] print:grid print:grid-cols-[6rem_minmax(0,1fr)]"
        >
          <div className="mb-3 lg:mb-0">
            <h2 className="text-lg">{family}</h2>
            <p className="text-sm text-ink-faint">
              {shades.length === 1 ? '1 shade' : `${shades.length} shades`}
            </p>
          </div>
          <ul
            role="list"
            className="grid grid-cols-[repeat(auto-fill,minmax(7rem,1fr))] gap-x-4 gap-y-6 sm:grid-cols-[repeat(auto-fill,minmax(9.25rem,1fr))] sm:gap-x-5 print:grid-cols-[repeat(auto-fill,minmax(7rem,1fr))]"
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
        </section>
      ))}
    </Ground>
  )
}
