'use client'

import { useRouter } from 'next/navigation'
import { useEffect, useRef, useState, type FormEvent } from 'react'

import { SheetSection } from '@/components/layout/sheet-header'
import { reach } from '@/components/reach'
import { AppLink } from '@/components/ui/app-link'
import { Button } from '@/components/ui/button'
import { LedgerList } from '@/components/ui/ledger'
import { LinkButton } from '@/components/ui/link-button'
import { Notice } from '@/components/ui/notice'
import { SubmitButton } from '@/components/ui/submit-button'
import { toastDone, toastProblem, toastUndo } from '@/components/ui/toast'
import type { IdeaView } from '@/lib/names/present'

import type { BenchActions, MoveIdeas } from './bench-actions'
import { inShort } from './finding-words'
import { IdeaState } from './idea-state'
import type { LabelTerms } from './name-checks'
import { NameField, type NameDraft } from './name-field'
import { namesHref, type NamesPlace } from './names-place'

interface IdeasProps {
  place: NamesPlace
  shadeId: string
  label: LabelTerms
  actions: BenchActions
}

/** The ideas there are for a shade, each with what may be done with it now. */
export function BenchIdeas({ ideas, ...rest }: IdeasProps & { ideas: readonly IdeaView[] }) {
  const [editing, setEditing] = useState<string | null>(null)
  const list = useRef<HTMLDivElement>(null)
  const acted = useRef(false)
  // A button that its own press takes away would leave the keyboard nowhere.
  useEffect(() => {
    if (acted.current && document.activeElement === document.body) list.current?.focus()
    acted.current = false
  }, [ideas])
  const put = ideas.filter(({ state }) => state === 'put-by')
  const open = ideas.filter(({ state }) => state !== 'put-by')
  const row = (idea: IdeaView) => (
    <Idea
      key={idea.id}
      idea={idea}
      edits={editing === idea.id && idea.canEdit}
      onEdit={(edits) => setEditing(edits ? idea.id : null)}
      onActed={() => {
        acted.current = true
      }}
      {...rest}
    />
  )
  return (
    <SheetSection
      title="Ideas for this shade"
      aside={ideas.length > 0 ? `${ideas.length} ${ideas.length === 1 ? 'idea' : 'ideas'}` : null}
    >
      <div ref={list} tabIndex={-1} className="outline-none">
        {open.length > 0 ? (
          <LedgerList className="border-t-0">{open.map(row)}</LedgerList>
        ) : (
          <p className="max-w-measure text-ink-soft">
            {put.length > 0
              ? 'Every idea for this shade is put by.'
              : 'None yet. Write the first above, or take one of those made up below.'}
          </p>
        )}
        {put.length > 0 ? (
          <details className="mt-3">
            <summary className="min-h-8 py-1 text-ink-soft hover:text-ink">
              Put by ({put.length})
            </summary>
            <LedgerList>{put.map(row)}</LedgerList>
          </details>
        ) : null}
      </div>
    </SheetSection>
  )
}

