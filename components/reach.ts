import type { ActionResult } from '@/lib/errors'

/** What is said when no answer came at all. */
const UNREACHED =
  'Woadmap could not be reached. Nothing you typed is lost: check the connection and try again.'

/** Waits for an action; no answer at all is a failure in words like any other. */
export function reach<Data>(answer: Promise<ActionResult<Data>>): Promise<ActionResult<Data>> {
  return answer.catch(() => ({ ok: false, code: 'unavailable', message: UNREACHED }))
}
