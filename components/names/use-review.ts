import { useRouter } from 'next/navigation'
import { useEffect, useRef, useState, useTransition, type RefObject } from 'react'

import { reach } from '@/components/reach'
import { VOTE_WORDS, type NameVoteKind, type StateMove } from '@/lib/names/constants'
import type { ReviewItem, ReviewPage } from '@/lib/names/present'

import type { MoveActions, TalkActions } from './idea-actions'
import { MOVE_DONE } from './move-words'
import { namesHref, type NamesPlace } from './names-place'

/** A decision that the review makes. */
export type ReviewMove = Extract<StateMove, 'approve' | 'return' | 'put-by' | 'recall'>

/** The last decision of this sitting. */
export interface Done {
  move: ReviewMove | 'reopen' | 'take-up'
  ideaId: string
  text: string
  shade: string
  version: number
}

/** Nobody has read a name in less, milliseconds: a press that comes sooner was meant for the last. */
const READ_IN = 400

/** What a decision that is taken back at once gives as its reason. */
const UNDO_REASON = 'Approved by mistake, and taken back at once.'

/** How many names of each decision this sitting has made. */
export type Sitting = Partial<Record<ReviewMove, number>>

/** "12 names are left." */
export function leftInWords(left: number): string {
  if (left === 0) return 'No name is left.'
  return left === 1 ? '1 name is left.' : `${left} names are left.`
}

/** A name for its shade, as it is spoken of: “Thyme Will Tell” for No. 14. */
const told = (text: string, number: string) => `“${text}” for No. ${number}`

