import type { Migration } from "@/lib/db/migrate";

/**
 * Access tokens, so that a program may ask for an evaluation without a browser's session. Only the digest of a token
 * is kept: whoever reads the table cannot use what stands in it.
 */
const UP = `
CREATE TABLE access_tokens (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  person_id uuid NOT NULL REFERENCES people(id) ON DELETE CASCADE,
  name text NOT NULL CHECK (length(trim(name)) BETWEEN 1 AND 80),
  hint text NOT NULL CHECK (length(hint) BETWEEN 4 AND 12),
  digest text NOT NULL UNIQUE CHECK (digest ~ '^[0-9a-f]{64}$'),
  created_at timestamptz NOT NULL DEFAULT now(),
  last_used_at timestamptz,
  expires_at timestamptz NOT NULL CHECK (expires_at > created_at),
  revoked_at timestamptz
);
CREATE INDEX access_tokens_person ON access_tokens (person_id);
`;

const DOWN = `DROP TABLE access_tokens;`;

export const up: Migration["up"] = async ({ queryInterface, transaction }) => {
  await queryInterface.sequelize.query(UP, { transaction });
};

export const down: Migration["down"] = async ({ queryInterface, transaction }) => {
  await queryInterface.sequelize.query(DOWN, { transaction });
};
