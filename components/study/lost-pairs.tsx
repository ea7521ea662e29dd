import { ArrowRight } from 'lucide-react'

import type { LinePlace } from '@/components/shades/shades-actions'
import { Ground } from '@/components/yarn/ground'
import { WrapCard } from '@/components/yarn/wrap-card'
import type { Vision } from '@/lib/color/vision'
import type { LostShadePair, Told } from '@/lib/shades/present'

import { tableWords } from './near-twins'
import { PairNames, ShadeLink, showCount, showNumber, VISION_WORDS } from './study-words'
import { TableBehind } from './table-behind'

/** Pairs of one vision that are wound; the others stand in the table. */
const WOUND = 6

/** The pairs that fall together under one vision, as most see them and as they would be seen. */
export function LostPairs({
  place,
  vision,
  lost: { pairs, total },
}: {
  place: LinePlace
  vision: Vision
  lost: Told<LostShadePair>
}) {
  const { name, lacks } = VISION_WORDS[vision]
  return (
    <section aria-label={name} className="mt-6 print:break-inside-avoid">
      <h3 className="text-lg">
        {name} <span className="text-ink-faint">· {showCount(total, 'pair')}</span>
      </h3>
      <p className="mb-3 max-w-measure text-sm text-ink-soft">{lacks}</p>
      {total === 0 ? (
        <p>Nothing is lost: what is clearly apart stays apart.</p>
      ) : (
        <>
          <Ground>
            <ul
              role="list"
              className="grid grid-cols-[repeat(auto-fill,minmax(min(17rem,100%),1fr))] gap-x-6 gap-y-6"
            >
              {pairs.slice(0, WOUND).map((pair) => (
                <LostPair key={pair.first.id + pair.second.id} {...{ place, vision, pair }} />
              ))}
            </ul>
          </Ground>
          <TableBehind
            summary={tableWords(pairs.length, total)}
            caption={`Pairs that fall together under ${vision} vision`}
            columns={[
              { label: 'Shade' },
              { label: 'Falls together with' },
              { label: 'ΔE00', number: true },
              { label: 'ΔE00 as seen', number: true },
            ]}
            rows={pairs.map(({ first, second, deltaE, seenDeltaE }) => ({
              key: first.id + second.id,
              cells: [
                <ShadeLink key="first" place={place} shade={first} />,
                <ShadeLink key="second" place={place} shade={second} />,
                showNumber(deltaE),
                showNumber(seenDeltaE),
              ],
            }))}
          />
        </>
      )}
    </section>
  )
}

function LostPair({
  place,
  vision,
  pair: { first, second, deltaE, seenDeltaE, seen },
}: {
  place: LinePlace
  vision: Vision
  pair: LostShadePair
}) {
  const bands = [first, second].map(({ hex, label: name }) => ({ hex, name, share: 1 }))
  return (
    <li className="flex flex-wrap items-center gap-x-4 gap-y-2">
      <div className="flex items-center gap-2">
        <WrapCard compact title="As most see it" bands={bands} className="w-16 shrink-0" />
        <ArrowRight aria-hidden="true" className="size-4 shrink-0 text-ink-faint" />
        <WrapCard
          compact
          title={`As ${vision} vision has it`}
          bands={bands.map((band, at) => ({ ...band, hex: seen[at]! }))}
          className="w-16 shrink-0"
        />
      </div>
      <div className="min-w-24 grow basis-24">
        <PairNames {...{ place, first, second }} />
        <p className="mt-0.5 text-sm text-ink-soft">
          ΔE00 {showNumber(deltaE)} → {showNumber(seenDeltaE)}
        </p>
      </div>
    </li>
  )
}
