import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { Facts } from '@/components/ui/ledger'
import type { LabelSetting, SetName } from '@/lib/naming/label'

import { inShort } from './finding-words'
import { Findings } from './findings'
import { LabelPicture } from './label-picture'
import type { NameCheck } from './use-name-check'

/** What a name is checked and drawn with. */
export interface LabelTerms {
  setting: LabelSetting
  number: string
  fibre: string
  care: string
}

const NO_NAME: SetName = { lines: [], fits: true, over: 0, missing: [] }

/**
 * A name as the checks see it: on its ball band, how it is heard, what saying it plays on, and what
 * they found. While the next answer is waited for the last one stays.
 */
export function NameChecks({
  check: { checked, pending, problem },
  label,
}: {
  check: NameCheck
  label: LabelTerms
}) {
  return (
    <div className="grid gap-x-8 gap-y-5 lg:grid-cols-[minmax(0,1fr)_minmax(0,20rem)]">
      <div className="min-w-0 lg:order-2">
        <LabelPicture set={checked?.label ?? NO_NAME} scale={1.25} {...label} />
        {checked ? (
          <Facts
            className="mt-2"
            items={[
              {
                term: 'Heard as',
                reading: checked.heardAs
                  ? `${checked.heardAs}${checked.isGuess ? ' (partly guessed)' : ''}`
                  : 'nothing that can be said',
              },
              {
                term: 'Plays on',
                reading: checked.playsOn ? (
                  <>
                    “{checked.playsOn.source}”: {checked.playsOn.to} for {checked.playsOn.from}
                  </>
                ) : (
                  'no saying we know'
                ),
              },
            ]}
          />
        ) : null}
      </div>
      <div className="min-w-0" aria-busy={pending}>
        <LiveRegion>
          {checked && !pending ? `${inShort(checked.findings)}. Heard as ${checked.heardAs}.` : ''}
        </LiveRegion>
        {problem ? (
          <Notice kind="warning">{problem}</Notice>
        ) : checked ? (
          <Findings findings={checked.findings} />
        ) : (
          <p className="text-ink-faint">
            {pending
              ? 'Checking the name…'
              : 'The checks run while you type: names that are the same, sound alike, suggest another colour or a fibre, wording, and whether the ball band has room.'}
          </p>
        )}
      </div>
    </div>
  )
}