/** Walks through the names in review, one at a time, and decides on them. */
export function useReview(
  place: NamesPlace,
  review: ReviewPage,
  actions: MoveActions & TalkActions,
  firstId: string | null,
  /** The heading of what is shown, and all of the review: where the focus goes. */
  heading: RefObject<HTMLHeadingElement | null>,
  region: RefObject<HTMLElement | null>,
) {
  const { brand, lineSlug } = place
  const { items } = review
  const router = useRouter()
  const [isTurning, turn] = useTransition()
  const [at, setAt] = useState<{ id: string | null; index: number }>(() => {
    const first = items.find(({ idea }) => idea.id === firstId) ?? items[0]
    return { id: first?.idea.id ?? null, index: first ? items.indexOf(first) : 0 }
  })
  const [asked, setAsked] = useState<string | null>(null)
  const [asking, setAsking] = useState(false)
  const [pending, setPending] = useState<ReviewMove | NameVoteKind | 'undo' | null>(null)
  const [done, setDone] = useState<Done | null>(null)
  const [sitting, setSitting] = useState<Sitting>({})
  const [said, setSaid] = useState('')
  const [problem, setProblem] = useState<string | null>(null)
  const [comments, setComments] = useState<Record<string, string>>({})
  const focusWanted = useRef(false)
  const shownAt = useRef(-READ_IN)

  const found = items.findIndex(({ idea }) => idea.id === at.id)
  const isEnd = items.length === 0 || at.id === null
  const index = isEnd ? items.length : found >= 0 ? found : Math.min(at.index, items.length - 1)
  const item: ReviewItem | undefined = items[index]
  // Of one that somebody else has decided on, what followed it stands in its place.
  const isMissing = !isEnd && found < 0
  const isGone = isMissing && asked === at.id && !isTurning && pending === null

  // It may stand on another stretch; asked for once, it does or it is in review no more.
  useEffect(() => {
    if (!isMissing || asked === at.id || pending !== null) return
    turn(() => {
      setAsked(at.id)
      router.replace(namesHref(place, `/review?idea=${at.id}`) as never)
    })
  })

  // After whichever render shows it: the page may have been read anew before the answer came.
  useEffect(() => {
    if (!focusWanted.current || isTurning || (isMissing && !isGone)) return
    focusWanted.current = false
    heading.current?.focus({ preventScroll: true })
    const top = region.current?.getBoundingClientRect().top ?? 0
    if (top < 0) region.current?.scrollIntoView({ block: 'start' })
  })

  /** Shows another name, or the end. The focus goes along unless it stands on a button that stays. */
  function show(id: string | null, { keepFocus = false } = {}) {
    setAsking(false)
    setProblem(null)
    focusWanted.current = !keepFocus
    const next = items.findIndex(({ idea }) => idea.id === id)
    setAt({ id, index: next < 0 ? index : next })
    shownAt.current = performance.now()
  }

  function go(step: 1 | -1, terms?: { keepFocus?: boolean }) {
    const beyond = step === 1 ? review.after : review.before
    const id = items[index + step]?.idea.id ?? beyond
    if (step === -1 && id === null) {
      setSaid('This is the first name.')
      return
    }
    if (step === 1 && isEnd) return
    const reached = items[index + step]
    setSaid(
      reached
        ? `${told(reached.idea.text, reached.shade.number)}, name ${review.start + index + step + 1} of ${review.total}.`
        : '',
    )
    show(id, terms)
  }

  async function decide(move: ReviewMove, reason = '') {
    if (!item || pending || isTurning) return
    // A reason says enough of having read it.
    if (!reason && performance.now() - shownAt.current < READ_IN) return
    const { idea, shade } = item
    const { id: ideaId, version, text } = idea
    setPending(move)
    setProblem(null)
    const answer = await reach<{ version?: number }>(
      move === 'put-by' || move === 'recall'
        ? actions[move](brand, { lineSlug, from: idea.state, ideaIds: [ideaId] }).then((all) =>
            all.ok ? { ...all, data: {} } : all,
          )
        : actions[move](brand, { lineSlug, ideaId, version, reason }),
    )
    setPending(null)
    if (!answer.ok) {
      setProblem(answer.fieldErrors?.reason?.[0] ?? answer.message)
      if (answer.code === 'conflict' || answer.code === 'not-found') router.refresh()
      return
    }
    const next = items[index + 1]
    const left = review.total - 1
    setDone({ move, ideaId, text, shade: shade.number, version: answer.data.version ?? version })
    setSitting((before) => ({ ...before, [move]: (before[move] ?? 0) + 1 }))
    setSaid(
      [
        `${MOVE_DONE[move]} ${told(text, shade.number)}.`,
        leftInWords(left),
        next ? `Now ${told(next.idea.text, next.shade.number)}.` : '',
      ].join(' '),
    )
    show(next?.idea.id ?? review.after)
  }

  /** Whether the last decision can be taken back by the table of moves. */
  const canUndo = done?.move === 'put-by' || (done?.move === 'approve' && !review.frozen)

  async function undo() {
    if (!done || !canUndo || pending) return
    const { ideaId, version, text, shade, move } = done
    setPending('undo')
    setProblem(null)
    const reopens = move === 'approve'
    const answer = await reach<unknown>(
      reopens
        ? actions.reopen(brand, { lineSlug, ideaId, version, reason: UNDO_REASON })
        : actions['take-up'](brand, { lineSlug, ideaIds: [ideaId] }),
    )
    setPending(null)
    if (!answer.ok) {
      setProblem(answer.message)
      return
    }
    const undone = reopens ? 'reopen' : 'take-up'
    setDone({ ...done, move: undone })
    setSitting((before) => ({ ...before, [move]: (before[move as ReviewMove] ?? 1) - 1 }))
    setSaid(`${MOVE_DONE[undone]} ${told(text, shade)}.`)
    // A draft is in review no more: the name in front stays.
    if (reopens) show(ideaId)
    else heading.current?.focus({ preventScroll: true })
  }

  const own = item?.idea.votes.find(({ mine }) => mine)
  const comment = (item && comments[item.idea.id]) ?? own?.comment ?? ''

  async function vote(kind: NameVoteKind | null) {
    if (!item?.idea.canVote || pending) return
    const { id: ideaId, round } = item.idea
    setPending(kind ?? own?.vote ?? 'yes')
    setProblem(null)
    const answer = await reach(
      actions.vote(brand, { lineSlug, ideaId, round, vote: kind, comment: kind ? comment : '' }),
    )
    setPending(null)
    if (answer.ok) setSaid(kind ? `You said: ${VOTE_WORDS[kind]}.` : 'You took back what you said.')
    else {
      setProblem(answer.fieldErrors?.comment?.[0] ?? answer.message)
      if (answer.code === 'conflict') router.refresh()
    }
  }

  return {
    item,
    index,
    isEnd,
    isGone,
    isTurning,
    asking,
    ask: () => setAsking(true),
    /** Leaves the question for a reason; the focus goes back to the name. */
    leave: () => {
      setAsking(false)
      heading.current?.focus()
    },
    pending,
    problem,
    said,
    say: setSaid,
    done,
    canUndo,
    sitting,
    own,
    comment,
    setComment: (text: string) => {
      if (item) setComments((before) => ({ ...before, [item.idea.id]: text }))
    },
    go,
    show,
    decide,
    undo,
    vote,
  }
}
