import type { Migrate } from './umzug'

/** Which copies of a photograph are in the object store: an array of {format, width, height}. */
const UP = /* sql */ `
ALTER TABLE photographs ADD COLUMN derivatives jsonb NOT NULL DEFAULT '[]';
`

const DOWN = /* sql */ `
ALTER TABLE photographs DROP COLUMN derivatives;
`

export const up: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(UP, { transaction })
}

export const down: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(DOWN, { transaction })
}
