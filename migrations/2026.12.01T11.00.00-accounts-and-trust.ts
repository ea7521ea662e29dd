import type { Migrate } from './umzug'

/*
 * The web's role sees the rows of one brand at a time: the one that app.brand names on its
 * connection (models/sequelize.ts). A person also sees their own memberships, in any brand, by
 * app.person. The owner of the tables, as which migrations and jobs connect, is not held by this.
 */
const SCOPE = /* sql */ `
CREATE FUNCTION app_brand() RETURNS uuid LANGUAGE sql STABLE
  RETURN nullif(current_setting('app.brand', true), '')::uuid;
CREATE FUNCTION app_person() RETURNS uuid LANGUAGE sql STABLE
  RETURN nullif(current_setting('app.person', true), '')::uuid;

-- Makes a table with a brand_id a tenant's: whoever is held by row-level security sees and writes
-- the rows of the brand that app.brand names, and none when it names none.
CREATE FUNCTION make_tenant(one regclass) RETURNS void LANGUAGE plpgsql AS $$
BEGIN
  EXECUTE format('ALTER TABLE %s ENABLE ROW LEVEL SECURITY', one);
  EXECUTE format('CREATE POLICY of_the_brand ON %s
    USING (brand_id = app_brand()) WITH CHECK (brand_id = app_brand())', one);
END $$;
`

const TABLES = /* sql */ `
ALTER TABLE people
  ADD COLUMN totp_secret text,
  ADD COLUMN totp_confirmed_at timestamptz,
  ADD COLUMN totp_last_step integer NOT NULL DEFAULT 0;
ALTER TABLE brands ADD COLUMN second_factor_required boolean NOT NULL DEFAULT false;
ALTER TABLE sessions
  ADD COLUMN user_agent text NOT NULL DEFAULT '',
  ADD COLUMN address text NOT NULL DEFAULT '';

-- What a link in a letter proves; only its SHA-256 is kept.
CREATE TABLE account_tokens (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  person_id uuid NOT NULL REFERENCES people ON DELETE CASCADE,
  kind text NOT NULL CHECK (kind IN ('reset-password', 'change-email')),
  token_hash text NOT NULL UNIQUE CHECK (token_hash ~ '^[0-9a-f]{64}$'),
  new_email text CHECK (new_email = lower(new_email)),
  expires_at timestamptz NOT NULL,
  used_at timestamptz,
  created_at timestamptz NOT NULL DEFAULT now()
);
CREATE INDEX account_tokens_person ON account_tokens (person_id, kind);

CREATE TABLE recovery_codes (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  person_id uuid NOT NULL REFERENCES people ON DELETE CASCADE,
  code_hash text NOT NULL CHECK (code_hash ~ '^[0-9a-f]{64}$'),
  used_at timestamptz,
  created_at timestamptz NOT NULL DEFAULT now(),
  UNIQUE (person_id, code_hash)
);

CREATE TABLE invitations (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL REFERENCES brands ON DELETE CASCADE,
  email text NOT NULL CHECK (email = lower(email)),
  role text NOT NULL CHECK (role IN ('owner', 'marketer', 'designer', 'dyer')),
  token_hash text NOT NULL UNIQUE CHECK (token_hash ~ '^[0-9a-f]{64}$'),
  invited_by_id uuid REFERENCES people ON DELETE SET NULL,
  expires_at timestamptz NOT NULL,
  accepted_at timestamptz,
  withdrawn_at timestamptz,
  request_key uuid,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  UNIQUE (brand_id, id),
  UNIQUE (brand_id, request_key)
);
CREATE UNIQUE INDEX invitations_open ON invitations (brand_id, email)
  WHERE accepted_at IS NULL AND withdrawn_at IS NULL;

-- Who holds an invitation's token need not be one of the brand, and so sees no row of it.
CREATE FUNCTION brand_of_invitation(hash text) RETURNS uuid LANGUAGE sql STABLE
  SECURITY DEFINER SET search_path = public
  RETURN (SELECT brand_id FROM invitations WHERE token_hash = hash);
REVOKE ALL ON FUNCTION brand_of_invitation FROM PUBLIC;

-- The outbox: a row is written with what it is about, and sent by a job.
CREATE TABLE letters (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  kind text NOT NULL,
  recipient text NOT NULL,
  subject text NOT NULL,
  sealed_body text NOT NULL,
  created_at timestamptz NOT NULL DEFAULT now(),
  sent_at timestamptz,
  failed_at timestamptz,
  failure text
);
CREATE INDEX letters_unsent ON letters (created_at) WHERE sent_at IS NULL AND failed_at IS NULL;

CREATE TABLE activities (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL REFERENCES brands ON DELETE CASCADE,
  -- Null once the account is closed: "a former member".
  person_id uuid REFERENCES people ON DELETE SET NULL,
  action text NOT NULL,
  object_kind text,
  object_id uuid,
  object_label text,
  before jsonb,
  after jsonb,
  request_id uuid,
  created_at timestamptz NOT NULL DEFAULT now()
);
CREATE INDEX activities_newest ON activities (brand_id, created_at DESC, id);

-- As rate-limiter-flexible wants it.
CREATE TABLE rate_limits (
  key varchar(255) PRIMARY KEY,
  points integer NOT NULL DEFAULT 0,
  expire bigint
);
`

const POLICIES = /* sql */ `
SELECT make_tenant(one) FROM unnest(ARRAY[
  'lines', 'shades', 'photographs', 'readings', 'combinations', 'combination_places',
  'invitations', 'activities'
]::regclass[]) AS one;
ALTER TABLE memberships ENABLE ROW LEVEL SECURITY;
CREATE POLICY of_the_brand_or_person ON memberships
  USING (brand_id = app_brand() OR person_id = app_person())
  WITH CHECK (brand_id = app_brand());
ALTER TABLE brands ENABLE ROW LEVEL SECURITY;
CREATE POLICY of_the_brand_or_person ON brands
  USING (id = app_brand() OR id IN (SELECT brand_id FROM memberships WHERE person_id = app_person()))
  WITH CHECK (id = app_brand());
`

const DOWN = /* sql */ `
DROP TABLE rate_limits, activities, letters, invitations, recovery_codes, account_tokens;
ALTER TABLE sessions DROP COLUMN user_agent, DROP COLUMN address;
ALTER TABLE people
  DROP COLUMN totp_secret, DROP COLUMN totp_confirmed_at, DROP COLUMN totp_last_step;
DO $$ DECLARE one record; BEGIN
  FOR one IN SELECT tablename, policyname FROM pg_policies WHERE schemaname = 'public' LOOP
    EXECUTE format('DROP POLICY %I ON %I', one.policyname, one.tablename);
    EXECUTE format('ALTER TABLE %I DISABLE ROW LEVEL SECURITY', one.tablename);
  END LOOP;
END $$;
ALTER TABLE brands DROP COLUMN second_factor_required;
DROP FUNCTION brand_of_invitation;
DROP FUNCTION make_tenant;
DROP FUNCTION app_brand;
DROP FUNCTION app_person;
`

export const up: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(SCOPE + TABLES + POLICIES, { transaction })
}

export const down: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(DOWN, { transaction })
}
