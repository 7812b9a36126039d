import { ID, statements, TABLE_OPTIONS, type Migration } from './migration';

/** `version` counts the saves of the site's ground; every save compares it and sets it. */
export const sites: Migration = {
  name: '0003-sites',
  up: statements(
    `CREATE TABLE IF NOT EXISTS sites (
      id ${ID} NOT NULL PRIMARY KEY,
      agency_id ${ID} NOT NULL,
      name VARCHAR(200) NOT NULL,
      place VARCHAR(300) NULL,
      notes TEXT NULL,
      longitude DOUBLE NULL,
      latitude DOUBLE NULL,
      base_map_id ${ID} NULL,
      version INT UNSIGNED NOT NULL,
      overhead_none_known_as_of VARCHAR(40) NULL,
      ground_saved_at DATETIME(3) NOT NULL,
      ground_saved_by ${ID} NULL,
      created_at DATETIME(3) NOT NULL,
      changed_at DATETIME(3) NOT NULL,
      UNIQUE KEY sites_agency (agency_id, id),
      KEY sites_name (agency_id, name, id),
      CONSTRAINT sites_agency FOREIGN KEY (agency_id) REFERENCES agencies (id),
      CONSTRAINT sites_base_map FOREIGN KEY (agency_id, base_map_id) REFERENCES base_maps (agency_id, id),
      CONSTRAINT sites_saved_by FOREIGN KEY (agency_id, ground_saved_by) REFERENCES people (agency_id, id)
    ) ${TABLE_OPTIONS}`,

    // An id is whatever a file brought, compared byte by byte so that "a" and "A" stay two.
    `CREATE TABLE IF NOT EXISTS site_features (
      site_id ${ID} NOT NULL,
      feature_id VARCHAR(200) CHARACTER SET utf8mb4 COLLATE utf8mb4_nopad_bin NOT NULL,
      agency_id ${ID} NOT NULL,
      kind VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      place INT UNSIGNED NOT NULL,
      feature JSON NOT NULL,
      PRIMARY KEY (site_id, feature_id),
      KEY site_features_order (site_id, place),
      CONSTRAINT site_features_site FOREIGN KEY (agency_id, site_id) REFERENCES sites (agency_id, id)
    ) ${TABLE_OPTIONS}`,

    `CREATE TABLE IF NOT EXISTS owners_answers (
      site_id ${ID} NOT NULL,
      class VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      agency_id ${ID} NOT NULL,
      answer VARCHAR(10) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      entry JSON NOT NULL,
      PRIMARY KEY (site_id, class),
      CONSTRAINT owners_answers_site FOREIGN KEY (agency_id, site_id) REFERENCES sites (agency_id, id)
    ) ${TABLE_OPTIONS}`,

    `CREATE TABLE IF NOT EXISTS locates (
      site_id ${ID} NOT NULL,
      place INT UNSIGNED NOT NULL,
      agency_id ${ID} NOT NULL,
      ticket VARCHAR(100) NOT NULL,
      entry JSON NOT NULL,
      PRIMARY KEY (site_id, place),
      CONSTRAINT locates_site FOREIGN KEY (agency_id, site_id) REFERENCES sites (agency_id, id)
    ) ${TABLE_OPTIONS}`,
  ),
};
