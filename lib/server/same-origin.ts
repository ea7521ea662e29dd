import { env } from '@/lib/env'
import { ForbiddenError } from '@/lib/errors'

/**
 * Refuses a write that another site's page sent, or that does not say where it comes from: a
 * browser says so in Origin or, where it leaves that out, in Sec-Fetch-Site, and no page can set
 * either.
 * @source Fetch Standard § 3.2 (Origin); Fetch Metadata Request Headers § 2.4
 * @throws ForbiddenError
 */
export function requireSameOrigin(headers: Pick<Headers, 'get'>): void {
  const origin = headers.get('origin')
  const same =
    origin === null
      ? headers.get('sec-fetch-site') === 'same-origin'
      : origin === new URL(env().APP_ORIGIN).origin
  if (!same) throw new ForbiddenError('This request did not come from a page of Woadmap.')
}
