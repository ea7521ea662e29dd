import type { Migrate } from './umzug'

/*
 * Tenant tables carry brand_id and a unique (brand_id, id), so that every reference between them is
 * over both columns: a row cannot point into another brand whatever the code above does.
 */
const UP = /* sql */ `
CREATE TABLE brands (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  name text NOT NULL,
  slug text NOT NULL UNIQUE CHECK (slug ~ '^[a-z0-9]+(-[a-z0-9]+)*$'),
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now()
);

CREATE TABLE people (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  email text NOT NULL UNIQUE CHECK (email = lower(email)),
  name text NOT NULL,
  password_hash text NOT NULL,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now()
);

CREATE TABLE memberships (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL REFERENCES brands ON DELETE CASCADE,
  person_id uuid NOT NULL REFERENCES people ON DELETE CASCADE,
  role text NOT NULL CHECK (role IN ('owner', 'marketer', 'designer', 'dyer')),
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  UNIQUE (brand_id, person_id)
);
CREATE INDEX memberships_person ON memberships (person_id);

CREATE TABLE sessions (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  person_id uuid NOT NULL REFERENCES people ON DELETE CASCADE,
  expires_at timestamptz NOT NULL,
  last_seen_at timestamptz NOT NULL DEFAULT now(),
  created_at timestamptz NOT NULL DEFAULT now()
);
CREATE INDEX sessions_person ON sessions (person_id);
CREATE INDEX sessions_expires ON sessions (expires_at);

CREATE TABLE lines (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL REFERENCES brands ON DELETE CASCADE,
  slug text NOT NULL CHECK (slug ~ '^[a-z0-9]+(-[a-z0-9]+)*$'),
  name text NOT NULL,
  fibres jsonb NOT NULL,
  ply integer NOT NULL,
  weight_number integer NOT NULL CHECK (weight_number BETWEEN 0 AND 7),
  net_grams double precision NOT NULL CHECK (net_grams > 0),
  length double precision NOT NULL CHECK (length > 0),
  length_unit text NOT NULL CHECK (length_unit IN ('m', 'yd')),
  needle_mm double precision NOT NULL CHECK (needle_mm > 0),
  gauge_stitches double precision NOT NULL CHECK (gauge_stitches > 0),
  gauge_rows double precision NOT NULL CHECK (gauge_rows > 0),
  currency text NOT NULL CHECK (currency ~ '^[A-Z]{3}$'),
  price_minor integer NOT NULL CHECK (price_minor >= 0),
  launch_date date,
  shades_revision integer NOT NULL DEFAULT 1,
  request_key uuid,
  version integer NOT NULL DEFAULT 1,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  UNIQUE (brand_id, id),
  UNIQUE (brand_id, slug),
  UNIQUE (brand_id, request_key)
);

CREATE TABLE shades (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  line_id uuid NOT NULL,
  number text NOT NULL,
  name text,
  lab_l double precision NOT NULL CHECK (lab_l BETWEEN 0 AND 100),
  lab_a double precision NOT NULL CHECK (lab_a BETWEEN -150 AND 150),
  lab_b double precision NOT NULL CHECK (lab_b BETWEEN -150 AND 150),
  illuminant text NOT NULL CHECK (illuminant = 'D65'),
  observer integer NOT NULL CHECK (observer IN (2, 10)),
  hex text CHECK (hex ~ '^#[0-9a-f]{6}$'),
  status text NOT NULL CHECK (status IN ('target', 'dipped', 'approved', 'retired')),
  position integer NOT NULL,
  request_key uuid,
  version integer NOT NULL DEFAULT 1,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  deleted_at timestamptz,
  UNIQUE (brand_id, id),
  UNIQUE (brand_id, request_key),
  FOREIGN KEY (brand_id, line_id) REFERENCES lines (brand_id, id) ON DELETE CASCADE
);
CREATE UNIQUE INDEX shades_number ON shades (line_id, lower(number)) WHERE deleted_at IS NULL;
CREATE INDEX shades_order ON shades (line_id, position) WHERE deleted_at IS NULL;

CREATE TABLE photographs (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  line_id uuid NOT NULL,
  title text NOT NULL,
  photographer text NOT NULL DEFAULT '',
  licence text CHECK (licence IN ('own-work', 'permission', 'cc0', 'cc-by', 'other')),
  licence_note text NOT NULL DEFAULT '',
  licence_url text NOT NULL DEFAULT '',
  source_url text NOT NULL DEFAULT '',
  alt_text text NOT NULL DEFAULT '',
  file_name text NOT NULL,
  object_key text NOT NULL UNIQUE,
  content_type text NOT NULL,
  byte_length integer NOT NULL CHECK (byte_length > 0),
  sha256 text NOT NULL CHECK (sha256 ~ '^[0-9a-f]{64}$'),
  width integer,
  height integer,
  state text NOT NULL DEFAULT 'pending'
    CHECK (state IN ('pending', 'waiting', 'reading', 'ready', 'failed')),
  failure text,
  uploaded_by_id uuid REFERENCES people ON DELETE SET NULL,
  version integer NOT NULL DEFAULT 1,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  deleted_at timestamptz,
  UNIQUE (brand_id, id),
  FOREIGN KEY (brand_id, line_id) REFERENCES lines (brand_id, id) ON DELETE CASCADE
);
-- The same file once in a line; a pending upload does not hold the place.
CREATE UNIQUE INDEX photographs_file ON photographs (line_id, sha256)
  WHERE deleted_at IS NULL AND state <> 'pending';
CREATE INDEX photographs_newest ON photographs (line_id, created_at DESC, id)
  WHERE deleted_at IS NULL AND state <> 'pending';
CREATE INDEX photographs_sweep ON photographs (created_at) WHERE state = 'pending';
CREATE INDEX photographs_deleted ON photographs (deleted_at) WHERE deleted_at IS NOT NULL;

CREATE TABLE readings (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  photograph_id uuid NOT NULL UNIQUE,
  cells jsonb NOT NULL,
  cell_map bytea NOT NULL,
  map_width integer NOT NULL,
  map_height integer NOT NULL,
  striking jsonb NOT NULL,
  matches jsonb NOT NULL,
  shades_revision integer NOT NULL,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  FOREIGN KEY (brand_id, photograph_id) REFERENCES photographs (brand_id, id) ON DELETE CASCADE
);

CREATE TABLE combinations (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  line_id uuid NOT NULL,
  title text NOT NULL,
  photograph_id uuid,
  reading text CHECK (reading IN ('true', 'accent', 'contrast', 'family', 'quiet')),
  created_by_id uuid REFERENCES people ON DELETE SET NULL,
  request_key uuid,
  version integer NOT NULL DEFAULT 1,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  deleted_at timestamptz,
  UNIQUE (brand_id, id),
  UNIQUE (brand_id, request_key),
  FOREIGN KEY (brand_id, line_id) REFERENCES lines (brand_id, id) ON DELETE CASCADE,
  FOREIGN KEY (brand_id, photograph_id) REFERENCES photographs (brand_id, id)
    ON DELETE SET NULL (photograph_id)
);
CREATE INDEX combinations_newest ON combinations (line_id, created_at DESC, id)
  WHERE deleted_at IS NULL;
CREATE INDEX combinations_photograph ON combinations (photograph_id);

CREATE TABLE combination_places (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  combination_id uuid NOT NULL,
  place integer NOT NULL CHECK (place BETWEEN 1 AND 5),
  shade_id uuid NOT NULL,
  share double precision NOT NULL CHECK (share BETWEEN 0 AND 1),
  UNIQUE (combination_id, place) DEFERRABLE INITIALLY DEFERRED,
  UNIQUE (combination_id, shade_id),
  FOREIGN KEY (brand_id, combination_id) REFERENCES combinations (brand_id, id) ON DELETE CASCADE,
  FOREIGN KEY (brand_id, shade_id) REFERENCES shades (brand_id, id)
);
CREATE INDEX combination_places_shade ON combination_places (shade_id);
`

const DOWN = /* sql */ `
DROP TABLE combination_places, combinations, readings, photographs, shades, lines, sessions,
  memberships, people, brands;
`

export const up: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(UP, { transaction })
}

export const down: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(DOWN, { transaction })
}
