import type { Migrate } from './umzug'

/*
 * A second factor that is begun stands beside the one in use until a code confirms it, so that
 * somebody can change their authenticator while their brand requires one. Which is in use was told
 * by its confirmation before; now it is told by itself.
 */
const UP = /* sql */ `
ALTER TABLE people ADD COLUMN totp_pending text;
UPDATE people SET totp_pending = totp_secret, totp_secret = NULL WHERE totp_confirmed_at IS NULL;
ALTER TABLE people ADD CONSTRAINT people_totp_in_use CHECK ((totp_secret IS NULL) = (totp_confirmed_at IS NULL));
`

const DOWN = /* sql */ `
ALTER TABLE people DROP COLUMN totp_pending, DROP CONSTRAINT people_totp_in_use;
`

export const up: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(UP, { transaction })
}

export const down: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(DOWN, { transaction })
}
