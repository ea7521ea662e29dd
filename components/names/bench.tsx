'use client'

import dynamic from 'next/dynamic'
import { useRef, useState, type FormEvent } from 'react'

import { SheetSection } from '@/components/layout/sheet-header'
import { reach } from '@/components/reach'
import { Notice } from '@/components/ui/notice'
import { SubmitButton } from '@/components/ui/submit-button'
import { toastDone, toastProblem } from '@/components/ui/toast'
import type { IdeaView } from '@/lib/names/present'

import type { BenchActions } from './bench-actions'
import { BenchIdeas } from './bench-ideas'
import { sameWords } from './finding-words'
import type { LabelTerms } from './name-checks'
import { NameField, NO_DRAFT, type NameDraft } from './name-field'
import type { NamesPlace } from './names-place'

// They are made up after the page is there.
const BenchProposals = dynamic(() => import('./bench-proposals').then((it) => it.BenchProposals))

/** The bench of one shade: a name to write, the ideas there are, and names made up for it. */
export function NamingBench({
  place,
  shadeId,
  ideas,
  themes,
  label,
  actions,
}: {
  place: NamesPlace
  shadeId: string
  ideas: readonly IdeaView[]
  /** The line's theme words. */
  themes: readonly string[]
  label: LabelTerms
  actions: BenchActions
}) {
  const { brand, lineSlug } = place
  const [draft, setDraft] = useState<NameDraft>(NO_DRAFT)
  const [problem, setProblem] = useState<{ message: string; fields?: Record<string, string[]> }>()
  const [pending, setPending] = useState(false)
  const field = useRef<HTMLInputElement>(null)
  // Of each name one key until it is written down: pressed twice, it is one idea.
  const keys = useRef(new Map<string, string>())
  const alike = ideas.find(({ text }) => sameWords(text, draft.text))

  async function add(text: string, note: string) {
    const key = keys.current.get(text) ?? crypto.randomUUID()
    keys.current.set(text, key)
    const answer = await reach(
      actions.add(brand, { lineSlug, shadeId, text, note, requestKey: key }),
    )
    if (answer.ok) {
      keys.current.delete(text)
      toastDone(`“${text}” is written down.`)
    }
    return answer
  }

  async function write(event: FormEvent) {
    event.preventDefault()
    if (pending) return
    setPending(true)
    setProblem(undefined)
    const answer = await add(draft.text, draft.note)
    setPending(false)
    if (answer.ok) setDraft(NO_DRAFT)
    else setProblem({ message: answer.message, fields: answer.fieldErrors })
    field.current?.focus()
  }

  async function take(text: string, note: string) {
    const answer = await add(text, note)
    if (!answer.ok) toastProblem(answer.message)
    return answer.ok
  }

  function tryOut(text: string, note: string) {
    setDraft({ ...NO_DRAFT, text, note })
    field.current?.focus()
  }

  return (
    <>
      <SheetSection title="Write a name">
        <form noValidate onSubmit={(event) => void write(event)}>
          <NameField
            place={place}
            shadeId={shadeId}
            draft={draft}
            onChange={(change) => setDraft((before) => ({ ...before, ...change }))}
            errors={problem?.fields}
            check={actions.check}
            label={label}
            inputRef={field}
          />
          {alike ? (
            <Notice className="mt-4">
              “{alike.text}” stands among this shade’s ideas already.
            </Notice>
          ) : null}
          {problem ? (
            <Notice kind="error" className="mt-4">
              {problem.message}
            </Notice>
          ) : null}
          <SubmitButton
            className="mt-4"
            pending={pending}
            pendingLabel="Writing idea down…"
            disabled={draft.text.trim() === ''}
          >
            Write idea down
          </SubmitButton>
        </form>
      </SheetSection>
      <BenchIdeas place={place} shadeId={shadeId} ideas={ideas} label={label} actions={actions} />
      <BenchProposals
        place={place}
        shadeId={shadeId}
        ideas={ideas}
        themes={themes}
        propose={actions.propose}
        take={take}
        tryOut={tryOut}
      />
    </>
  )
}
