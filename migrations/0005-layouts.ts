import { ID, statements, TABLE_OPTIONS, type Migration } from './migration';

/** Every version of a document stays in layout_changes; `layouts` holds the newest again. */
export const layouts: Migration = {
  name: '0005-layouts',
  up: statements(
    `CREATE TABLE IF NOT EXISTS layouts (
      id ${ID} NOT NULL PRIMARY KEY,
      agency_id ${ID} NOT NULL,
      site_id ${ID} NOT NULL,
      name VARCHAR(200) NULL,
      version INT UNSIGNED NOT NULL,
      document JSON NOT NULL,
      pieces INT UNSIGNED NOT NULL,
      created_at DATETIME(3) NOT NULL,
      drawn_by ${ID} NULL,
      saved_at DATETIME(3) NOT NULL,
      saved_by ${ID} NULL,
      UNIQUE KEY layouts_agency (agency_id, id),
      KEY layouts_site (agency_id, site_id, saved_at, id),
      CONSTRAINT layouts_site FOREIGN KEY (agency_id, site_id) REFERENCES sites (agency_id, id),
      CONSTRAINT layouts_drawn_by FOREIGN KEY (agency_id, drawn_by) REFERENCES people (agency_id, id),
      CONSTRAINT layouts_saved_by FOREIGN KEY (agency_id, saved_by) REFERENCES people (agency_id, id)
    ) ${TABLE_OPTIONS}`,

    `CREATE TABLE IF NOT EXISTS layout_changes (
      layout_id ${ID} NOT NULL,
      version INT UNSIGNED NOT NULL,
      agency_id ${ID} NOT NULL,
      label VARCHAR(200) NOT NULL,
      document JSON NOT NULL,
      at DATETIME(3) NOT NULL,
      person_id ${ID} NULL,
      PRIMARY KEY (layout_id, version),
      CONSTRAINT layout_changes_layout FOREIGN KEY (agency_id, layout_id) REFERENCES layouts (agency_id, id),
      CONSTRAINT layout_changes_person FOREIGN KEY (agency_id, person_id) REFERENCES people (agency_id, id)
    ) ${TABLE_OPTIONS}`,
  ),
};
