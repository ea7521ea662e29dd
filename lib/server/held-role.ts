import { QueryTypes } from 'sequelize'

import { logger } from '@/lib/logger'
import { sequelize } from '@/models'

const HELD = /* sql */ `
SELECT rolsuper OR rolbypassrls OR EXISTS (
  SELECT FROM pg_class WHERE relowner = pg_roles.oid AND relrowsecurity
) AS free FROM pg_roles WHERE rolname = current_user`

/**
 * Ends the process when the web's database role is one that row-level security does not hold: a
 * superuser, an exempt one, or the owner of the tables. A database that is away is asked again.
 */
export function requireHeldRole(): void {
  sequelize()
    .query<{ free: boolean }>(HELD, { type: QueryTypes.SELECT })
    .then(
      ([role]) => {
        if (!role?.free) return
        logger().fatal(
          'DATABASE_URL of the web names a role that row-level security does not hold. Connect as woadmap_web.',
        )
        process.exit(1)
      },
      () => setTimeout(requireHeldRole, 5_000).unref(),
    )
}
