'use client'

import type { DraftPlace } from '@/components/combinations/draft'
import type { ShadeOf } from '@/components/combinations/shade-of'
import { TableBehind } from '@/components/study/table-behind'
import { Status } from '@/components/ui/status'
import { WoundSample } from '@/components/yarn/wound-sample'
import {
  clashesOf,
  readPairs,
  VALUE_LIMITS,
  type ClashKind,
  type PairReading,
  type ValueContrast,
} from '@/lib/color/clashes'
import { NEAR_TWIN_LIMIT } from '@/lib/color/range-study'
import { VISIONS } from '@/lib/color/vision'

import { CLASH_WORDS, shadesIn } from './help-words'

const KINDS: readonly ClashKind[] = ['twins', 'muddy', ...VISIONS]
const VALUE_WORDS: Record<ValueContrast, string> = { clear: 'Clear', soft: 'Soft', muddy: 'Muddy' }

/** What may trouble the five: near-twins, muddy contrasts of value, pairs lost to colour vision. */
export function ClashNotes({
  places,
  shadeOf,
}: {
  places: readonly DraftPlace[]
  shadeOf: ShadeOf
}) {
  const five = shadesIn(places, shadeOf)
  const pairs = readPairs(five.map((shade) => shade?.lab ?? null))
  if (pairs.length === 0) {
    return <p className="text-ink-soft">With two shades in place, what clashes is told here.</p>
  }
  const clashes = clashesOf(pairs)
  const nameOf = (place: number) => five[place]!.label
  const groups = KINDS.map((kind) => ({
    kind,
    of: clashes.filter((clash) => clash.kind === kind),
  })).filter(({ of }) => of.length > 0)
  return (
    <div>
      {groups.length === 0 ? (
        <>
          <Status kind="done">Nothing clashes</Status>
          <p className="mt-1 max-w-measure text-ink-soft">
            Every two of them differ in lightness, and everybody can tell them apart.
          </p>
        </>
      ) : (
        <dl className="space-y-4">
          {groups.map(({ kind, of }) => (
            <div key={kind}>
              <dt>
                <Status kind="attention">{CLASH_WORDS[kind].name}</Status>
              </dt>
              {of.map(({ first, second }) => (
                <dd key={`${first} ${second}`} className="mt-1 flex items-center gap-2">
                  <span className="flex shrink-0 flex-col" aria-hidden="true">
                    <WoundSample hex={five[first]!.hex} className="h-4 w-auto" />
                    <WoundSample hex={five[second]!.hex} className="-mt-0.5 h-4 w-auto" />
                  </span>
                  <span className="min-w-0 break-words">
                    {nameOf(first)} and {nameOf(second)}
                  </span>
                </dd>
              ))}
              <dd className="mt-1 max-w-measure text-sm text-ink-faint">
                {CLASH_WORDS[kind].means}
              </dd>
            </div>
          ))}
        </dl>
      )}
      <TableBehind
        summary={
          pairs.length === 1 ? 'The pair as a table' : `All ${pairs.length} pairs as a table`
        }
        caption="The pairs of the five"
        columns={[
          { label: 'Pair' },
          { label: 'ΔE00', number: true },
          { label: 'L* apart', number: true },
          { label: 'Value' },
          { label: 'Lost to' },
        ]}
        rows={pairs.map((pair) => rowOf(pair, nameOf))}
      />
      <p className="mt-3 max-w-measure text-sm text-ink-faint">
        Near-twins are under ΔE00 {NEAR_TWIN_LIMIT}. Value is clear from {VALUE_LIMITS.clear} L* on,
        soft from {VALUE_LIMITS.soft}, muddy below: common practice, no law. Vivid colours look
        lighter or darker than they measure, so let a swatch decide.
      </p>
    </div>
  )
}

function rowOf(
  { first, second, deltaE, deltaL, value, twins, lost }: PairReading,
  nameOf: (place: number) => string,
) {
  return {
    key: `${first} ${second}`,
    cells: [
      `${nameOf(first)} · ${nameOf(second)}`,
      `${deltaE.toFixed(1)}${twins ? ', near-twins' : ''}`,
      deltaL.toFixed(0),
      VALUE_WORDS[value],
      lost.join(', ') || 'nobody',
    ],
  }
}
