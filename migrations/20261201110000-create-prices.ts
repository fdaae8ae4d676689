import type { Migration } from "@/lib/db/migrate";

/**
 * The three tables that never mix: minutes (time tables), money (rate books) and carbon. Each is
 * versioned; what has been issued never changes, so that a comparison can name what priced it.
 * Without an organisation: what everybody starts with. Rates to six decimals, currency per unit.
 */
const VERSIONED = `
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  organisation_id uuid REFERENCES organisations(id) ON DELETE RESTRICT,
  label text NOT NULL CHECK (length(trim(label)) BETWEEN 1 AND 400),
  version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
  state text NOT NULL DEFAULT 'draft' CHECK (state IN ('draft', 'issued')),
  valid_from date NOT NULL,
  issued_at timestamptz,
  issued_by uuid REFERENCES people(id) ON DELETE RESTRICT,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now(),
  CHECK ((state = 'issued') = (issued_at IS NOT NULL))`;

const SOURCE = `source text NOT NULL CHECK (length(trim(source)) > 0)`;

const TABLES = `
CREATE TABLE rate_books (${VERSIONED},
  based_on_id uuid REFERENCES rate_books(id) ON DELETE RESTRICT,
  currency text NOT NULL CHECK (currency ~ '^[A-Z]{3}$'),
  minor_digits smallint NOT NULL CHECK (minor_digits BETWEEN 0 AND 3)
);
CREATE TABLE rate_lines (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  rate_book_id uuid NOT NULL REFERENCES rate_books(id) ON DELETE CASCADE,
  item text NOT NULL CHECK (length(item) BETWEEN 1 AND 120),
  unit text NOT NULL CHECK (unit IN ('h', 'kg', 'm', 'm2', 'm3', 'piece', 'kWh')),
  low numeric(14, 6) NOT NULL CHECK (low >= 0),
  likely numeric(14, 6) NOT NULL,
  high numeric(14, 6) NOT NULL,
  ${SOURCE},
  CHECK (low <= likely AND likely <= high),
  UNIQUE (rate_book_id, item)
);

CREATE TABLE time_tables (${VERSIONED},
  based_on_id uuid REFERENCES time_tables(id) ON DELETE RESTRICT
);
CREATE TABLE time_rules (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  time_table_id uuid NOT NULL REFERENCES time_tables(id) ON DELETE CASCADE,
  key text NOT NULL CHECK (key ~ '^[a-z][a-z0-9-]*$'),
  -- Rules of one driver may use what earlier ones give, so their order counts.
  position integer NOT NULL CHECK (position >= 0),
  operation text NOT NULL,
  driver text NOT NULL,
  category text NOT NULL,
  trade text,
  work_centre text,
  place text NOT NULL CHECK (place IN ('shop', 'site', 'office')),
  crew double precision NOT NULL CHECK (crew > 0),
  quantity jsonb NOT NULL,
  run_minutes jsonb,
  set_up_minutes jsonb,
  machine_minutes jsonb,
  gives text,
  uses jsonb NOT NULL,
  UNIQUE (time_table_id, key),
  UNIQUE (time_table_id, position)
);
CREATE TABLE time_constants (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  time_table_id uuid NOT NULL REFERENCES time_tables(id) ON DELETE CASCADE,
  name text NOT NULL CHECK (name ~ '^[a-z][A-Za-z0-9]*$'),
  number_value double precision,
  text_value text,
  label text NOT NULL,
  unit text NOT NULL,
  ${SOURCE},
  CHECK ((number_value IS NULL) <> (text_value IS NULL)),
  UNIQUE (time_table_id, name)
);
CREATE TABLE look_up_tables (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  time_table_id uuid NOT NULL REFERENCES time_tables(id) ON DELETE CASCADE,
  name text NOT NULL CHECK (name ~ '^[a-z][A-Za-z0-9]*$'),
  kind text NOT NULL CHECK (kind IN ('named', 'steps', 'linear')),
  label text NOT NULL,
  unit text NOT NULL,
  entries jsonb NOT NULL CHECK (jsonb_typeof(entries) = 'array'),
  UNIQUE (time_table_id, name)
);

CREATE TABLE carbon_tables (${VERSIONED},
  based_on_id uuid REFERENCES carbon_tables(id) ON DELETE RESTRICT
);
CREATE TABLE carbon_factors (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  carbon_table_id uuid NOT NULL REFERENCES carbon_tables(id) ON DELETE CASCADE,
  product text NOT NULL CHECK (product IN ('plate', 'section', 'threaded-bar', 'bolt', 'nut', 'washer', 'weld-metal')),
  kg_co2e_per_kg numeric(10, 4) NOT NULL CHECK (kg_co2e_per_kg >= 0),
  ${SOURCE},
  UNIQUE (carbon_table_id, product)
);
`;

