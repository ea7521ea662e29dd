import { after } from 'next/server'

import { recordActivity } from '@/lib/activity/record'
import { asActor, type Actor } from '@/lib/auth/actor'
import { spend } from '@/lib/auth/rate-limits'
import { ForbiddenError, TooManyError } from '@/lib/errors'
import { logger } from '@/lib/logger'
import { inTransaction } from '@/models'
import { currentScope, withinScope } from '@/models/scope'

/** What was asked for: an action or a route by its name, or a page by its path. */
export type Asked = { asked: string } | { page: string }

/**
 * Does the work; when the actor's role does not include it, the brand's activity record tells of
 * it once the answer is sent, at most once a minute for the same person and thing.
 */
export async function recordRefusals<T>(
  actor: Actor,
  what: Asked,
  work: () => Promise<T>,
): Promise<T> {
  try {
    return await work()
  } catch (error) {
    if (error instanceof ForbiddenError) {
      const { requestId } = currentScope()
      after(() => withinScope({ requestId }, () => recordRefusal(actor, what)))
    }
    throw error
  }
}

/** A refusal that cannot be recorded stays a refusal; the log says so. */
async function recordRefusal(actor: Actor, what: Asked): Promise<void> {
  const { brandId, personId } = actor
  try {
    await asActor(actor, async () => {
      const who = `${brandId} ${personId}`
      await spend('refusal', `${who} ${Object.values(what).join()}`)
      await spend('refusal-person', who)
      await inTransaction((transaction) =>
        recordActivity(actor, { action: 'access.refused', after: what }, transaction),
      )
    })
  } catch (error) {
    if (error instanceof TooManyError) return
    const { requestId } = currentScope()
    logger().warn({ err: error, requestId, what }, 'a refusal was not recorded')
  }
}
