'use client'

import { useState } from 'react'
import useSWR from 'swr'

import { SheetSection } from '@/components/layout/sheet-header'
import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { LinkButton } from '@/components/ui/link-button'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { Skeleton } from '@/components/ui/skeleton'
import { EmptyState } from '@/components/ui/states'
import { toastProblem, toastUndo } from '@/components/ui/toast'
import { Ground } from '@/components/yarn/ground'
import { GroundSwitch } from '@/components/yarn/ground-switch'
import type { DealView } from '@/lib/names/present'

import { DealtShade, type Fate } from './deal-shade'
import { namesInWords, type HeapActions } from './heap-actions'
import { namesHref, type NamesPlace } from './names-place'

/** Props of {@link DealHeap}. */
export interface DealHeapProps {
  place: NamesPlace
  actions: Pick<HeapActions, 'deal' | 'place'>
}

const count = (many: number, noun: string) => `${many} ${noun}${many === 1 ? '' : 's'}`

/**
 * The heap as it would be dealt out, on a page of the sample book: what is proposed stays as it is
 * while it is accepted or left, until it is dealt anew.
 */
export function DealHeap({ place, actions }: DealHeapProps) {
  // What an earlier visit was shown is not this one's.
  const [visit] = useState(() => crypto.randomUUID())
  const [without, setWithout] = useState<readonly string[]>([])
  const [turn, setTurn] = useState(0)
  const [fates, setFates] = useState<ReadonlyMap<string, Fate>>(new Map())
  const [pending, setPending] = useState<'all' | string>()
  const { brand, lineSlug } = place
  const { data: answer } = useSWR(
    ['the heap dealt', visit, turn],
    () => reach(actions.deal(brand, { lineSlug, without: [...without] })),
    // Nobody's proposal changes under their hands.
    { revalidateOnFocus: false, revalidateOnReconnect: false, revalidateIfStale: false },
  )

  function settle(some: readonly string[], fate: Fate | null) {
    setFates((before) => {
      const next = new Map(before)
      for (const ideaId of some)
        if (fate) next.set(ideaId, fate)
        else next.delete(ideaId)
      return next
    })
  }

  type Placements = Parameters<HeapActions['place']>[1]['placements']
  async function lay(placements: Placements, fate: Fate | null, as: string): Promise<Placements> {
    setPending(as)
    const answer = await reach(actions.place(brand, { lineSlug, placements }))
    setPending(undefined)
    if (!answer.ok) {
      toastProblem(answer.message)
      return []
    }
    settle(
      placements.map(({ ideaId }) => ideaId),
      fate,
    )
    return answer.data.former
  }

  function dealAnew() {
    const left = [...fates].flatMap(([ideaId, fate]) => (fate === 'left' ? [ideaId] : []))
    setWithout([...without, ...left])
    setFates(new Map())
    setTurn(turn + 1)
  }

  if (!answer) {
    return (
      <div aria-busy="true">
        <LiveRegion>Dealing the heap…</LiveRegion>
        <Skeleton className="h-[32rem]" />
      </div>
    )
  }
  if (!answer.ok) {
    return (
      <Notice
        kind="error"
        title="The heap was not dealt"
        actions={<Button onClick={() => setTurn(turn + 1)}>Deal the heap</Button>}
      >
        {answer.message}
      </Notice>
    )
  }

  const view = answer.data
  const dealt = view.families.flatMap(({ shades }) =>
    shades.flatMap((shade) => (shade.dealt ? [{ shadeId: shade.id, ...shade.dealt }] : [])),
  )
  const open = dealt.filter(({ ideaId }) => !fates.has(ideaId))
  const accepted = dealt.filter(({ ideaId }) => fates.get(ideaId) === 'laid').length

  async function acceptAll() {
    const placements = open.map(({ ideaId, shadeId }) => ({ ideaId, shadeId }))
    const former = await lay(placements, 'laid', 'all')
    if (former.length === 0) return
    toastUndo(
      `${namesInWords(former.length)} laid on their shades.`,
      () => void lay(former, null, 'all'),
    )
  }

  if (dealt.length === 0) {
    return (
      <>
        <NothingDealt place={place} view={view} />
        <StayInHeap view={view} without={without.length} />
      </>
    )
  }
  return (
    <>
      <div className="mb-4 flex flex-wrap items-center justify-between gap-x-6 gap-y-3 print:hidden">
        <div className="flex flex-wrap gap-3">
          <Button
            variant="primary"
            disabled={open.length === 0}
            pending={pending === 'all'}
            pendingLabel="Laying names…"
            onClick={() => void acceptAll()}
          >
            {open.length === 0
              ? 'Nothing left to accept'
              : open.length === 1
                ? 'Accept the 1 name'
                : `Accept all ${open.length} names`}
          </Button>
          <Button disabled={fates.size === 0} onClick={dealAnew}>
            Deal anew
          </Button>
        </div>
        <GroundSwitch />
      </div>
      <p className="mb-4 max-w-measure text-ink-soft">
        {count(dealt.length, 'idea')} for {count(view.waiting, 'shade')} without a name. Nothing
        moves before you accept it; what is accepted becomes a draft on its shade.
      </p>
      <LiveRegion>
        {`${namesInWords(dealt.length)} proposed, ${accepted} accepted, ${open.length} open.`}
      </LiveRegion>
      {accepted > 0 && open.length === 0 ? (
        <Notice
          title={`${namesInWords(accepted)} on their shades, as drafts`}
          actions={<LinkButton href={namesHref(place, '?state=draft')}>Open the drafts</LinkButton>}
          className="mb-4"
        >
          Send them for review when they are as you want them.
        </Notice>
      ) : null}
      <Ground className="border border-hairline p-4 sm:p-6">
        {view.families.map(({ id: familyId, name, shades }) => (
          <section
            key={familyId}
            aria-label={name}
            className="gap-x-6 border-b border-hairline py-5 first:pt-0 last:border-b-0 last:pb-0 lg:grid lg:grid-cols-[7rem_minmax(0,1fr)]"
          >
            <div className="mb-3 lg:mb-0">
              <h2 className="text-lg">{name}</h2>
              <p className="text-sm text-ink-faint">
                {count(shades.filter((shade) => shade.dealt).length, 'name')} for{' '}
                {count(shades.filter(({ waits }) => waits).length, 'shade')}
              </p>
            </div>
            <ul
              role="list"
              className="grid grid-cols-[repeat(auto-fill,minmax(8rem,1fr))] gap-x-4 gap-y-6 sm:grid-cols-[repeat(auto-fill,minmax(8.25rem,1fr))]"
            >
              {shades.map((shade) => (
                <DealtShade
                  key={shade.id}
                  shade={shade}
                  fate={shade.dealt ? fates.get(shade.dealt.ideaId) : undefined}
                  pending={pending === shade.id}
                  onAccept={(ideaId) => void lay([{ ideaId, shadeId: shade.id }], 'laid', shade.id)}
                  onTakeBack={(ideaId) => void lay([{ ideaId, shadeId: null }], null, shade.id)}
                  onLeave={(ideaId) => settle([ideaId], 'left')}
                  onPropose={(ideaId) => settle([ideaId], null)}
                />
              ))}
            </ul>
          </section>
        ))}
      </Ground>
      <StayInHeap view={view} without={without.length} />
    </>
  )
}

