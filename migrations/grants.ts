import { QueryTypes } from 'sequelize'

import { sequelize } from '@/models/sequelize'

/**
 * What the web's role may do, said again after every migration. It owns nothing and is held by
 * row-level security; the activity record and the history of names can only grow, and a letter once
 * posted is not read.
 */
const GRANTS = /* sql */ `
REVOKE ALL ON ALL TABLES IN SCHEMA public FROM woadmap_web;
GRANT USAGE ON SCHEMA public, pgboss TO woadmap_web;
GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA public TO woadmap_web;
REVOKE UPDATE, DELETE ON activities FROM woadmap_web;
REVOKE UPDATE, DELETE ON name_moves FROM woadmap_web;
REVOKE SELECT, UPDATE, DELETE ON letters FROM woadmap_web;
REVOKE INSERT, UPDATE, DELETE ON migrations FROM woadmap_web;
GRANT EXECUTE ON FUNCTION brand_of_invitation, forget_person, session_of TO woadmap_web;
GRANT SELECT, INSERT ON pgboss.job TO woadmap_web;
GRANT SELECT ON pgboss.queue TO woadmap_web;
`

/** Gives the role `woadmap_web` its rights. @throws Error when there is no such role */
export async function grantToWeb(): Promise<void> {
  const roles = await sequelize().query("SELECT FROM pg_roles WHERE rolname = 'woadmap_web'", {
    type: QueryTypes.SELECT,
  })
  if (roles.length === 0) {
    throw new Error(
      "There is no role woadmap_web: CREATE ROLE woadmap_web LOGIN PASSWORD '…', then migrate again.",
    )
  }
  await sequelize().query(GRANTS)
}
