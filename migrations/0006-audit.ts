import { ID, statements, TABLE_OPTIONS, type Migration } from './migration';

const refuse = (table: string, verb: 'UPDATE' | 'DELETE') =>
  `CREATE TRIGGER IF NOT EXISTS ${table}_no_${verb.toLowerCase()} BEFORE ${verb} ON ${table}
   FOR EACH ROW SIGNAL SQLSTATE '45000'
   SET MESSAGE_TEXT = '${table} is history: rows are only ever added'`;

/**
 * `number` counts the events of one subject without gaps and `hash` covers the event and the hash
 * before it, so that a row changed, taken out or put in shows. Facts are kept as the exact text
 * that was hashed.
 */
export const audit: Migration = {
  name: '0006-audit',
  up: statements(
    `CREATE TABLE IF NOT EXISTS audit_events (
      agency_id ${ID} NOT NULL,
      subject_kind VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      subject_id ${ID} NOT NULL,
      number INT UNSIGNED NOT NULL,
      action VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      person_id ${ID} NULL,
      at DATETIME(3) NOT NULL,
      facts TEXT NOT NULL,
      previous_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      PRIMARY KEY (agency_id, subject_kind, subject_id, number),
      KEY audit_events_at (agency_id, at),
      CONSTRAINT audit_events_agency FOREIGN KEY (agency_id) REFERENCES agencies (id),
      CONSTRAINT audit_events_person FOREIGN KEY (agency_id, person_id) REFERENCES people (agency_id, id)
    ) ${TABLE_OPTIONS}`,
    refuse('audit_events', 'UPDATE'),
    refuse('audit_events', 'DELETE'),
    refuse('layout_changes', 'UPDATE'),
    refuse('layout_changes', 'DELETE'),
  ),
};
