import type { ActionResult } from '@/lib/errors'

import type { CombinationDraft, DraftEdit } from './draft'
import { beginHistory, doEdit, endRun, redo, undo, type DraftHistory } from './draft-history'
import { differingParts, isSame, joinDrafts, rebaseHistory, type DraftPart } from './draft-merge'

/** A combination as the server has it. */
export interface SavedDraft {
  version: number
  draft: CombinationDraft
}

/** Where the saving stands. */
export type Saving =
  /** Nothing is unsaved. */
  | { kind: 'saved' }
  /** Something is, and will be sent in a moment. */
  | { kind: 'waiting' }
  | { kind: 'saving' }
  /** No answer, or none of use: it is tried again by itself. */
  | { kind: 'unreached' }
  /** The server says no, or something is missing; in words. */
  | { kind: 'refused'; words: string }
  /** Both changed the same; see `theirs`. */
  | { kind: 'conflict' }

/** Everything the editor shows. */
export interface EditorState {
  history: DraftHistory
  /** What the edits stand on. */
  base: SavedDraft
  /** What somebody else saved while something here was unsaved, until one of them is chosen. */
  theirs: SavedDraft | null
  saving: Saving
  /** What somebody else changed last, now shown here too. */
  news: readonly DraftPart[]
}

/** What the editor needs of the world. */
export interface EditorWorld {
  initial: SavedDraft
  /** Under which name edits are kept in `storage`. */
  key: string
  storage: () => Pick<Storage, 'getItem' | 'setItem'>
  save: (saved: SavedDraft) => Promise<ActionResult<{ version: number }>>
  /** What the server has now; null when it cannot be asked. */
  load: () => Promise<SavedDraft | null>
}

/** Milliseconds from the last edit until it is sent. */
export const SAVE_DELAY = 700
/** Milliseconds until an unanswered save is tried again: 1 s at first, 10 s in the end. */
export const retryDelay = (tries: number): number => Math.min(10_000, 1_000 * 1.6 ** tries)

/** What is tried again by itself: no answer, or one that says nothing of the edit. */
const UNREACHED: ReadonlySet<string> = new Set([
  'conflict',
  'unavailable',
  'too-many',
  'unexpected',
])

const NO_TITLE = 'give the combination a title.'

interface Kept {
  base: SavedDraft
  history: DraftHistory
}

/** Reads what was kept in this tab; null when there is nothing of use. */
function readKept(text: string | null): Kept | null {
  if (!text) return null
  try {
    const kept = JSON.parse(text) as Kept
    const drafts = [kept.base.draft, kept.history.present, ...kept.history.past]
    return drafts.every(({ places }) => places.length === 5) ? kept : null
  } catch {
    return null
  }
}

/** What {@link createEditorStore} makes. */
export type EditorStore = ReturnType<typeof createEditorStore>

/**
 * The state of an open combination outside React: its history, what the server has, and the saving
 * that goes on by itself. Nothing done here is dropped: it is saved, or joined with what somebody
 * else saved, or waits in the tab's storage.
 */
