import type { SignedInPerson } from '@/lib/auth/sessions'
import { NotFoundError } from '@/lib/errors'
import { inTransaction, Session } from '@/models'

import { recordInBrands } from './record-in-brands'
import type { EndSessionInput } from './schema'

/** Ends one of the person's own sessions. @throws NotFoundError */
export async function endOwnSession(
  { id: personId }: SignedInPerson,
  { sessionId }: EndSessionInput,
): Promise<void> {
  await inTransaction(async (transaction) => {
    const ended = await Session.destroy({ where: { id: sessionId, personId }, transaction })
    if (ended === 0) throw new NotFoundError('That session has ended already.')
    await recordInBrands(personId, { action: 'session.ended' }, transaction)
  })
}