const HEADS = ["rate_books", "time_tables", "carbon_tables"] as const;
const PARTS = [
  ["rate_lines", "rate_books", "rate_book_id"],
  ["time_rules", "time_tables", "time_table_id"],
  ["time_constants", "time_tables", "time_table_id"],
  ["look_up_tables", "time_tables", "time_table_id"],
  ["carbon_factors", "carbon_tables", "carbon_table_id"],
] as const;

const indexes = (table: string): string => `
CREATE UNIQUE INDEX ${table}_own ON ${table} (organisation_id, label, version) WHERE organisation_id IS NOT NULL;
CREATE UNIQUE INDEX ${table}_common ON ${table} (label, version) WHERE organisation_id IS NULL;
CREATE INDEX ${table}_current ON ${table} (organisation_id, valid_from) WHERE state = 'issued';
`;

/** What is issued stays as it is: the database refuses, whoever asks. */
const FREEZE = `
CREATE FUNCTION refuse_change_of_issued_prices() RETURNS trigger AS $$
BEGIN
  IF OLD.state = 'issued' THEN
    RAISE EXCEPTION 'An issued version of % cannot be changed; issue a new one.', TG_TABLE_NAME USING ERRCODE = 'check_violation';
  END IF;
  RETURN CASE WHEN TG_OP = 'DELETE' THEN OLD ELSE NEW END;
END $$ LANGUAGE plpgsql;

CREATE FUNCTION refuse_change_of_issued_price_rows() RETURNS trigger AS $$
DECLARE
  row_data jsonb := to_jsonb(CASE WHEN TG_OP = 'DELETE' THEN OLD ELSE NEW END);
  is_issued boolean;
BEGIN
  EXECUTE format('SELECT EXISTS (SELECT 1 FROM %I WHERE id = ANY ($1) AND state = ''issued'')', TG_ARGV[0])
    INTO is_issued
    USING ARRAY[(row_data ->> TG_ARGV[1])::uuid,
      (CASE WHEN TG_OP = 'INSERT' THEN row_data ELSE to_jsonb(OLD) END ->> TG_ARGV[1])::uuid];
  IF is_issued THEN
    RAISE EXCEPTION 'Rows of an issued version of % cannot be changed; issue a new one.', TG_ARGV[0] USING ERRCODE = 'check_violation';
  END IF;
  RETURN CASE WHEN TG_OP = 'DELETE' THEN OLD ELSE NEW END;
END $$ LANGUAGE plpgsql;
`;

const freezeHead = (table: string): string =>
  `CREATE TRIGGER ${table}_frozen BEFORE UPDATE OR DELETE ON ${table}
   FOR EACH ROW EXECUTE FUNCTION refuse_change_of_issued_prices();`;
const freezePart = ([table, head, key]: readonly string[]): string =>
  `CREATE TRIGGER ${table}_frozen BEFORE INSERT OR UPDATE OR DELETE ON ${table}
   FOR EACH ROW EXECUTE FUNCTION refuse_change_of_issued_price_rows('${head}', '${key}');`;

const UP = [TABLES, ...HEADS.map(indexes), FREEZE, ...HEADS.map(freezeHead), ...PARTS.map(freezePart)].join(
  "\n",
);

const DOWN = `
DROP TABLE carbon_factors, carbon_tables, look_up_tables, time_constants, time_rules, time_tables, rate_lines, rate_books;
DROP FUNCTION refuse_change_of_issued_price_rows();
DROP FUNCTION refuse_change_of_issued_prices();
`;

export const up: Migration["up"] = async ({ queryInterface, transaction }) => {
  await queryInterface.sequelize.query(UP, { transaction });
};

export const down: Migration["down"] = async ({ queryInterface, transaction }) => {
  await queryInterface.sequelize.query(DOWN, { transaction });
};
