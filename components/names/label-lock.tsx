'use client'

import { Lock, LockOpen } from 'lucide-react'
import { useRouter } from 'next/navigation'

import { dayInWords } from '@/components/date-words'
import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { ConfirmDialog } from '@/components/ui/confirm-dialog'
import { Status } from '@/components/ui/status'
import { toastDone, toastProblem } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'
import type { NamingSettingsView } from '@/lib/names/present'

import { LabelReasonDialog } from './label-reason-dialog'
import { lockInWords, namesInWords } from './label-words'
import type { NamesPlace } from './names-place'

/** What locks all names of a line, and what opens them again. */
export interface LockActions {
  freeze: (
    brand: string,
    input: { lineSlug: string; version: number },
  ) => Promise<ActionResult<unknown>>
  lift: (
    brand: string,
    input: { lineSlug: string; version: number; reason: string },
  ) => Promise<ActionResult<unknown>>
}

/** Whether the approved names of a line are locked; an owner locks them here, or lifts the lock. */
export function LabelLock({
  place: { brand, lineSlug },
  settings,
  lockedSince,
  approved,
  unlocked,
  actions,
}: {
  place: NamesPlace
  settings: NamingSettingsView
  lockedSince: string | null
  /** How many names are approved, and how many of them were unlocked alone. */
  approved: number
  unlocked: number
  /** Null for whoever may neither lock nor lift. */
  actions: LockActions | null
}) {
  const router = useRouter()
  const { frozen, printOn, version } = settings

  async function freeze(actions: LockActions) {
    const answer = await reach(actions.freeze(brand, { lineSlug, version }))
    if (!answer.ok) {
      toastProblem(answer.message)
      router.refresh()
      return false
    }
    toastDone('The approved names are locked.')
    return true
  }

  return (
    <div className="flex flex-wrap items-start justify-between gap-x-6 gap-y-3">
      <div className="max-w-measure space-y-1">
        <Status kind={frozen ? 'locked' : 'none'}>{lockInWords(settings, lockedSince)}</Status>
        <p className="text-ink-soft">
          {frozen
            ? `No approved name can be opened again or replaced. ${
                unlocked > 0 ? `${namesInWords(unlocked)} unlocked meanwhile can.` : ''
              } Shades without a name can still get one.`
            : printOn
              ? `From ${dayInWords(printOn)} on, approved names cannot be opened again or replaced.`
              : 'Once the label printer has a date, approved names lock on that day by themselves.'}
        </p>
      </div>
      {actions && !frozen ? (
        <ConfirmDialog
          title="Lock the approved names now?"
          lost={
            <p>
              {approved === 0
                ? 'No name is approved yet; what is approved from now on is locked at once.'
                : `${namesInWords(approved)} can then be neither opened again nor replaced, and what is approved later is locked at once.`}
            </p>
          }
          kept={
            <p>
              Drafts and reviews go on. You can unlock one name, or lift the lock, with a reason.
            </p>
          }
          confirmLabel="Lock names"
          cancelLabel="Leave them open"
          danger={false}
          onConfirm={() => freeze(actions)}
          trigger={<Button icon={<Lock aria-hidden="true" />}>Lock names now</Button>}
        />
      ) : null}
      {actions && frozen ? (
        <LabelReasonDialog
          title="Lift the lock on all names?"
          description="All approved names can then be opened again or replaced, and the print date is taken away: set a new one when you have it. Tell the label printer."
          confirmLabel="Lift the lock"
          pendingLabel="Lifting the lock…"
          done="The lock is lifted, and the print date taken away."
          confirm={(reason) => actions.lift(brand, { lineSlug, version, reason })}
          trigger={<Button icon={<LockOpen aria-hidden="true" />}>Lift the lock…</Button>}
        />
      ) : null}
    </div>
  )
}
