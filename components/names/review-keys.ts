import { useEffect, useEffectEvent, useSyncExternalStore, type RefObject } from 'react'

import type { NameVoteKind } from '@/lib/names/constants'

/** What a single key can do in the review. */
export type ReviewDeed =
  NameVoteKind | 'approve' | 'return' | 'put-by' | 'comment' | 'talk' | 'undo' | 'next' | 'previous'

/** The keys of what a reviewer says. */
export const VOTE_KEYS: Record<NameVoteKind, string> = { yes: 'y', unsure: 's', no: 'n' }

/** All keys, in the order they are explained. */
export const REVIEW_KEYS: readonly { key: string; deed: ReviewDeed; words: string }[] = [
  { key: 'ArrowRight', deed: 'next', words: 'Go to the next name' },
  { key: 'ArrowLeft', deed: 'previous', words: 'Go back to the one before' },
  { key: VOTE_KEYS.yes, deed: 'yes', words: 'Say yes' },
  { key: VOTE_KEYS.unsure, deed: 'unsure', words: 'Say that you are not sure' },
  { key: VOTE_KEYS.no, deed: 'no', words: 'Say no' },
  { key: 'c', deed: 'comment', words: 'Write why' },
  { key: 'a', deed: 'approve', words: 'Approve the name' },
  { key: 'r', deed: 'return', words: 'Return the name, with a reason' },
  { key: 'p', deed: 'put-by', words: 'Put the name by' },
  { key: 'z', deed: 'undo', words: 'Undo the last decision' },
  { key: 't', deed: 'talk', words: 'Write a remark' },
]

const TEXT_FIELD = 'input, textarea, select, [contenteditable]'

/**
 * What a pressed key asks for; null for a key held down, with a modifier, in a field, or spoken
 * into something else than the page or the review.
 */
export function deedOf(event: KeyboardEvent, region: Element | null): ReviewDeed | null {
  const { key, target, ctrlKey, metaKey, altKey, shiftKey, repeat, defaultPrevented } = event
  if (ctrlKey || metaKey || altKey || shiftKey || repeat || defaultPrevented) return null
  if (!(target instanceof Element) || target.closest(TEXT_FIELD)) return null
  const isHere = target === target.ownerDocument.body || region?.contains(target)
  if (!isHere) return null
  const pressed = key.length === 1 ? key.toLowerCase() : key
  return REVIEW_KEYS.find((one) => one.key === pressed)?.deed ?? null
}

/** Does what the keys ask for while `on`, wherever the focus is in the region or on no element. */
export function useReviewKeys(
  region: RefObject<Element | null>,
  on: boolean,
  act: (deed: ReviewDeed) => void,
): void {
  const press = useEffectEvent((event: KeyboardEvent) => {
    const deed = on ? deedOf(event, region.current) : null
    if (!deed) return
    event.preventDefault()
    act(deed)
  })
  useEffect(() => {
    const listen = (event: KeyboardEvent) => press(event)
    document.addEventListener('keydown', listen)
    return () => document.removeEventListener('keydown', listen)
  }, [])
}

const STORED = 'woadmap-review-keys'
const CHANGED = 'woadmap:review-keys'

/** What was chosen since the page was opened: some browsers keep their store from pages. */
let chosen: boolean | null = null

function subscribe(notify: () => void) {
  window.addEventListener(CHANGED, notify)
  return () => window.removeEventListener(CHANGED, notify)
}

function read(): boolean {
  if (chosen !== null) return chosen
  try {
    return window.localStorage.getItem(STORED) !== 'off'
  } catch {
    return true
  }
}

function choose(on: boolean) {
  chosen = on
  try {
    window.localStorage.setItem(STORED, on ? 'on' : 'off')
  } catch {
    // It holds until the page is left.
  }
  window.dispatchEvent(new Event(CHANGED))
}

/** Whether single keys work, as this browser remembers it, and how to change that. */
export const useKeysOn = (): [on: boolean, choose: (on: boolean) => void] => [
  useSyncExternalStore(subscribe, read, () => true),
  choose,
]
