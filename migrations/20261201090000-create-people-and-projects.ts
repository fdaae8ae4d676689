import type { Migration } from "@/lib/db/migrate";

/**
 * Firms, people, sign-ins, projects, nodes and what was calculated for them. Plain SQL, because the
 * checks and the append-only rule of the audit trail have no word in the query interface.
 */
const UP = `
CREATE TABLE organisations (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  name text NOT NULL UNIQUE CHECK (length(trim(name)) BETWEEN 1 AND 120),
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now()
);

CREATE TABLE people (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  organisation_id uuid NOT NULL REFERENCES organisations(id) ON DELETE RESTRICT,
  email text NOT NULL UNIQUE CHECK (email = lower(email) AND position('@' in email) > 1),
  name text NOT NULL CHECK (length(trim(name)) BETWEEN 1 AND 120),
  role text NOT NULL CHECK (role IN ('designer', 'estimator', 'fabricator', 'checker', 'admin')),
  password_hash text NOT NULL CHECK (password_hash LIKE '$argon2%'),
  deactivated_at timestamptz,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now()
);
CREATE INDEX people_organisation ON people (organisation_id);

CREATE TABLE sessions (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  person_id uuid NOT NULL REFERENCES people(id) ON DELETE CASCADE,
  created_at timestamptz NOT NULL DEFAULT now(),
  last_seen_at timestamptz NOT NULL,
  expires_at timestamptz NOT NULL CHECK (expires_at > created_at),
  revoked_at timestamptz
);
CREATE INDEX sessions_person ON sessions (person_id);

CREATE TABLE sign_in_attempts (
  id bigserial PRIMARY KEY,
  email text NOT NULL,
  address text NOT NULL,
  succeeded boolean NOT NULL,
  attempted_at timestamptz NOT NULL
);
CREATE INDEX sign_in_attempts_email ON sign_in_attempts (email, attempted_at);
CREATE INDEX sign_in_attempts_address ON sign_in_attempts (address, attempted_at);

CREATE TABLE projects (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  organisation_id uuid NOT NULL REFERENCES organisations(id) ON DELETE RESTRICT,
  name text NOT NULL CHECK (length(trim(name)) BETWEEN 1 AND 120),
  description text NOT NULL DEFAULT '',
  version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
  locked_at timestamptz,
  created_by uuid NOT NULL REFERENCES people(id) ON DELETE RESTRICT,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  UNIQUE (organisation_id, name)
);

CREATE TABLE project_members (
  project_id uuid NOT NULL REFERENCES projects(id) ON DELETE CASCADE,
  person_id uuid NOT NULL REFERENCES people(id) ON DELETE CASCADE,
  added_by uuid NOT NULL REFERENCES people(id) ON DELETE RESTRICT,
  created_at timestamptz NOT NULL DEFAULT now(),
  PRIMARY KEY (project_id, person_id)
);
CREATE INDEX project_members_person ON project_members (person_id);

CREATE TABLE nodes (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  project_id uuid NOT NULL REFERENCES projects(id) ON DELETE RESTRICT,
  reference text NOT NULL CHECK (length(trim(reference)) BETWEEN 1 AND 120),
  document jsonb NOT NULL CHECK (jsonb_typeof(document) = 'object' AND document->>'reference' = reference),
  version integer NOT NULL CHECK (version >= 1),
  saved_by uuid NOT NULL REFERENCES people(id) ON DELETE RESTRICT,
  saved_at timestamptz NOT NULL,
  created_at timestamptz NOT NULL DEFAULT now(),
  deleted_at timestamptz
);
-- A mark stands once on the register; a node taken off it gives the mark free.
CREATE UNIQUE INDEX nodes_project_reference ON nodes (project_id, reference) WHERE deleted_at IS NULL;

CREATE TABLE node_revisions (
  node_id uuid NOT NULL REFERENCES nodes(id) ON DELETE RESTRICT,
  version integer NOT NULL CHECK (version >= 1),
  document jsonb NOT NULL CHECK (jsonb_typeof(document) = 'object'),
  saved_by uuid NOT NULL REFERENCES people(id) ON DELETE RESTRICT,
  saved_at timestamptz NOT NULL,
  PRIMARY KEY (node_id, version)
);

CREATE TABLE node_exclusions (
  node_id uuid NOT NULL REFERENCES nodes(id) ON DELETE CASCADE,
  option_key text NOT NULL CHECK (length(option_key) BETWEEN 1 AND 60),
  excluded_by uuid NOT NULL REFERENCES people(id) ON DELETE RESTRICT,
  created_at timestamptz NOT NULL DEFAULT now(),
  PRIMARY KEY (node_id, option_key)
);

CREATE TABLE comparisons (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  node_id uuid NOT NULL,
  node_version integer NOT NULL,
  engine text NOT NULL CHECK (engine <> ''),
  prices_key text NOT NULL CHECK (prices_key <> ''),
  catalog_key text NOT NULL CHECK (catalog_key <> ''),
  summary jsonb NOT NULL CHECK (jsonb_typeof(summary) = 'object'),
  result jsonb NOT NULL CHECK (jsonb_typeof(result) = 'object'),
  created_by uuid NOT NULL REFERENCES people(id) ON DELETE RESTRICT,
  created_at timestamptz NOT NULL DEFAULT now(),
  FOREIGN KEY (node_id, node_version) REFERENCES node_revisions (node_id, version) ON DELETE RESTRICT
);
CREATE INDEX comparisons_node ON comparisons (node_id, node_version, created_at DESC);

CREATE TABLE audit_entries (
  id bigserial PRIMARY KEY,
  at timestamptz NOT NULL DEFAULT now(),
  actor_id uuid REFERENCES people(id) ON DELETE RESTRICT,
  organisation_id uuid NOT NULL REFERENCES organisations(id) ON DELETE RESTRICT,
  project_id uuid REFERENCES projects(id) ON DELETE RESTRICT,
  action text NOT NULL CHECK (action <> ''),
  subject_id text NOT NULL,
  detail jsonb NOT NULL DEFAULT '{}'
);
CREATE INDEX audit_entries_organisation ON audit_entries (organisation_id, at DESC);

-- A revision and an audit line are records of what happened: they are added, never altered.
CREATE FUNCTION refuse_to_alter_record() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION 'rows of % are never changed or removed', TG_TABLE_NAME;
END $$;
CREATE TRIGGER audit_entries_append_only BEFORE UPDATE OR DELETE ON audit_entries
  FOR EACH ROW EXECUTE FUNCTION refuse_to_alter_record();
CREATE TRIGGER node_revisions_append_only BEFORE UPDATE OR DELETE ON node_revisions
  FOR EACH ROW EXECUTE FUNCTION refuse_to_alter_record();
CREATE TRIGGER comparisons_append_only BEFORE UPDATE OR DELETE ON comparisons
  FOR EACH ROW EXECUTE FUNCTION refuse_to_alter_record();
`;

const DOWN = `
DROP TABLE audit_entries, comparisons, node_exclusions, node_revisions, nodes, project_members, projects,
  sign_in_attempts, sessions, people, organisations;
DROP FUNCTION refuse_to_alter_record();
`;

export const up: Migration["up"] = async ({ queryInterface, transaction }) => {
  await queryInterface.sequelize.query(UP, { transaction });
};

export const down: Migration["down"] = async ({ queryInterface, transaction }) => {
  await queryInterface.sequelize.query(DOWN, { transaction });
};
