import type { Migrate } from './umzug'

/*
 * Who asked for an account has none before the link in the letter is confirmed; until then it
 * waits here, and belongs to no brand.
 */
const SIGN_UPS = /* sql */ `
CREATE TABLE sign_ups (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  email text NOT NULL CHECK (email = lower(email)),
  name text NOT NULL,
  brand_name text NOT NULL,
  password_hash text NOT NULL,
  token_hash text NOT NULL UNIQUE CHECK (token_hash ~ '^[0-9a-f]{64}$'),
  expires_at timestamptz NOT NULL,
  created_at timestamptz NOT NULL DEFAULT now()
);
CREATE INDEX sign_ups_email ON sign_ups (email);
`

/*
 * What is left of somebody where the web's role cannot reach: invitations of brands they are not
 * of, letters, and what lines of the activity record say of them. It forgets nobody but the person of the scope.
 */
const FORGET = /* sql */ `
CREATE FUNCTION forget_person() RETURNS void LANGUAGE sql SECURITY DEFINER SET search_path = public
BEGIN ATOMIC
  DELETE FROM invitations USING people
    WHERE people.id = app_person() AND invitations.email = people.email;
  DELETE FROM letters USING people
    WHERE people.id = app_person() AND letters.recipient = people.email AND sent_at IS NOT NULL;
  UPDATE activities SET object_label = NULL, before = NULL, after = NULL FROM people
    WHERE people.id = app_person() AND (
      object_label = people.email
      OR position(people.email in coalesce(before::text, '') || coalesce(after::text, '')) > 0
    );
END;
REVOKE ALL ON FUNCTION forget_person FROM PUBLIC;
`

const DOWN = /* sql */ `
DROP FUNCTION forget_person;
DROP TABLE sign_ups;
`

export const up: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(SIGN_UPS + FORGET, { transaction })
}

export const down: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(DOWN, { transaction })
}
