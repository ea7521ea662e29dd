'use client'

import { Lock } from 'lucide-react'

import { WoundSample } from '@/components/yarn/wound-sample'
import { nearestShades } from '@/lib/color/match'
import type { StrikingColorView } from '@/lib/photographs/present'

import type { MatchShadeView } from './types'
import type { WishesControl } from './use-wishes'

/** The picture's striking colours; pressing one locks the shade nearest to it. */
export function StrikingChips({
  colors,
  shades,
  control,
}: {
  colors: readonly StrikingColorView[]
  shades: readonly MatchShadeView[]
  control: WishesControl
}) {
  if (colors.length === 0 || shades.length === 0) return null
  const byId = new Map(shades.map((shade) => [shade.id, shade]))
  return (
    <section aria-labelledby="striking" className="min-[1000px]:col-span-2 print:hidden">
      <h2 id="striking" className="text-lg">
        Striking colours
      </h2>
      <p className="max-w-measure text-sm text-ink-faint">
        The vivid ones of the picture, each with the line’s nearest shade. Press one to lock that
        shade.
      </p>
      <ul role="list" className="mt-2 flex flex-wrap gap-2">
        {colors.map(({ lab, hex }, at) => {
          const [nearest] = nearestShades(lab, shades, 1)
          const shade = byId.get(nearest!.shadeId)!
          const locked = control.wishes.lock.includes(shade.id)
          return (
            <li key={at}>
              <button
                type="button"
                aria-pressed={locked}
                onClick={() => (locked ? control.unlock(shade.id) : control.lock(shade.id))}
                className="inline-flex min-h-9 items-center gap-2 rounded border border-rule bg-sheet py-1 pr-3 pl-1.5 text-left text-sm hover:border-ink aria-pressed:border-woad aria-pressed:font-semibold pointer-coarse:min-h-11"
              >
                <svg width="20" height="20" viewBox="0 0 20 20" aria-hidden="true">
                  <circle cx="10" cy="10" r="9.5" fill={hex} />
                </svg>
                <WoundSample hex={shade.hex} className="h-6 w-auto" />
                <span>
                  {shade.label}{' '}
                  <span className="text-ink-faint">ΔE00 {nearest!.deltaE.toFixed(1)}</span>
                </span>
                {locked ? <Lock aria-hidden="true" className="size-3.5" /> : null}
              </button>
            </li>
          )
        })}
      </ul>
    </section>
  )
}
