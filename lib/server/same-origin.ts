import { env } from '@/lib/env'
import { ForbiddenError } from '@/lib/errors'

/**
 * Refuses a write that another site's page sent, or that does not say where it comes from.
 * @throws ForbiddenError
 */
export function requireSameOrigin(headers: Pick<Headers, 'get'>): void {
  if (headers.get('origin') !== new URL(env().APP_ORIGIN).origin) {
    throw new ForbiddenError('This request did not come from a page of Woadmap.')
  }
}
