import { cn } from '@/components/ui/cn'
import { Status } from '@/components/ui/status'
import type { LabelSetting, SetName } from '@/lib/naming/label'
import type { LabelView } from '@/lib/names/present'

import { LabelPicture } from './label-picture'
import { fitInWords } from './label-words'

/** What a sheet of paper, A4 or Letter, has room for between its margins, mm. */
const UPRIGHT = 180
const ACROSS = 250
/** Of the paper that a label is drawn with at least on either side of the room for its name, mm. */
const MARGIN = 4

/** How wide a label is drawn: a name that is too long stands out over its edges. */
const widthOf = ({ width }: LabelSetting, { over }: SetName): number =>
  width + 2 * Math.max(MARGIN, over / 2 + 0.5)

/** A line of a known length, to see whether the sheet came out of the printer at its size. */
function Ruler() {
  return (
    <svg
      role="img"
      aria-label="A line of 100 mm with a mark every 10 mm"
      viewBox="-0.2 0 100.4 5"
      width="100.4mm"
      height="5mm"
      className="h-auto max-w-full"
    >
      <path
        d={`M0 4.5H100${Array.from({ length: 11 }, (_, at) => `M${at * 10} 4.5v${at % 5 === 0 ? -4 : -2.5}`).join('')}`}
        fill="none"
        stroke="var(--ink)"
        strokeWidth={0.2}
      />
    </svg>
  )
}

/** Every label of a line at its true size in print, each with its number and name, fibre and care. */
export function LabelProof({
  labels,
  setting,
  fibre,
  care,
}: {
  labels: readonly LabelView[]
  setting: LabelSetting
  fibre: string
  care: string
}) {
  const widest = Math.max(...labels.map(({ set }) => widthOf(setting, set)))
  return (
    <div className={cn(widest > UPRIGHT && 'print-across')}>
      <div className="mb-6 max-w-measure space-y-1">
        <Ruler />
        <p className="text-sm text-ink-soft">
          100 mm when the sheet is printed at its size: choose 100 % and no fitting to the page.
        </p>
      </div>
      <ul role="list" className="flex flex-wrap items-start gap-x-[4mm] gap-y-[5mm]">
        {labels.map(({ ideaId, number, set }) => (
          <li key={ideaId} className="max-w-full">
            <LabelPicture
              set={set}
              setting={setting}
              number={number}
              fibre={fibre}
              care={care}
              measured={false}
              className="overflow-visible"
            />
            {set.fits ? null : (
              <p>
                <Status kind="attention">
                  {fitInWords(set)}
                  {widthOf(setting, set) > ACROSS ? '; drawn smaller than it is' : ''}
                </Status>
              </p>
            )}
          </li>
        ))}
      </ul>
      <p className="mt-[10mm] hidden break-inside-avoid gap-[4mm] print:flex">
        <span className="grow border-t border-rule pt-1 text-sm">Checked by</span>
        <span className="w-[45mm] border-t border-rule pt-1 text-sm">Date</span>
      </p>
    </div>
  )
}
