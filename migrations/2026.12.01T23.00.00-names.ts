import type { Migrate } from './umzug'

/*
 * Ideas for names, and what is made of them. A shade's `name` is from now on the text of its
 * approved idea and nothing else: a name that was typed becomes a draft, but for a retired shade's,
 * which is on ball bands already.
 */
const UP = /* sql */ `
CREATE TABLE naming_settings (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  line_id uuid NOT NULL UNIQUE,
  label_width double precision NOT NULL CHECK (label_width > 0),
  label_size double precision NOT NULL CHECK (label_size > 0),
  label_lines integer NOT NULL CHECK (label_lines IN (1, 2)),
  care text NOT NULL DEFAULT '',
  themes jsonb NOT NULL DEFAULT '[]',
  print_on date,
  frozen_at timestamptz,
  version integer NOT NULL DEFAULT 1,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  UNIQUE (brand_id, id),
  FOREIGN KEY (brand_id, line_id) REFERENCES lines (brand_id, id) ON DELETE CASCADE
);
CREATE INDEX naming_settings_due ON naming_settings (print_on) WHERE frozen_at IS NULL;

-- Who decides besides the owners. Whoever leaves the brand decides no more.
CREATE TABLE name_reviewers (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  line_id uuid NOT NULL,
  person_id uuid NOT NULL,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  UNIQUE (line_id, person_id),
  FOREIGN KEY (brand_id, line_id) REFERENCES lines (brand_id, id) ON DELETE CASCADE,
  FOREIGN KEY (brand_id, person_id) REFERENCES memberships (brand_id, person_id) ON DELETE CASCADE
);

CREATE TABLE name_ideas (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  line_id uuid NOT NULL,
  shade_id uuid,
  text text NOT NULL CHECK (text <> ''),
  note text NOT NULL DEFAULT '',
  state text NOT NULL DEFAULT 'draft'
    CHECK (state IN ('draft', 'in-review', 'approved', 'returned', 'put-by')),
  state_since timestamptz NOT NULL DEFAULT now(),
  round integer NOT NULL DEFAULT 0,
  author_id uuid REFERENCES people ON DELETE SET NULL,
  worded_by_id uuid REFERENCES people ON DELETE SET NULL,
  findings jsonb,
  checked_at timestamptz,
  wording_reason text NOT NULL DEFAULT '',
  unlocked_at timestamptz,
  request_key uuid,
  version integer NOT NULL DEFAULT 1,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  deleted_at timestamptz,
  UNIQUE (brand_id, id),
  UNIQUE (brand_id, request_key),
  CHECK (shade_id IS NOT NULL OR state NOT IN ('in-review', 'approved')),
  FOREIGN KEY (brand_id, line_id) REFERENCES lines (brand_id, id) ON DELETE CASCADE,
  FOREIGN KEY (brand_id, shade_id) REFERENCES shades (brand_id, id) ON DELETE CASCADE
);
CREATE UNIQUE INDEX name_ideas_one_approved ON name_ideas (shade_id)
  WHERE state = 'approved' AND deleted_at IS NULL;
CREATE INDEX name_ideas_shade ON name_ideas (shade_id) WHERE deleted_at IS NULL;
CREATE INDEX name_ideas_heap ON name_ideas (line_id, created_at DESC, id)
  WHERE shade_id IS NULL AND deleted_at IS NULL;
CREATE INDEX name_ideas_state ON name_ideas (line_id, state, state_since) WHERE deleted_at IS NULL;

-- Every move of an idea, for good: what it said then, who moved it, and why.
CREATE TABLE name_moves (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  line_id uuid NOT NULL,
  idea_id uuid NOT NULL,
  move text NOT NULL,
  from_state text,
  to_state text NOT NULL,
  text text NOT NULL,
  shade_id uuid,
  reason text NOT NULL DEFAULT '',
  round integer NOT NULL,
  person_id uuid REFERENCES people ON DELETE SET NULL,
  told_at timestamptz,
  created_at timestamptz NOT NULL DEFAULT clock_timestamp(),
  FOREIGN KEY (brand_id, line_id) REFERENCES lines (brand_id, id) ON DELETE CASCADE,
  FOREIGN KEY (brand_id, idea_id) REFERENCES name_ideas (brand_id, id) ON DELETE CASCADE
);
CREATE INDEX name_moves_idea ON name_moves (idea_id, created_at);
CREATE INDEX name_moves_line ON name_moves (line_id, created_at DESC, id);
CREATE INDEX name_moves_untold ON name_moves (created_at)
  WHERE told_at IS NULL AND move IN ('approve', 'return', 'put-by', 'displace', 'reopen');

-- What a reviewer thinks of an idea, in the round it was sent for.
CREATE TABLE name_votes (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  idea_id uuid NOT NULL,
  round integer NOT NULL,
  person_id uuid NOT NULL REFERENCES people ON DELETE CASCADE,
  vote text NOT NULL CHECK (vote IN ('yes', 'unsure', 'no')),
  comment text NOT NULL DEFAULT '',
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  UNIQUE (idea_id, round, person_id),
  FOREIGN KEY (brand_id, idea_id) REFERENCES name_ideas (brand_id, id) ON DELETE CASCADE
);

CREATE TABLE name_remarks (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  idea_id uuid NOT NULL,
  person_id uuid REFERENCES people ON DELETE SET NULL,
  text text NOT NULL CHECK (text <> ''),
  request_key uuid,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  UNIQUE (brand_id, request_key),
  FOREIGN KEY (brand_id, idea_id) REFERENCES name_ideas (brand_id, id) ON DELETE CASCADE
);
CREATE INDEX name_remarks_idea ON name_remarks (idea_id, created_at);

-- Who searched which register when: a record, not a clearance.
CREATE TABLE name_searches (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  brand_id uuid NOT NULL,
  idea_id uuid NOT NULL,
  register text NOT NULL CHECK (register <> ''),
  searched_by text NOT NULL CHECK (searched_by <> ''),
  searched_on date NOT NULL,
  outcome text NOT NULL CHECK (outcome IN ('nothing found', 'something found')),
  note text NOT NULL DEFAULT '',
  recorded_by_id uuid REFERENCES people ON DELETE SET NULL,
  request_key uuid,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  UNIQUE (brand_id, request_key),
  FOREIGN KEY (brand_id, idea_id) REFERENCES name_ideas (brand_id, id) ON DELETE CASCADE
);
CREATE INDEX name_searches_idea ON name_searches (idea_id, searched_on);

SELECT make_tenant(one) FROM unnest(ARRAY[
  'naming_settings', 'name_reviewers', 'name_ideas', 'name_moves', 'name_votes', 'name_remarks',
  'name_searches'
]::regclass[]) AS one;

INSERT INTO name_ideas (brand_id, line_id, shade_id, text, state, deleted_at)
  SELECT brand_id, line_id, id, name, CASE status WHEN 'retired' THEN 'approved' ELSE 'draft' END, NULL
  FROM shades WHERE name IS NOT NULL;
INSERT INTO name_moves (brand_id, line_id, idea_id, move, to_state, text, shade_id, round)
  SELECT brand_id, line_id, id, 'add', state, text, shade_id, 0 FROM name_ideas;
UPDATE shades SET name = NULL WHERE name IS NOT NULL AND status <> 'retired';
`

const DOWN = /* sql */ `
UPDATE shades SET name = i.text FROM name_ideas i
  WHERE i.shade_id = shades.id AND i.state = 'draft' AND i.deleted_at IS NULL
    AND shades.name IS NULL;
DROP TABLE name_searches, name_remarks, name_votes, name_moves, name_ideas, name_reviewers,
  naming_settings;
`

export const up: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(UP, { transaction })
}

export const down: Migrate = async ({ query, transaction }) => {
  await query.sequelize.query(DOWN, { transaction })
}
