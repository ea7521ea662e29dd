import { Op } from 'sequelize'

import type { SignedInPerson } from '@/lib/auth/sessions'
import { inTransaction, Session } from '@/models'

import { recordInBrands } from './record-in-brands'

/** Ends all sessions of the person but the one that asks. @returns how many it ended */
export async function endOtherSessions({ id, sessionId }: SignedInPerson): Promise<number> {
  return inTransaction(async (transaction) => {
    const where = { personId: id, id: { [Op.ne]: sessionId } }
    const ended = await Session.destroy({ where, transaction })
    if (ended > 0) {
      await recordInBrands(id, { action: 'session.ended', after: { ended } }, transaction)
    }
    return ended
  })
}