export function createEditorStore(world: EditorWorld) {
  const listeners = new Set<() => void>()
  let timer: ReturnType<typeof setTimeout> | undefined
  let tries = 0
  let inFlight = false
  let state: EditorState = {
    history: beginHistory(world.initial.draft),
    base: world.initial,
    theirs: null,
    saving: { kind: 'saved' },
    news: [],
  }

  function set(change: Partial<EditorState>) {
    state = { ...state, ...change }
    keep()
    for (const listener of listeners) listener()
  }

  function keep() {
    const { base, history } = state
    try {
      world.storage().setItem(world.key, JSON.stringify({ base, history }))
    } catch {
      // The tab's storage is full: what is unsaved matters more than the steps before it.
      try {
        const short = beginHistory(history.present)
        world.storage().setItem(world.key, JSON.stringify({ base, history: short }))
      } catch {
        // It is still on the page, and leaving that asks first.
      }
    }
  }

  const isUnsaved = () => !isSame(state.history.present, state.base.draft)

  function schedule(delay: number) {
    clearTimeout(timer)
    timer = setTimeout(() => void flush(), delay)
  }

  /** Looks what has to happen after the draft or its base changed. */
  function settle() {
    if (inFlight) return
    const { theirs, base, history } = state
    if (theirs) {
      const { conflicts } = joinDrafts(base.draft, history.present, theirs.draft)
      if (conflicts.length > 0) return set({ saving: { kind: 'conflict' } })
      adopt(theirs, 'mine')
    }
    if (!isUnsaved()) {
      clearTimeout(timer)
      return set({ saving: { kind: 'saved' } })
    }
    if (state.history.present.title.trim() === '') {
      clearTimeout(timer)
      return set({ saving: { kind: 'refused', words: NO_TITLE } })
    }
    if (state.saving.kind !== 'unreached') set({ saving: { kind: 'waiting' } })
    schedule(SAVE_DELAY)
  }

  function adopt(theirs: SavedDraft, preferred: 'mine' | 'theirs') {
    set({
      history: rebaseHistory(state.history, state.base.draft, theirs.draft, preferred),
      news: differingParts(state.base.draft, theirs.draft),
      base: theirs,
      theirs: null,
    })
  }

  /** Takes note of what the server has, when it is newer than what is known. */
  function hear(theirs: SavedDraft) {
    if (inFlight || theirs.version <= (state.theirs ?? state.base).version) return
    set({ theirs })
    settle()
  }

  async function flush() {
    clearTimeout(timer)
    if (inFlight || state.theirs || !isUnsaved()) return
    const { title, story, ...rest } = state.history.present
    if (title.trim() === '') return
    const draft = { ...rest, title: title.trim(), story: story.trim() }
    inFlight = true
    if (state.saving.kind !== 'unreached') set({ saving: { kind: 'saving' } })
    const answer = await world.save({ version: state.base.version, draft })
    const theirs = !answer.ok && answer.code === 'conflict' ? await world.load() : null
    inFlight = false
    if (answer.ok) {
      tries = 0
      set({ base: { version: answer.data.version, draft }, saving: { kind: 'saved' } })
      settle()
      return
    }
    if (theirs && theirs.version > state.base.version) {
      tries = 0
      set({ saving: { kind: 'waiting' } })
      hear(theirs)
      return
    }
    const unreached = UNREACHED.has(answer.code)
    set({
      saving: unreached ? { kind: 'unreached' } : { kind: 'refused', words: answer.message },
    })
    // Somebody whose session has ended may sign in again in another tab.
    if (unreached || answer.code === 'unauthenticated') {
      schedule(retryDelay(tries))
      tries += 1
    }
  }

  function change(history: DraftHistory) {
    if (history === state.history) return
    const unchanged = history.present === state.history.present
    set({ history, news: [] })
    if (!unchanged) settle()
  }

  /** Goes on where this tab was before the page was loaded again. */
  function restore() {
    const kept = readKept(world.storage().getItem(world.key))
    if (!kept) return
    // A tab that was left while the same version was open elsewhere knows no more than the server.
    const { base } = state
    set({ history: kept.history, base: kept.base })
    if (base.version > kept.base.version) set({ theirs: base })
    settle()
  }

  function tryNow() {
    if (state.saving.kind === 'unreached') void flush()
  }
  const leave = () => void flush()
  function warn(event: BeforeUnloadEvent) {
    if (isUnsaved()) event.preventDefault()
  }

  return {
    subscribe(listener: () => void) {
      listeners.add(listener)
      return () => void listeners.delete(listener)
    },
    getState: () => state,
    /** Begins in the browser; answers what ends it. */
    start() {
      restore()
      window.addEventListener('online', tryNow)
      window.addEventListener('pagehide', leave)
      window.addEventListener('beforeunload', warn)
      return () => {
        void flush()
        window.removeEventListener('online', tryNow)
        window.removeEventListener('pagehide', leave)
        window.removeEventListener('beforeunload', warn)
      }
    },
    edit: (edit: DraftEdit, run?: string) => change(doEdit(state.history, edit, run ?? null)),
    endRun: () => change(endRun(state.history)),
    undo: () => change(undo(state.history)),
    redo: () => change(redo(state.history)),
    hear,
    /** Settles a conflict. */
    choose(preferred: 'mine' | 'theirs') {
      if (!state.theirs) return
      adopt(state.theirs, preferred)
      settle()
    },
    /** Sends at once what is unsaved. */
    saveNow: () => void flush(),
  }
}
