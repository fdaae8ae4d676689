import type { Migration } from "@/lib/db/migrate";

/**
 * Sections, angles, steels, fasteners and stock plates. Every row names its source. Lengths in mm, areas in mm2,
 * strengths in N/mm2. The serial keeps the order of the tables they are read from.
 */
const UP = `
CREATE TABLE sections (
  id serial PRIMARY KEY,
  designation text NOT NULL UNIQUE CHECK (designation <> ''),
  family text NOT NULL CHECK (family IN ('IPE', 'IPE A', 'IPE O', 'HE A', 'HE B', 'HE M', 'UB', 'UC', 'custom')),
  depth_mm double precision NOT NULL,
  width_mm double precision NOT NULL,
  web_thickness_mm double precision NOT NULL CHECK (web_thickness_mm > 0),
  flange_thickness_mm double precision NOT NULL CHECK (flange_thickness_mm > 0),
  root_radius_mm double precision NOT NULL CHECK (root_radius_mm > 0),
  mass_kg_per_m double precision NOT NULL CHECK (mass_kg_per_m > 0),
  source text NOT NULL CHECK (source <> ''),
  CHECK (2 * (flange_thickness_mm + root_radius_mm) < depth_mm),
  CHECK (web_thickness_mm + 2 * root_radius_mm < width_mm)
);

CREATE TABLE angles (
  id serial PRIMARY KEY,
  designation text NOT NULL UNIQUE CHECK (designation <> ''),
  leg_a_mm double precision NOT NULL,
  leg_b_mm double precision NOT NULL,
  thickness_mm double precision NOT NULL CHECK (thickness_mm > 0 AND thickness_mm < least(leg_a_mm, leg_b_mm)),
  root_radius_mm double precision NOT NULL CHECK (root_radius_mm > 0),
  toe_radius_mm double precision NOT NULL CHECK (toe_radius_mm > 0),
  source text NOT NULL CHECK (source <> '')
);

CREATE TABLE steels (
  id serial PRIMARY KEY,
  standard text NOT NULL CHECK (standard <> ''),
  grade text NOT NULL CHECK (grade <> ''),
  strength_table text NOT NULL CHECK (strength_table IN ('product-standard', 'en1993-1-1-table-3.1')),
  over_mm double precision NOT NULL CHECK (over_mm >= 0),
  up_to_mm double precision NOT NULL CHECK (up_to_mm > over_mm),
  yield_mpa double precision NOT NULL CHECK (yield_mpa > 0),
  ultimate_mpa double precision NOT NULL CHECK (ultimate_mpa >= yield_mpa),
  source text NOT NULL CHECK (source <> ''),
  UNIQUE (strength_table, grade, over_mm)
);

CREATE TABLE fasteners (
  id serial PRIMARY KEY,
  size text NOT NULL UNIQUE CHECK (size ~ '^M[0-9]{1,2}$'),
  diameter_mm double precision NOT NULL CHECK (diameter_mm > 0),
  pitch_mm double precision NOT NULL CHECK (pitch_mm > 0),
  stress_area_mm2 double precision NOT NULL CHECK (stress_area_mm2 > 0),
  hole_mm double precision NOT NULL CHECK (hole_mm > diameter_mm),
  across_flats_mm double precision NOT NULL CHECK (across_flats_mm > diameter_mm),
  across_points_mm double precision NOT NULL CHECK (across_points_mm > across_flats_mm),
  head_height_mm double precision NOT NULL CHECK (head_height_mm > 0),
  nut_height_mm double precision NOT NULL CHECK (nut_height_mm > 0),
  washer_diameter_mm double precision NOT NULL CHECK (washer_diameter_mm > hole_mm),
  washer_thickness_mm double precision NOT NULL CHECK (washer_thickness_mm > 0),
  preloaded_across_flats_mm double precision,
  preloaded_across_points_mm double precision,
  preloaded_nut_height_mm double precision,
  preloaded_nut_height_hv_mm double precision,
  preloaded_washer_diameter_mm double precision,
  preloaded_washer_thickness_mm double precision,
  source text NOT NULL CHECK (source <> ''),
  -- An assembly of EN 14399 is there as a whole or not at all; only part 4 (HV) may lack the size.
  CHECK (num_nonnulls(preloaded_across_flats_mm, preloaded_across_points_mm, preloaded_nut_height_mm,
    preloaded_washer_diameter_mm, preloaded_washer_thickness_mm) IN (0, 5)),
  CHECK (preloaded_nut_height_hv_mm IS NULL OR preloaded_nut_height_mm IS NOT NULL)
);

CREATE TABLE fastener_grades (
  id serial PRIMARY KEY,
  name text NOT NULL UNIQUE CHECK (name ~ '^[0-9]{1,2}[.][0-9]$'),
  yield_mpa double precision NOT NULL CHECK (yield_mpa > 0),
  ultimate_mpa double precision NOT NULL CHECK (ultimate_mpa >= yield_mpa),
  alpha_v double precision NOT NULL CHECK (alpha_v > 0 AND alpha_v <= 1),
  source text NOT NULL CHECK (source <> '')
);

-- Without an organisation: the list that everybody starts with. An organisation that sets a list has its own, whole.
CREATE TABLE stock_plates (
  id serial PRIMARY KEY,
  organisation_id uuid REFERENCES organisations(id) ON DELETE CASCADE,
  thickness_mm double precision NOT NULL CHECK (thickness_mm > 0),
  source text NOT NULL CHECK (source <> '')
);
CREATE UNIQUE INDEX stock_plates_organisation ON stock_plates (organisation_id, thickness_mm) WHERE organisation_id IS NOT NULL;
CREATE UNIQUE INDEX stock_plates_common ON stock_plates (thickness_mm) WHERE organisation_id IS NULL;
`;

const DOWN = `DROP TABLE stock_plates, fastener_grades, fasteners, steels, angles, sections;`;

export const up: Migration["up"] = async ({ queryInterface, transaction }) => {
  await queryInterface.sequelize.query(UP, { transaction });
};

export const down: Migration["down"] = async ({ queryInterface, transaction }) => {
  await queryInterface.sequelize.query(DOWN, { transaction });
};
