import { Op, QueryTypes } from 'sequelize'

import { SESSION_IDLE } from '@/lib/auth/sessions'
import { AccountToken, Letter, sequelize, Session } from '@/models'

const DAY = 24 * 60 * 60 * 1000
/** How long a letter that is done with is remembered, in milliseconds. */
const LETTERS_KEPT = 30 * DAY

/**
 * The work of the job `sweep-accounts`: removes sessions that are over, tokens that prove nothing
 * any more, letters long sent, and counts of limits that have run out.
 */
export async function sweepAccounts(now = Date.now()): Promise<Record<string, number>> {
  const before = (time: number) => ({ [Op.lt]: new Date(time) })
  const sessions = await Session.destroy({
    where: { [Op.or]: { expiresAt: before(now), lastSeenAt: before(now - SESSION_IDLE) } },
  })
  const tokens = await AccountToken.destroy({ where: { expiresAt: before(now - DAY) } })
  const letters = await Letter.destroy({
    where: {
      createdAt: before(now - LETTERS_KEPT),
      [Op.or]: { sentAt: { [Op.ne]: null }, failedAt: { [Op.ne]: null } },
    },
  })
  const limits = await sequelize().query('DELETE FROM rate_limits WHERE expire < $now', {
    bind: { now },
    type: QueryTypes.BULKDELETE,
  })
  return { sessions, tokens, letters, limits }
}