function Idea({
  place,
  shadeId,
  idea,
  label,
  actions,
  edits,
  onEdit,
  onActed,
}: IdeasProps & {
  idea: IdeaView
  edits: boolean
  onEdit: (edits: boolean) => void
  onActed: () => void
}) {
  const { brand, lineSlug } = place
  const router = useRouter()
  const [pending, setPending] = useState<string | null>(null)
  const editButton = useRef<HTMLButtonElement>(null)
  const edited = useRef(false)
  useEffect(() => {
    const left = edited.current && !edits
    edited.current = edits
    if (left && document.activeElement === document.body) editButton.current?.focus()
  }, [edits])
  const ideaIds = [idea.id]

  async function move(what: string, act: MoveIdeas, said: string) {
    setPending(what)
    onActed()
    const answer = await reach(act(brand, { lineSlug, ideaIds }))
    setPending(null)
    if (answer.ok) return toastDone(said)
    toastProblem(answer.message)
    if (answer.code === 'conflict') router.refresh()
  }

  async function remove() {
    setPending('delete')
    onActed()
    const answer = await reach(actions.remove(brand, { lineSlug, ideaIds }))
    setPending(null)
    if (!answer.ok) return toastProblem(answer.message)
    toastUndo(`“${idea.text}” deleted.`, () => void bringBack())
  }

  async function bringBack() {
    const answer = await reach(actions.restore(brand, { lineSlug, ideaIds }))
    if (answer.ok) toastDone(`“${idea.text}” is back.`)
    else toastProblem(answer.message)
  }

  const told = [
    idea.author ? `by ${idea.isOwn ? 'you' : idea.author.name}` : null,
    idea.findings ? inShort(idea.findings) : null,
    votesInWords(idea),
  ].filter(Boolean)
  const decides = idea.moves.includes('approve') || idea.moves.includes('return')
  // The name says which of many buttons it is to whoever only hears them.
  const button = (what: string, words: string, onClick: () => void) => (
    <Button
      size="small"
      pending={pending === what}
      aria-label={`${words}: ${idea.text}`}
      onClick={onClick}
    >
      {words}
    </Button>
  )

  return (
    <li className="py-3" aria-label={idea.text}>
      <div className="flex flex-wrap items-start justify-between gap-x-6 gap-y-2">
        <div className="min-w-0 grow basis-60">
          <AppLink
            href={namesHref(place, `/ideas/${idea.id}`)}
            className="font-title text-lg break-words text-ink hover:underline"
          >
            {idea.text}
          </AppLink>
          <div className="flex flex-wrap items-center gap-x-3 text-sm text-ink-faint">
            <IdeaState state={idea.state} locked={idea.locked} />
            {told.length > 0 ? <span>{told.join(' · ')}</span> : null}
          </div>
          {idea.note && !edits ? (
            <p className="mt-1 max-w-measure whitespace-pre-line text-ink-soft">{idea.note}</p>
          ) : null}
        </div>
        {edits ? null : (
          <div className="flex flex-wrap gap-2 print:hidden">
            {decides ? (
              <LinkButton size="small" href={namesHref(place, `/review?idea=${idea.id}`)}>
                Review name
              </LinkButton>
            ) : null}
            {idea.moves.includes('send')
              ? button(
                  'send',
                  'Send for review',
                  () => void move('send', actions.send, `“${idea.text}” is in review.`),
                )
              : null}
            {idea.moves.includes('recall')
              ? button(
                  'recall',
                  'Take back',
                  () => void move('recall', actions.recall, `“${idea.text}” is a draft again.`),
                )
              : null}
            {idea.moves.includes('take-up')
              ? button(
                  'take-up',
                  'Take up again',
                  () => void move('take-up', actions.takeUp, `“${idea.text}” is a draft again.`),
                )
              : null}
            {idea.canEdit ? (
              <Button
                ref={editButton}
                size="small"
                aria-label={`Change words: ${idea.text}`}
                onClick={() => onEdit(true)}
              >
                Change words
              </Button>
            ) : null}
            {idea.moves.includes('put-by')
              ? button(
                  'put-by',
                  'Put by',
                  () => void move('put-by', actions.putBy, `“${idea.text}” is put by.`),
                )
              : null}
            {idea.canDelete ? button('delete', 'Delete', () => void remove()) : null}
          </div>
        )}
      </div>
      {edits ? (
        <EditIdea
          key={idea.version}
          place={place}
          shadeId={shadeId}
          idea={idea}
          label={label}
          actions={actions}
          onDone={() => onEdit(false)}
        />
      ) : null}
    </li>
  )
}

/** "2 yes, 1 not sure" of this round; null before anybody said anything. */
function votesInWords({ votes }: IdeaView): string | null {
  const of = (kind: string) => votes.filter(({ vote }) => vote === kind).length
  const parts = [
    [of('yes'), 'yes'],
    [of('unsure'), 'not sure'],
    [of('no'), 'no'],
  ].flatMap(([many, words]) => (many ? `${many} ${words}` : []))
  return parts.join(', ') || null
}

function EditIdea({
  place,
  shadeId,
  idea,
  label,
  actions,
  onDone,
}: IdeasProps & { idea: IdeaView; onDone: () => void }) {
  const { brand, lineSlug } = place
  const router = useRouter()
  const [draft, setDraft] = useState<NameDraft>({
    text: idea.text,
    note: idea.note,
    wordingReason: idea.wordingReason,
  })
  const [problem, setProblem] = useState<{ message: string; fields?: Record<string, string[]> }>()
  const [pending, setPending] = useState(false)
  const input = useRef<HTMLInputElement>(null)
  useEffect(() => input.current?.focus(), [])

  async function save(event: FormEvent) {
    event.preventDefault()
    if (pending) return
    setPending(true)
    setProblem(undefined)
    const { id: ideaId, version } = idea
    const answer = await reach(actions.edit(brand, { lineSlug, ideaId, version, ...draft }))
    setPending(false)
    if (answer.ok) {
      toastDone(`“${answer.data.text}” saved.`)
      return onDone()
    }
    if (answer.code === 'conflict') router.refresh()
    setProblem({ message: answer.message, fields: answer.fieldErrors })
  }

  return (
    <form noValidate className="mt-3 mb-2" onSubmit={(event) => void save(event)}>
      <NameField
        place={place}
        shadeId={shadeId}
        ideaId={idea.id}
        draft={draft}
        onChange={(change) => setDraft((before) => ({ ...before, ...change }))}
        errors={problem?.fields}
        check={actions.check}
        label={label}
        reasons
        inputRef={input}
      />
      {problem ? (
        <Notice kind="error" className="mt-4">
          {problem.message}
        </Notice>
      ) : null}
      <div className="mt-4 flex flex-wrap gap-3">
        <SubmitButton pending={pending} pendingLabel="Saving words…">
          Save words
        </SubmitButton>
        <Button onClick={onDone}>Leave as it was</Button>
      </div>
    </form>
  )
}
