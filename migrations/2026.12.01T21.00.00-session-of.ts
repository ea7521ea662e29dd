import type { Migrate } from './umzug'

/*
 * Who is behind a session, and as what in which brands: asked at the beginning of every request,
 * before it is known for whom the connection is to speak, and so answered as the owner of the
 * tables. Whoever knows a session's id may know this of it. In plpgsql, which keeps its plan as long
 * as the connection lasts; a function in sql is planned at every call.
 */
const UP = /* sql */ `
CREATE FUNCTION session_of(wanted uuid) RETURNS TABLE (
  person_id uuid, person_name text, email text, has_second_factor boolean,
  expires_at timestamptz, last_seen_at timestamptz, memberships json
) LANGUAGE plpgsql STABLE SECURITY DEFINER SET search_path = public, pg_temp AS $$
BEGIN
  RETURN QUERY
  SELECT p.id, p.name, p.email, p.totp_confirmed_at IS NOT NULL, s.expires_at, s.last_seen_at, (
    SELECT coalesce(json_agg(json_build_object(
      'brandId', b.id, 'brandSlug', b.slug, 'brandName', b.name, 'role', m.role,
      'secondFactorRequired', b.second_factor_required) ORDER BY b.name), '[]')
    FROM memberships m JOIN brands b ON b.id = m.brand_id WHERE m.person_id = p.id)
  FROM sessions s JOIN people p ON p.id = s.person_id WHERE s.id = wanted;
END $$;
REVOKE ALL ON FUNCTION session_of FROM PUBLIC;
`

const DOWN = /* sql */ `DROP FUNCTION session_of;`

export const up: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(UP, { transaction })
}

export const down: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(DOWN, { transaction })
}
