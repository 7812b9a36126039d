import { ID, statements, TABLE_OPTIONS, type Migration } from './migration';

/** A limit set is never changed: a new one gets the next number, and the highest is in force. */
export const kitsAndLimits: Migration = {
  name: '0004-kits-and-limits',
  up: statements(
    `CREATE TABLE IF NOT EXISTS kits (
      id ${ID} NOT NULL PRIMARY KEY,
      agency_id ${ID} NOT NULL,
      name VARCHAR(200) NOT NULL,
      created_at DATETIME(3) NOT NULL,
      UNIQUE KEY kits_agency (agency_id, id),
      CONSTRAINT kits_agency FOREIGN KEY (agency_id) REFERENCES agencies (id)
    ) ${TABLE_OPTIONS}`,

    `CREATE TABLE IF NOT EXISTS kit_items (
      kit_id ${ID} NOT NULL,
      place INT UNSIGNED NOT NULL,
      agency_id ${ID} NOT NULL,
      kind VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      length_ft DOUBLE NULL,
      diameter_in DOUBLE NULL,
      count INT UNSIGNED NOT NULL,
      PRIMARY KEY (kit_id, place),
      CONSTRAINT kit_items_kit FOREIGN KEY (agency_id, kit_id) REFERENCES kits (agency_id, id)
    ) ${TABLE_OPTIONS}`,

    `CREATE TABLE IF NOT EXISTS limit_sets (
      agency_id ${ID} NOT NULL,
      number INT UNSIGNED NOT NULL,
      name VARCHAR(200) NOT NULL,
      overrides JSON NOT NULL,
      acceptance_max_ohm DOUBLE NULL,
      authority VARCHAR(500) NULL,
      set_at DATETIME(3) NOT NULL,
      set_by ${ID} NULL,
      PRIMARY KEY (agency_id, number),
      CONSTRAINT limit_sets_agency FOREIGN KEY (agency_id) REFERENCES agencies (id),
      CONSTRAINT limit_sets_set_by FOREIGN KEY (agency_id, set_by) REFERENCES people (agency_id, id)
    ) ${TABLE_OPTIONS}`,
  ),
};
