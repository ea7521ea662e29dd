import { applyEdit, type CombinationDraft, type DraftEdit } from './draft'

/** How many steps can be undone. */
export const HISTORY_STEPS = 50

/** A draft with what it was before and, after an undo, what it would be again. */
export interface DraftHistory {
  /** Oldest first. */
  past: CombinationDraft[]
  present: CombinationDraft
  /** The next one first. */
  future: CombinationDraft[]
  /** What the last step belongs to: more of the same is one step. Null after a pause. */
  run: string | null
}

/** A history that begins now. */
export const beginHistory = (present: CombinationDraft): DraftHistory => ({
  past: [],
  present,
  future: [],
  run: null,
})

/**
 * The history after an edit; the very same when the edit changed nothing.
 * @param run edits of one run (a word being typed, an edge being dragged) are undone together
 */
export function doEdit(
  history: DraftHistory,
  edit: DraftEdit,
  run: string | null = null,
): DraftHistory {
  const present = applyEdit(history.present, edit)
  if (present === history.present) return history
  const goesOn = run !== null && run === history.run && history.past.length > 0
  const before = history.past.at(-1)
  if (goesOn && JSON.stringify(before) === JSON.stringify(present)) {
    // The run came back to where it began: there is nothing to undo.
    return { past: history.past.slice(0, -1), present, future: [], run: null }
  }
  const past = goesOn ? history.past : [...history.past, history.present].slice(-HISTORY_STEPS)
  return { past, present, future: [], run }
}

/** Ends the run, so that the next edit is a step of its own. */
export const endRun = (history: DraftHistory): DraftHistory =>
  history.run === null ? history : { ...history, run: null }

/** One step back; the very same history at its beginning. */
export function undo({ past, present, future }: DraftHistory): DraftHistory {
  const before = past.at(-1)
  if (!before) return { past, present, future, run: null }
  return { past: past.slice(0, -1), present: before, future: [present, ...future], run: null }
}

/** One step forward again; the very same history at its end. */
export function redo({ past, present, future }: DraftHistory): DraftHistory {
  const after = future[0]
  if (!after) return { past, present, future, run: null }
  return { past: [...past, present], present: after, future: future.slice(1), run: null }
}
