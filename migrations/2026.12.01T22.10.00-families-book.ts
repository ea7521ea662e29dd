import type { Migrate } from './umzug'

/*
 * The sample book is read family by family, each along an index in its own order; how many stand in
 * each is counted in an index of equal entries. By lightness it is read along an index too.
 */
const UP = /* sql */ `
DROP INDEX shades_book, shades_count;
CREATE INDEX shades_book
  ON shades (line_id, family_id, family_position, lab_l DESC, position, created_at, id)
  WHERE deleted_at IS NULL;
CREATE INDEX shades_count ON shades (brand_id, line_id, family_id) WHERE deleted_at IS NULL;
CREATE INDEX shades_lightness ON shades (line_id, lab_l DESC, position, created_at, id)
  WHERE deleted_at IS NULL;
`

const DOWN = /* sql */ `
DROP INDEX shades_book, shades_count, shades_lightness;
CREATE INDEX shades_book ON shades (line_id, (CASE
    WHEN lab_a * lab_a + lab_b * lab_b < 64 THEN 0
    WHEN 180 + atan2d(-lab_b, -lab_a) < 40.5 THEN 1
    WHEN 180 + atan2d(-lab_b, -lab_a) < 73.5 THEN 2
    WHEN 180 + atan2d(-lab_b, -lab_a) < 108 THEN 3
    WHEN 180 + atan2d(-lab_b, -lab_a) < 144 THEN 4
    WHEN 180 + atan2d(-lab_b, -lab_a) < 183 THEN 5
    WHEN 180 + atan2d(-lab_b, -lab_a) < 225 THEN 6
    WHEN 180 + atan2d(-lab_b, -lab_a) < 280.5 THEN 7
    WHEN 180 + atan2d(-lab_b, -lab_a) < 349.5 THEN 8
    ELSE 1 END), lab_l DESC, position, created_at, id)
  INCLUDE (brand_id, number, name, lab_a, lab_b, illuminant, observer, hex, status, version)
  WHERE deleted_at IS NULL;
CREATE INDEX shades_count ON shades (brand_id, line_id) WHERE deleted_at IS NULL;
`

export const up: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(UP, { transaction })
}

export const down: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(DOWN, { transaction })
}