/** Why there is no proposal, and what helps. */
function NothingDealt({ place, view: { ideas, waiting } }: { place: NamesPlace; view: DealView }) {
  if (waiting === 0) {
    return (
      <EmptyState
        title="No shade waits for a name"
        action={<LinkButton href={namesHref(place)}>Open the list of names</LinkButton>}
      >
        Every shade of the line has a name, or one in review.
      </EmptyState>
    )
  }
  if (ideas === 0) {
    return (
      <EmptyState
        title="There is nothing to deal"
        action={
          <LinkButton variant="primary" href={namesHref(place, '/heap/add')}>
            Add many names
          </LinkButton>
        }
      >
        {count(waiting, 'shade')} without a name, and no idea in the heap. Bring some: they are
        dealt by the colour that their words call to mind.
      </EmptyState>
    )
  }
  return (
    <EmptyState
      title="No idea suits a shade"
      action={
        <LinkButton variant="primary" href={namesHref(place, '/heap')}>
          Open the heap
        </LinkButton>
      }
    >
      None of {count(ideas, 'idea')} calls a colour to mind that is near a shade without a name. You
      can still lay each on a shade by hand.
    </EmptyState>
  )
}

const REASONS: readonly { why: DealView['left'][number]['why']; title: string; words: string }[] = [
  {
    why: 'another suits better',
    title: 'Another suits better',
    words: 'They suit a shade, but the name proposed for it suits it more.',
  },
  {
    why: 'no shade near',
    title: 'No shade is near',
    words: 'The colour they call to mind is far from every shade without a name.',
  },
  {
    why: 'no colour',
    title: 'No colour comes to mind',
    words: 'No word in them speaks of a colour. Lay them on a shade by hand.',
  },
]

/** The ideas that stay in the heap, and why. */
function StayInHeap({
  view: { left, beyond },
  without,
}: {
  view: DealView
  /** Ideas the reader left where they are before it was dealt anew. */
  without: number
}) {
  const groups = REASONS.map((reason) => ({
    ...reason,
    ideas: left.filter(({ why }) => why === reason.why),
  })).filter(({ ideas }) => ideas.length > 0)
  const more = beyond.ideas + beyond.shades > 0
  if (groups.length === 0 && without === 0 && !more) return null
  return (
    <SheetSection title="Stay in the heap" aside={namesInWords(left.length + without)}>
      <div className="space-y-5">
        {groups.map(({ why, title, words, ideas }) => (
          <section key={why} aria-label={title}>
            <h3 className="font-semibold">
              {title} <span className="font-normal text-ink-faint">{ideas.length}</span>
            </h3>
            <p className="text-sm text-ink-soft">{words}</p>
            <ul role="list" className="mt-1 flex flex-wrap gap-x-5 gap-y-1 font-title">
              {ideas.map(({ ideaId, text }) => (
                <li key={ideaId}>{text}</li>
              ))}
            </ul>
          </section>
        ))}
        {without > 0 ? (
          <p className="text-ink-soft">
            {namesInWords(without)} you left there {without === 1 ? 'was' : 'were'} not dealt again.
          </p>
        ) : null}
        {more ? (
          <p className="text-ink-soft">
            More than is dealt at once: {count(beyond.ideas, 'idea')} and{' '}
            {count(beyond.shades, 'shade')} wait until these are done.
          </p>
        ) : null}
      </div>
    </SheetSection>
  )
}
