'use client'

import { useRouter } from 'next/navigation'
import { useRef, useState, type FormEvent } from 'react'

import { reach } from '@/components/reach'
import { Checkbox } from '@/components/ui/checkbox'
import { LedgerList } from '@/components/ui/ledger'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { SubmitButton } from '@/components/ui/submit-button'
import { WrapCard } from '@/components/yarn/wrap-card'
import { LANES, LANE_WORDS } from '@/lib/combinations/constants'
import type { ActionResult } from '@/lib/errors'
import { KIT_LIMITS } from '@/lib/kits/constants'
import type { KitCandidate } from '@/lib/kits/present'
import type { RequestKitValues } from '@/lib/kits/schema'
import { combinationsInWords } from './words'

/** The action that has a kit built. */
export type RequestKit = (
  brand: string,
  values: RequestKitValues,
) => Promise<ActionResult<{ kitId: string }>>

/** Lanes as the form shows them: what is chosen first. */
const ORDER = LANES.toReversed()

/**
 * Chooses the combinations of a kit and has it built. Those that cannot go in say why; they can be
 * ticked all the same, and the kit then lists them as left out.
 */
export function KitForm({
  brand,
  lineSlug,
  kits,
  candidates,
  ticked,
  request,
}: {
  brand: string
  lineSlug: string
  /** The address of the line's kits. */
  kits: string
  candidates: readonly KitCandidate[]
  /** Ids of the combinations ticked at first. */
  ticked: readonly string[]
  request: RequestKit
}) {
  const router = useRouter()
  const [chosen, setChosen] = useState<ReadonlySet<string>>(() => new Set(ticked))
  const [pending, setPending] = useState(false)
  const [problem, setProblem] = useState<string>()
  const [said, setSaid] = useState('')
  // One key for one kit, however often it is sent.
  const requestKey = useRef('')

  const picked = candidates.filter(({ id }) => chosen.has(id))
  const fit = picked.filter(({ reasons }) => reasons.length === 0)
  const tooMany = picked.length > KIT_LIMITS.combinations

  function tick(id: string, on: boolean) {
    requestKey.current = ''
    setSaid('')
    const next = new Set(chosen)
    if (on) next.add(id)
    else next.delete(id)
    setChosen(next)
  }

  async function send(event: FormEvent) {
    event.preventDefault()
    if (pending) return
    requestKey.current ||= crypto.randomUUID()
    setPending(true)
    setProblem(undefined)
    const answer = await reach(
      request(brand, {
        lineSlug,
        combinationIds: picked.map(({ id }) => id),
        requestKey: requestKey.current,
      }),
    )
    setPending(false)
    if (!answer.ok) {
      setProblem(answer.fieldErrors?.combinationIds?.[0] ?? answer.message)
      return
    }
    requestKey.current = ''
    setSaid('The kit is begun. It stands first in the list below.')
    router.push(kits as never, { scroll: false })
  }

  return (
    <form onSubmit={(event) => void send(event)} aria-label="Build a kit">
      {ORDER.map((lane) => {
        const inLane = candidates.filter((candidate) => candidate.lane === lane)
        if (inLane.length === 0) return null
        const open = lane === 'chosen' || inLane.some(({ id }) => ticked.includes(id))
        return (
          <details key={lane} open={open} className="mb-3">
            <summary className="min-h-8 py-1 font-title text-lg">
              {LANE_WORDS[lane]}
              <span className="ml-2 font-body text-sm text-ink-faint">{inLane.length}</span>
            </summary>
            <LedgerList>
              {inLane.map((candidate) => (
                <Candidate
                  key={candidate.id}
                  candidate={candidate}
                  drawn={lane === 'chosen' || ticked.includes(candidate.id)}
                  checked={chosen.has(candidate.id)}
                  onTick={(on) => tick(candidate.id, on)}
                />
              ))}
            </LedgerList>
          </details>
        )
      })}
      {problem ? (
        <Notice kind="error" title="The kit was not begun" className="my-4">
          <p>{problem}</p>
        </Notice>
      ) : null}
      <div className="mt-5 flex flex-wrap items-center gap-x-5 gap-y-3">
        <SubmitButton
          variant="primary"
          pending={pending}
          pendingLabel="Asking…"
          disabled={fit.length === 0 || tooMany}
        >
          Build kit
        </SubmitButton>
        <p className="text-ink-soft">
          {tooMany
            ? `A kit holds at most ${KIT_LIMITS.combinations} combinations: untick ${picked.length - KIT_LIMITS.combinations}.`
            : summary(picked.length, fit.length)}
        </p>
      </div>
      <LiveRegion visible>{said ? <p className="mt-3">{said}</p> : null}</LiveRegion>
    </form>
  )
}

function summary(picked: number, fit: number): string {
  if (picked === 0) return 'Tick the combinations that shall go in.'
  if (fit === 0) return 'None of those ticked can go in yet.'
  const left = picked - fit
  const out = left === 0 ? '' : `; ${left} ${left === 1 ? 'stays' : 'stay'} out`
  return `${combinationsInWords(fit)} ${fit === 1 ? 'goes' : 'go'} in${out}.`
}

function Candidate({
  candidate: { title, bands, reasons, note },
  drawn,
  checked,
  onTick,
}: {
  candidate: KitCandidate
  drawn: boolean
  checked: boolean
  onTick: (on: boolean) => void
}) {
  return (
    <li className="flex items-start gap-4 py-3">
      {drawn ? (
        <div aria-hidden="true" className="w-12 shrink-0">
          <WrapCard compact bands={bands} title={title} className="w-12" />
        </div>
      ) : null}
      <Checkbox
        className="min-w-0 grow"
        checked={checked}
        onChange={(event) => onTick(event.target.checked)}
        label={<span className="font-title break-words">{title}</span>}
        hint={
          reasons.length > 0 ? (
            <span className="text-ink-soft">
              <strong className="font-semibold text-ink">Stays out.</strong> {reasons.join(' ')}
            </span>
          ) : (
            note
          )
        }
      />
    </li>
  )
}
