import { SheetSection } from '@/components/layout/sheet-header'
import { showReading } from '@/components/shades/shade-words'
import { shadesHref, type LinePlace, type ShadesActions } from '@/components/shades/shades-actions'
import { LEAST_GAP } from '@/lib/color/gaps'
import { chromaOf, hueOf } from '@/lib/color/types'
import { CLEARLY_APART, FALL_TOGETHER, VISIONS } from '@/lib/color/vision'
import type { RangeStudy } from '@/lib/shades/present'

import { ColorPlane } from './color-plane'
import { GapList } from './gap-list'
import { evennessInWords, LightnessLadder } from './lightness-ladder'
import { LostPairs } from './lost-pairs'
import { NearTwins, TwinLimit } from './near-twins'
import { ShadeLink, showNumber } from './study-words'
import { TableBehind } from './table-behind'

/** What a study finds, section by section, each figure with a table behind it. */
export function RangeStudySections({
  place,
  study,
  limit,
  actions,
}: {
  place: LinePlace
  study: RangeStudy
  /** The ΔE00 under which pairs are near-twins. */
  limit: number
  /** Null for whoever may only read. */
  actions: Pick<ShadesActions, 'create' | 'remove'> | null
}) {
  const { families, gaps, lost, twins } = study
  const shades = families.flatMap(({ name, shades }) =>
    shades.map((shade) => ({ family: name, shade })),
  )
  return (
    <>
      <SheetSection title="Near-twins" className="mt-6">
        <TwinLimit limit={limit} here={shadesHref(place, '/study')} />
        <NearTwins place={place} twins={twins} nearest={study.nearest} limit={limit} />
      </SheetSection>

      <SheetSection title="Lost to colour vision">
        <p className="max-w-measure text-ink-soft">
          Pairs clearly apart to most people, ΔE00 {CLEARLY_APART} and over, that fall under ΔE00{' '}
          {FALL_TOGETHER} for somebody who lacks one kind of cone. It is a model, of that kind
          missing altogether.
        </p>
        {VISIONS.map((vision) => (
          <LostPairs key={vision} place={place} vision={vision} lost={lost[vision]} />
        ))}
      </SheetSection>

      <SheetSection title="Lightness ladders">
        <p className="mb-5 max-w-measure text-ink-soft">
          Each rung is a shade at its L*. Even means steps of equal height: 100 % when all are
          equal, 0 % when one step is the whole ladder.
        </p>
        <div className="flex flex-wrap gap-x-8 gap-y-8">
          {families.map((family) => (
            <LightnessLadder key={family.id ?? 'none'} family={family} />
          ))}
        </div>
        <TableBehind
          summary="The ladders as a table"
          caption="Lightness ladders by family"
          columns={[
            { label: 'Family' },
            { label: 'Shades', number: true },
            { label: 'L* from', number: true },
            { label: 'L* to', number: true },
            { label: 'Widest step' },
            { label: 'Evenness', number: true },
          ]}
          rows={families.map((family) => {
            const { id, name, shades, ladder } = family
            const { widest } = ladder
            return {
              key: id ?? 'none',
              cells: [
                name,
                shades.length,
                showNumber(shades[0]!.lab[0]),
                showNumber(shades.at(-1)!.lab[0]),
                widest ? (
                  <>
                    {showNumber(widest.step)},{' '}
                    <ShadeLink place={place} shade={shades[widest.above]!} /> to{' '}
                    <ShadeLink place={place} shade={shades[widest.above + 1]!} />
                  </>
                ) : (
                  'none'
                ),
                evennessInWords(family),
              ],
            }
          })}
        />
      </SheetSection>

      <SheetSection title="The range">
        <p className="mb-3 max-w-measure text-ink-soft">
          Hue goes round, chroma goes outward; rings are C*.
          {gaps.length > 0 ? ' Crosses are the gaps below.' : null}
        </p>
        <ColorPlane families={families} gaps={gaps} />
        <TableBehind
          summary={`All ${shades.length} shades as a table`}
          caption="The shades by family"
          columns={[
            { label: 'Shade' },
            { label: 'Number' },
            { label: 'Family' },
            { label: 'L*', number: true },
            { label: 'a*', number: true },
            { label: 'b*', number: true },
            { label: 'C*', number: true },
            { label: 'h°', number: true },
          ]}
          rows={shades.map(({ family, shade }) => ({
            key: shade.id,
            cells: [
              <ShadeLink key="shade" place={place} shade={shade} />,
              shade.number,
              family,
              ...shade.lab.map(showReading),
              showNumber(chromaOf(shade.lab)),
              Math.round(hueOf(shade.lab)),
            ],
          }))}
        />
      </SheetSection>

      <section id="gaps" tabIndex={-1} aria-label="Gaps" className="outline-none">
        <SheetSection title="Gaps">
          {gaps.length === 0 ? (
            <p>None: wherever you look between the shades, one lies within ΔE00 {LEAST_GAP}.</p>
          ) : (
            <>
              <p className="mb-5 max-w-measure text-ink-soft">
                The largest empty regions inside the range, each with a colour to aim for in the
                next lab dips.
              </p>
              <GapList place={place} gaps={gaps} terms={study.terms} actions={actions} />
            </>
          )}
        </SheetSection>
      </section>
    </>
  )
}
