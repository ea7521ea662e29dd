'use client'

import { useOptimistic, useRef, useState, useTransition } from 'react'

import { reach } from '@/components/reach'
import type { LinePlace } from '@/components/shades/shades-actions'
import { toastDone, toastProblem, toastUndo } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'
import type { FamilyWithShades } from '@/lib/families/present'
import type { FormerFamilies } from '@/lib/families/schema'

import type { EditAnswer, FamiliesActions } from './families-actions'

/** What every edit says besides what is its own. */
export interface EditBase {
  lineSlug: string
  version: number
}

/** Sends an edit, says that it is done and offers to take it back; answers the refusal, if any. */
export type SendEdit = (edit: {
  send: (base: EditBase) => Promise<ActionResult<EditAnswer>>
  /** What is said once it is done; and spoken. */
  done: string
  /** How the families look meanwhile. */
  meanwhile?: FamilyWithShades[]
  /** Says a refusal itself; otherwise it is shown above the families. */
  quiet?: boolean
}) => Promise<ActionResult<EditAnswer>>

/** The families as they are shown, and the one way to change them. */
export function useFamilies(
  place: LinePlace,
  version: number,
  saved: FamilyWithShades[],
  restore: FamiliesActions['restore'],
) {
  const { brand, lineSlug } = place
  const [families, showMeanwhile] = useOptimistic(saved)
  const [pending, startTransition] = useTransition()
  const [spoken, setSpoken] = useState('')
  const [problem, setProblem] = useState<{ version: number; words: string; overtaken: boolean }>()
  // An edit may follow before the page has come with the version of the one before.
  const answered = useRef(0)

  async function takeBack(former: FormerFamilies, after: number) {
    const answer = await reach(restore(brand, { lineSlug, version: after, former }))
    if (answer.ok) {
      answered.current = answer.data.version
      toastDone('The families are as they were.')
    } else {
      toastProblem(
        answer.code === 'conflict'
          ? 'The families were changed since, so this cannot be taken back any more.'
          : answer.message,
      )
    }
  }

  const edit: SendEdit = ({ send, done, meanwhile, quiet }) =>
    new Promise((resolve) => {
      setProblem(undefined)
      startTransition(async () => {
        if (meanwhile) showMeanwhile(meanwhile)
        const base = { lineSlug, version: Math.max(version, answered.current) }
        const answer = await reach(send(base))
        if (answer.ok) {
          const { version: next, former } = answer.data
          answered.current = next
          setSpoken(former ? done : 'Nothing had to change.')
          if (former) toastUndo(done, () => void takeBack(former, next))
          else toastDone('Nothing had to change.')
        } else if (!quiet) {
          const overtaken = answer.code === 'conflict'
          setProblem({ version, words: answer.message, overtaken })
        }
        resolve(answer)
      })
    })

  return {
    families,
    edit,
    pending,
    spoken,
    speak: setSpoken,
    // It speaks of the families as they were shown then.
    problem: problem?.version === version ? problem : undefined,
  }
}
