import type { LinePlace } from '@/components/shades/shades-actions'
import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { Ground } from '@/components/yarn/ground'
import { WrapCard } from '@/components/yarn/wrap-card'
import { STUDY_LIMITS } from '@/lib/shades/constants'
import type { ShadePair, Told } from '@/lib/shades/present'

import { PairNames, ShadeLink, showCount, showNumber } from './study-words'
import { TableBehind } from './table-behind'

/** Pairs that are wound; the others stand in the table. */
const WOUND = 12

/** Asks for another limit; it is the address, so it also works before the script does. */
export function TwinLimit({ limit, here }: { limit: number; here: string }) {
  const [least, most] = STUDY_LIMITS.twins
  return (
    <form action={here} className="mb-5 flex flex-wrap items-end gap-3 print:hidden">
      <Field label="Under ΔE00" className="w-28">
        <Input
          type="number"
          name="twins"
          min={least}
          max={most}
          step={0.5}
          inputMode="decimal"
          defaultValue={limit}
        />
      </Field>
      <Button type="submit">Show pairs</Button>
    </form>
  )
}

/** Each pair wound on one card, the nearest first. */
export function NearTwins({
  place,
  twins: { pairs, total },
  nearest,
  limit,
}: {
  place: LinePlace
  twins: Told<ShadePair>
  /** Shown where there are none. */
  nearest: ShadePair | null
  limit: number
}) {
  const wound = total === 0 && nearest ? [nearest] : pairs.slice(0, WOUND)
  return (
    <>
      <p className="mb-4 max-w-measure text-ink-soft">
        {total === 0
          ? `No two shades are under ΔE00 ${limit} of each other. These two are the nearest:`
          : `${showCount(total, 'pair')} under ΔE00 ${limit}, the nearest first. Where both are needed, keep them apart in a combination and on the shelf.`}
      </p>
      <Ground>
        <ul
          role="list"
          className="grid grid-cols-[repeat(auto-fill,minmax(13rem,1fr))] gap-x-6 gap-y-6"
        >
          {wound.map(({ first, second, deltaE }) => (
            <li key={first.id + second.id} className="flex items-center gap-4">
              <WrapCard
                compact
                title="Wound side by side"
                bands={[first, second].map(({ hex, label: name }) => ({ hex, name, share: 1 }))}
                className="w-20 shrink-0"
              />
              <div className="min-w-0">
                <PairNames {...{ place, first, second }} />
                <p className="mt-0.5 text-sm text-ink-soft">ΔE00 {showNumber(deltaE)}</p>
              </div>
            </li>
          ))}
        </ul>
      </Ground>
      {total > 0 ? <TwinTable {...{ place, pairs, total, limit }} /> : null}
    </>
  )
}

function TwinTable({
  place,
  pairs,
  total,
  limit,
}: Told<ShadePair> & { place: LinePlace; limit: number }) {
  return (
    <TableBehind
      summary={tableWords(pairs.length, total)}
      caption={`Near-twins under ΔE00 ${limit}`}
      columns={[
        { label: 'Shade' },
        { label: 'Its near-twin' },
        { label: 'ΔE00', number: true },
        { label: 'L* apart', number: true },
      ]}
      rows={pairs.map(({ first, second, deltaE }) => ({
        key: first.id + second.id,
        cells: [
          <ShadeLink key="first" place={place} shade={first} />,
          <ShadeLink key="second" place={place} shade={second} />,
          showNumber(deltaE),
          showNumber(Math.abs(first.lab[0] - second.lab[0])),
        ],
      }))}
    />
  )
}

/** What a table of pairs is called when it may not hold them all. */
export const tableWords = (told: number, total: number): string =>
  told < total
    ? `The first ${told} of ${total.toLocaleString('en-GB')} pairs as a table`
    : `${total === 1 ? 'The pair' : `All ${total} pairs`} as a table`
