import { Status } from '@/components/ui/status'
import type { LabelsPreview } from '@/lib/names/present'

import { LabelPicture } from './label-picture'
import { fitInWords, namesInWords } from './label-words'

/** How much larger than life the label is drawn. */
const SCALE = 2

/** The label with the widest name of the line, and which names do not fit on it. */
export function LabelPreview({
  preview: { setting, sample, total, misfits, misfitCount },
  fibre,
  care,
}: {
  preview: LabelsPreview
  fibre: string
  care: string
}) {
  return (
    <figure className="max-w-full">
      <LabelPicture
        set={sample.set}
        setting={setting}
        number={sample.number}
        fibre={fibre}
        care={care}
        scale={SCALE}
      />
      <figcaption className="mt-3 max-w-measure space-y-1">
        <p className="text-sm text-ink-faint">
          {total === 0
            ? 'At most twice its size, with the name of the line: no shade has a name yet.'
            : 'At most twice its size, with the widest name that is approved or in review.'}
        </p>
        {total === 0 ? null : misfitCount === 0 ? (
          <p>
            <Status kind="done">
              {total === 1 ? 'The one name fits' : `All ${total} names fit`}
            </Status>
          </p>
        ) : (
          <>
            <p>
              <Status kind="attention">
                {misfitCount} of {namesInWords(total)} {misfitCount === 1 ? 'does' : 'do'} not fit
              </Status>
            </p>
            <ul role="list" className="text-sm">
              {misfits.map(({ number, name, set }) => (
                <li key={`${number} ${name}`}>
                  {name}{' '}
                  <span className="text-ink-soft">
                    (No. {number}): {fitInWords(set)}
                  </span>
                </li>
              ))}
              {misfitCount > misfits.length ? (
                <li className="text-ink-soft">and {misfitCount - misfits.length} more</li>
              ) : null}
            </ul>
          </>
        )}
      </figcaption>
    </figure>
  )
}
