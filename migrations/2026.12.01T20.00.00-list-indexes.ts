import type { Migrate } from './umzug'

/*
 * Lists cost the same however long they are. A page is read along an index in its own order; for
 * the sample book that is the expression of lib/shades/sample-book.ts, and the index holds all that
 * is shown, since neighbours in the book are strangers in the table. What is counted stands in an
 * index of equal entries, a thousand to a page.
 */
const UP = /* sql */ `
DROP INDEX shades_order;
CREATE INDEX shades_order ON shades (line_id, position, created_at, id) WHERE deleted_at IS NULL;
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

CREATE INDEX photographs_count ON photographs (brand_id, line_id)
  WHERE deleted_at IS NULL AND state <> 'pending';
CREATE INDEX photographs_reading ON photographs (brand_id, line_id)
  WHERE deleted_at IS NULL AND state IN ('waiting', 'reading');
CREATE INDEX photographs_failed ON photographs (brand_id, line_id)
  WHERE deleted_at IS NULL AND state = 'failed';
CREATE INDEX photographs_unlicensed ON photographs (brand_id, line_id)
  WHERE deleted_at IS NULL AND state <> 'pending' AND licence IS NULL;
CREATE INDEX photographs_undescribed ON photographs (brand_id, line_id)
  WHERE deleted_at IS NULL AND state <> 'pending' AND alt_text = '';

CREATE INDEX combinations_count ON combinations (brand_id, line_id) WHERE deleted_at IS NULL;
`

const DOWN = /* sql */ `
DROP INDEX shades_order, shades_book, shades_count, photographs_count, photographs_reading,
  photographs_failed, photographs_unlicensed, photographs_undescribed, combinations_count;
CREATE INDEX shades_order ON shades (line_id, position) WHERE deleted_at IS NULL;
`

export const up: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(UP, { transaction })
}

export const down: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(DOWN, { transaction })
}
