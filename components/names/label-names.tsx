'use client'

import { LockOpen } from 'lucide-react'

import { AppLink } from '@/components/ui/app-link'
import { Button } from '@/components/ui/button'
import { Ledger } from '@/components/ui/ledger'
import { Status } from '@/components/ui/status'
import type { ActionResult } from '@/lib/errors'
import type { SetName } from '@/lib/naming/label'
import type { LabelView } from '@/lib/names/present'

import { LabelReasonDialog } from './label-reason-dialog'
import { fitInWords } from './label-words'
import { namesHref, type NamesPlace } from './names-place'

/** The action that unlocks one name. */
export type UnlockAction = (
  brand: string,
  input: { lineSlug: string; ideaId: string; version: number; reason: string },
) => Promise<ActionResult<unknown>>

/** Approved names as they are set, whether they fit, and which of them are locked. */
export function LabelNames({
  place,
  labels,
  frozen,
  unlock,
}: {
  place: NamesPlace
  labels: readonly LabelView[]
  frozen: boolean
  unlock: UnlockAction
}) {
  const { brand, lineSlug } = place
  return (
    <Ledger caption="Names on the labels">
      <thead>
        <tr>
          <th scope="col">Shade</th>
          <th scope="col">Name as it is set</th>
          <th scope="col" className="max-sm:hidden">
            On the label
          </th>
          {frozen ? <th scope="col">Lock</th> : null}
        </tr>
      </thead>
      <tbody>
        {labels.map(({ shadeId, ideaId, version, number, name, set, ...label }) => (
          <tr key={ideaId}>
            <th scope="row" className="whitespace-nowrap">
              <AppLink
                href={namesHref(place, `/shades/${shadeId}`)}
                className="inline-flex min-h-8 items-center hover:underline pointer-coarse:min-h-11"
              >
                No. {number}
              </AppLink>
            </th>
            <td>
              {set.lines.map(({ text }, at) => (
                <span key={at} className="block font-title">
                  {text}
                </span>
              ))}
              <Fit set={set} className="sm:hidden" />
            </td>
            <td className="max-sm:hidden">
              <Fit set={set} className="flex" />
            </td>
            {frozen ? (
              <td>
                <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1">
                  <Status kind={label.locked ? 'locked' : 'none'}>
                    {label.locked ? 'Locked' : 'Unlocked'}
                  </Status>
                  {label.canUnlock ? (
                    <LabelReasonDialog
                      title={`Unlock “${name}”?`}
                      description="This name alone can then be opened again or replaced. The label printer may have it already: tell them."
                      confirmLabel="Unlock name"
                      pendingLabel="Unlocking name…"
                      done={`“${name}” is unlocked.`}
                      confirm={(reason) => unlock(brand, { lineSlug, ideaId, version, reason })}
                      trigger={
                        <Button
                          size="small"
                          className="print:hidden"
                          icon={<LockOpen aria-hidden="true" />}
                          aria-label={`Unlock ${name}…`}
                        >
                          Unlock…
                        </Button>
                      }
                    />
                  ) : null}
                </div>
              </td>
            ) : null}
          </tr>
        ))}
      </tbody>
    </Ledger>
  )
}

function Fit({ set, className }: { set: SetName; className: string }) {
  return (
    <Status kind={set.fits ? 'done' : 'attention'} className={className}>
      {fitInWords(set)}
    </Status>
  )
}
