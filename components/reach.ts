import { unstable_isUnrecognizedActionError as isUnknownAction } from 'next/navigation'

import type { ActionResult } from '@/lib/errors'

/** What is said when no answer came at all. */
const UNREACHED =
  'Woadmap could not be reached. Nothing you typed is lost: check the connection and try again.'

/** What is said when the server knows this page's action no more. */
const UPDATED =
  'Woadmap was updated while this page was open, and the page can no longer save. Nothing you typed is lost: copy it, reload the page, and save it there.'

/** Waits for an action; no answer at all is a failure in words like any other. */
export function reach<Data>(answer: Promise<ActionResult<Data>>): Promise<ActionResult<Data>> {
  return answer.catch((error: unknown) => ({
    ok: false,
    code: 'unavailable',
    message: isUnknownAction(error) ? UPDATED : UNREACHED,
  }))
}
