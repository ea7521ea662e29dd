'use client'

import dynamic from 'next/dynamic'
import { useRouter } from 'next/navigation'
import { useRef, useState } from 'react'

import { reach } from '@/components/reach'
import { EditableCell } from '@/components/ui/editable-cell'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { LedgerList } from '@/components/ui/ledger'
import { LiveRegion } from '@/components/ui/live-region'
import { TextLink } from '@/components/ui/text-link'
import { toastDone, toastProblem, toastUndo } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'
import type { HeapIdeaView, NameableShade } from '@/lib/names/present'

import { namesInWords, whatInWords, type HeapActions } from './heap-actions'
import { IdeaState } from './idea-state'
import { namesHref, type NamesPlace } from './names-place'
import { nameOf } from './said-when'

// Comes when the first name is to be laid on a shade.
const HeapPlace = dynamic(() => import('./heap-place').then((it) => it.HeapPlace))

/** Props of {@link HeapList}. */
export interface HeapListProps {
  place: NamesPlace
  ideas: readonly HeapIdeaView[]
  /** They are the ones that were put by. */
  putBy: boolean
  actions: Pick<
    HeapActions,
    'edit' | 'place' | 'putBy' | 'takeUp' | 'remove' | 'restore' | 'nameable'
  >
}

/** Ideas of the heap, or put by: changed in place, laid on shades, put by and taken up, deleted. */
export function HeapList({ place, ideas, putBy, actions }: HeapListProps) {
  const router = useRouter()
  const [chosen, setChosen] = useState<ReadonlySet<string>>(new Set())
  const [laying, setLaying] = useState<readonly HeapIdeaView[]>()
  const [pending, setPending] = useState(false)
  const list = useRef<HTMLDivElement>(null)
  const { brand, lineSlug } = place
  const selected = ideas.filter(({ id }) => chosen.has(id))
  const idsOf = (some: readonly HeapIdeaView[]) => some.map(({ id }) => id)

  /** Waits for what takes names out of this list; the keyboard goes on at the list. */
  async function run<Data>(work: Promise<ActionResult<Data>>): Promise<Data | null> {
    setPending(true)
    const answer = await reach(work)
    setPending(false)
    if (!answer.ok) {
      toastProblem(answer.message)
      return null
    }
    setChosen(new Set())
    list.current?.focus()
    return answer.data
  }
  async function undo(work: Promise<ActionResult<unknown>>, words: string) {
    const answer = await reach(work)
    if (answer.ok) toastDone(words)
    else toastProblem(answer.message)
    router.refresh()
  }

  async function layOn(some: readonly HeapIdeaView[], shade: NameableShade): Promise<boolean> {
    const placements = some.map(({ id }) => ({ ideaId: id, shadeId: shade.id }))
    const done = await run(actions.place(brand, { lineSlug, placements }))
    if (!done) return false
    const { former } = done
    toastUndo(
      `${whatInWords(some)} now on ${shade.label}.`,
      () => void undo(actions.place(brand, { lineSlug, placements: former }), 'Back on the heap.'),
    )
    return true
  }

  async function move(
    some: readonly HeapIdeaView[],
    { to, back }: { to: 'putBy' | 'takeUp'; back: 'putBy' | 'takeUp' },
  ) {
    const done = await run(actions[to](brand, { lineSlug, ideaIds: idsOf(some) }))
    if (!done) return
    const { moved, stayed } = done
    if (stayed.length > 0)
      toastProblem(
        `${namesInWords(stayed.length)} stayed as before.`,
        stayed.map(({ text, why }) => `“${text}”: ${why}`).join(' '),
      )
    if (moved.length === 0) return
    const what = whatInWords(some.filter(({ id }) => moved.includes(id)))
    toastUndo(
      `${what} ${to === 'putBy' ? 'put by' : 'taken up again'}.`,
      () => void undo(actions[back](brand, { lineSlug, ideaIds: moved }), 'As it was before.'),
    )
  }

  async function remove(some: readonly HeapIdeaView[]) {
    const done = await run(actions.remove(brand, { lineSlug, ideaIds: idsOf(some) }))
    if (!done) return
    toastUndo(
      `${whatInWords(some)} deleted.`,
      () =>
        void undo(
          actions.restore(brand, { lineSlug, ideaIds: done.ideaIds }),
          `${whatInWords(some)} back.`,
        ),
    )
  }

  const toggle = (id: string, on: boolean) => {
    const next = new Set(chosen)
    if (on) next.add(id)
    else next.delete(id)
    setChosen(next)
  }

  return (
    <>
      {laying ? (
        <HeapPlace
          place={place}
          what={whatInWords(laying)}
          actions={actions}
          onChoose={(shade) => layOn(laying, shade)}
          onClose={() => setLaying(undefined)}
        />
      ) : null}
      <Checkbox
        label={`Choose all ${ideas.length} on this page`}
        checked={selected.length === ideas.length}
        onChange={({ target }) =>
          setChosen(new Set(target.checked ? ideas.map(({ id }) => id) : []))
        }
        className="mb-2 text-ink-soft"
      />
      <div ref={list} tabIndex={-1} className="outline-none">
        <LedgerList aria-label={putBy ? 'Names put by' : 'Names in the heap'}>
          {ideas.map((idea) => (
            <li key={idea.id} className="flex flex-wrap items-start gap-x-3 gap-y-1 py-2.5">
              <Checkbox
                hideLabel
                label={`Choose ${idea.text}`}
                checked={chosen.has(idea.id)}
                onChange={({ target }) => toggle(idea.id, target.checked)}
              />
              <div className="min-w-0 grow basis-52">
                {idea.canEdit ? (
                  <EditableCell
                    label={idea.text}
                    value={idea.text}
                    className="font-title text-lg"
                    onSave={(text) =>
                      reach(
                        actions.edit(brand, {
                          lineSlug,
                          ideaId: idea.id,
                          version: idea.version,
                          text,
                        }),
                      )
                    }
                  >
                    {idea.text}
                  </EditableCell>
                ) : (
                  <p className="font-title text-lg break-words">{idea.text}</p>
                )}
                {idea.note ? (
                  <p className="max-w-measure break-words whitespace-pre-line text-ink-soft">
                    {idea.note}
                  </p>
                ) : null}
                <p className="flex flex-wrap items-center gap-x-3 gap-y-1 text-sm text-ink-faint">
                  <IdeaState state={idea.state} />
                  <span>{nameOf(idea.author)}</span>
                  {putBy ? (
                    <span>{idea.shade ? `for ${idea.shade.label}` : 'on no shade'}</span>
                  ) : (
                    <span>
                      {idea.hints.length > 0
                        ? `Colour: ${idea.hints.join(', ')}`
                        : 'No colour comes to mind'}
                    </span>
                  )}
                  <TextLink
                    href={namesHref(place, `/ideas/${idea.id}`)}
                    prefetch={false}
                    className="flex min-h-6 items-center pointer-coarse:min-h-11"
                  >
                    Open<span className="sr-only"> {idea.text}</span>
                  </TextLink>
                </p>
              </div>
              {putBy ? (
                idea.moves.includes('take-up') && (
                  <Button
                    size="small"
                    className="max-sm:ml-7"
                    aria-label={`Take up ${idea.text} again`}
                    onClick={() => void move([idea], { to: 'takeUp', back: 'putBy' })}
                  >
                    Take up again
                  </Button>
                )
              ) : (
                <Button
                  size="small"
                  className="max-sm:ml-7"
                  aria-label={`Lay ${idea.text} on a shade`}
                  onClick={() => setLaying([idea])}
                >
                  Lay on a shade
                </Button>
              )}
            </li>
          ))}
        </LedgerList>
      </div>
      <LiveRegion>
        {selected.length > 0 ? `${namesInWords(selected.length)} chosen.` : ''}
      </LiveRegion>
      {selected.length > 0 ? (
        <section
          aria-label="Chosen names"
          className="z-10 mt-4 flex flex-wrap items-center gap-x-4 gap-y-3 border-y border-rule bg-paper py-3 md:sticky md:bottom-0 print:hidden"
        >
          <p className="font-medium">{namesInWords(selected.length)} chosen</p>
          {putBy ? (
            <Button
              pending={pending}
              onClick={() => void move(selected, { to: 'takeUp', back: 'putBy' })}
            >
              Take up again
            </Button>
          ) : (
            <>
              <Button onClick={() => setLaying(selected)}>Lay on a shade</Button>
              <Button
                pending={pending}
                onClick={() => void move(selected, { to: 'putBy', back: 'takeUp' })}
              >
                Put by
              </Button>
            </>
          )}
          <Button variant="danger" pending={pending} onClick={() => void remove(selected)}>
            Delete names
          </Button>
          <Button variant="quiet" onClick={() => setChosen(new Set())}>
            Choose none
          </Button>
        </section>
      ) : null}
    </>
  )
}
