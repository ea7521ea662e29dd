import { QueryTypes } from 'sequelize'

import type { Role } from '@/lib/people/constants'

import { withWhomever } from './scope'
import { sequelize } from './sequelize'

/** Who is behind a session that may be over, and what they are in which brands, by name. */
export interface SessionRow {
  personId: string
  personName: string
  email: string
  hasSecondFactor: boolean
  expiresAt: Date
  lastSeenAt: Date
  memberships: {
    brandId: string
    brandSlug: string
    brandName: string
    role: Role
    /** The brand's pages open only to who has a second factor. */
    secondFactorRequired: boolean
  }[]
}

const SESSION_OF = /* sql */ `
  SELECT person_id AS "personId", person_name AS "personName", email,
    has_second_factor AS "hasSecondFactor", expires_at AS "expiresAt",
    last_seen_at AS "lastSeenAt", memberships
  FROM session_of($sessionId)`

/**
 * The row of a session, or null. One statement, without models, and on a connection that need not
 * be told for whom it speaks: every request begins with it. `session_of` answers as the owner of
 * the tables (migrations, session-of), and so the same to everybody.
 */
export async function sessionOf(sessionId: string): Promise<SessionRow | null> {
  const [row] = await withWhomever(() =>
    sequelize().query<SessionRow>(SESSION_OF, { bind: { sessionId }, type: QueryTypes.SELECT }),
  )
  return row ?? null
}
