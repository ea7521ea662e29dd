import { Op, QueryTypes } from 'sequelize'

import { SESSION_IDLE } from '@/lib/auth/sessions'
import { AccountToken, Invitation, Letter, sequelize, Session, SignUp } from '@/models'

const DAY = 24 * 60 * 60_000
/** How long it is known that a letter was sent, or somebody invited, in milliseconds. */
const KEPT = 30 * DAY

/** What a sweep removed. */
export interface PeopleSweepResult {
  signUps: number
  links: number
  sessions: number
  invitations: number
  letters: number
  limits: number
}

/**
 * The work of the job `sweep-people`: removes what is past its time and holds personal data, and
 * counts of limits that have run out.
 */
export async function sweepPeople(now = Date.now()): Promise<PeopleSweepResult> {
  const before = (age: number) => ({ [Op.lt]: new Date(now - age) })
  return {
    signUps: await SignUp.destroy({ where: { expiresAt: before(0) } }),
    links: await AccountToken.destroy({ where: { expiresAt: before(DAY) } }),
    sessions: await Session.destroy({
      where: { [Op.or]: [{ expiresAt: before(0) }, { lastSeenAt: before(SESSION_IDLE) }] },
    }),
    invitations: await Invitation.destroy({ where: { expiresAt: before(KEPT) } }),
    letters: await Letter.destroy({
      where: { [Op.or]: [{ sentAt: before(KEPT) }, { failedAt: before(KEPT) }] },
    }),
    limits: await sequelize().query('DELETE FROM rate_limits WHERE expire < $now', {
      bind: { now },
      type: QueryTypes.BULKDELETE,
    }),
  }
}
