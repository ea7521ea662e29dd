import { generateNKeysBetween } from 'fractional-indexing'
import { QueryTypes } from 'sequelize'

import type { Migrate } from './umzug'

/*
 * Families and kits are a tenant's tables. A combination has five places always, some perhaps still
 * empty; it stands in a lane of the board by its rank, a text whose byte order is the lane's order.
 */
const UP = /* sql */ `
CREATE TABLE families (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  line_id uuid NOT NULL,
  name text NOT NULL,
  name_given boolean NOT NULL DEFAULT false,
  neutral boolean NOT NULL DEFAULT false,
  position integer NOT NULL,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  UNIQUE (brand_id, id),
  FOREIGN KEY (brand_id, line_id) REFERENCES lines (brand_id, id) ON DELETE CASCADE
);
CREATE INDEX families_order ON families (line_id, position);

ALTER TABLE shades
  ADD COLUMN family_id uuid,
  ADD COLUMN family_pinned boolean NOT NULL DEFAULT false,
  ADD COLUMN family_position integer,
  ADD FOREIGN KEY (brand_id, family_id) REFERENCES families (brand_id, id)
    ON DELETE SET NULL (family_id);
CREATE INDEX shades_family ON shades (family_id);

ALTER TABLE lines
  ADD COLUMN families_version integer NOT NULL DEFAULT 1,
  ADD COLUMN family_count integer CHECK (family_count BETWEEN 1 AND 20),
  ADD COLUMN board_revision integer NOT NULL DEFAULT 1;

ALTER TABLE combinations
  ADD COLUMN lane text NOT NULL DEFAULT 'sketched'
    CHECK (lane IN ('sketched', 'short-listed', 'chosen')),
  ADD COLUMN rank text COLLATE "C",
  ADD COLUMN story text NOT NULL DEFAULT '';

ALTER TABLE combination_places
  ALTER COLUMN shade_id DROP NOT NULL,
  ADD COLUMN role text CHECK (role IN ('MC', 'CC1', 'CC2', 'CC3', 'CC4')),
  ADD COLUMN locked boolean NOT NULL DEFAULT false,
  ADD CONSTRAINT combination_places_role UNIQUE (combination_id, role) DEFERRABLE INITIALLY DEFERRED,
  DROP CONSTRAINT combination_places_combination_id_shade_id_key,
  ADD CONSTRAINT combination_places_shade_once UNIQUE (combination_id, shade_id)
    DEFERRABLE INITIALLY DEFERRED;
UPDATE combination_places SET role = CASE place WHEN 1 THEN 'MC' ELSE 'CC' || (place - 1) END;

CREATE TABLE kits (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  line_id uuid NOT NULL,
  state text NOT NULL DEFAULT 'waiting' CHECK (state IN ('waiting', 'building', 'ready', 'failed')),
  done integer NOT NULL DEFAULT 0,
  total integer NOT NULL DEFAULT 0,
  selection jsonb NOT NULL,
  contents jsonb NOT NULL DEFAULT '[]',
  left_out jsonb NOT NULL DEFAULT '[]',
  object_key text UNIQUE,
  byte_length integer,
  sha256 text CHECK (sha256 ~ '^[0-9a-f]{64}$'),
  failure text,
  created_by_id uuid REFERENCES people ON DELETE SET NULL,
  request_key uuid,
  expires_at timestamptz,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  UNIQUE (brand_id, id),
  UNIQUE (brand_id, request_key),
  FOREIGN KEY (brand_id, line_id) REFERENCES lines (brand_id, id) ON DELETE CASCADE
);
CREATE INDEX kits_newest ON kits (line_id, created_at DESC, id);
CREATE INDEX kits_expired ON kits (expires_at) WHERE object_key IS NOT NULL;

SELECT make_tenant(one) FROM unnest(ARRAY['families', 'kits']::regclass[]) AS one;
`

const RANKED = /* sql */ `
ALTER TABLE combination_places ALTER COLUMN role SET NOT NULL;
ALTER TABLE combinations ALTER COLUMN rank SET NOT NULL;
CREATE INDEX combinations_lane ON combinations (line_id, lane, rank, id) WHERE deleted_at IS NULL;
`

const KEPT = /* sql */ `
SELECT id, line_id FROM combinations ORDER BY line_id, created_at DESC, id`

const RANK = /* sql */ `UPDATE combinations SET rank = $2 WHERE id = $1`

const DOWN = /* sql */ `
DROP TABLE kits;
DELETE FROM combination_places WHERE shade_id IS NULL;
ALTER TABLE combination_places
  DROP CONSTRAINT combination_places_shade_once,
  ADD CONSTRAINT combination_places_combination_id_shade_id_key UNIQUE (combination_id, shade_id),
  ALTER COLUMN shade_id SET NOT NULL,
  DROP COLUMN role,
  DROP COLUMN locked;
ALTER TABLE combinations DROP COLUMN lane, DROP COLUMN rank, DROP COLUMN story;
ALTER TABLE lines
  DROP COLUMN families_version, DROP COLUMN family_count, DROP COLUMN board_revision;
ALTER TABLE shades
  DROP COLUMN family_id, DROP COLUMN family_pinned, DROP COLUMN family_position;
DROP TABLE families;
`

export const up: Migrate = async ({ query, transaction }) => {
  const { sequelize } = query
  await sequelize.query(UP, { transaction })
  const kept = await sequelize.query<{ id: string; line_id: string }>(KEPT, {
    type: QueryTypes.SELECT,
    transaction,
  })
  const lines = new Map<string, string[]>()
  for (const { id, line_id } of kept) lines.set(line_id, [...(lines.get(line_id) ?? []), id])
  for (const ids of lines.values()) {
    const ranks = generateNKeysBetween(null, null, ids.length)
    for (const [at, id] of ids.entries()) {
      await sequelize.query(RANK, { bind: [id, ranks[at]], transaction })
    }
  }
  await sequelize.query(RANKED, { transaction })
}

export const down: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(DOWN, { transaction })
}
