import type { Migrate } from './umzug'

/** The record grows without end: what it is narrowed by is found without reading all of it. */
export const up: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(
    /* sql */ `
CREATE INDEX activities_of_person ON activities (brand_id, person_id, created_at DESC, id);
CREATE INDEX activities_of_kind
  ON activities (brand_id, split_part(action, '.', 1), created_at DESC, id);
`,
    { transaction },
  )
}

export const down: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query('DROP INDEX activities_of_person, activities_of_kind', {
    transaction,
  })
}
