import { setTimeout as pause } from 'node:timers/promises'

/** Longer than any of the works it hides takes as a rule, in milliseconds. */
const ANSWER_TIME = 150

/**
 * Does the work and answers, or fails, no sooner than after {@link ANSWER_TIME}: how long it took
 * does not tell whether there was an account to work on.
 */
export async function inAnswerTime<T>(work: () => Promise<T>): Promise<T> {
  const [outcome] = await Promise.allSettled([work(), pause(ANSWER_TIME)])
  if (outcome.status === 'rejected') throw outcome.reason
  return outcome.value
}
