import { ID, statements, TABLE_OPTIONS, type Migration } from './migration';

/**
 * Every table carries agency_id, and references between tables run over (agency_id, id): the
 * database itself refuses a row that would point into another agency.
 */
export const people: Migration = {
  name: '0001-people',
  up: statements(
    `CREATE TABLE IF NOT EXISTS agencies (
      id ${ID} NOT NULL PRIMARY KEY,
      name VARCHAR(200) NOT NULL,
      created_at DATETIME(3) NOT NULL
    ) ${TABLE_OPTIONS}`,

    `CREATE TABLE IF NOT EXISTS people (
      id ${ID} NOT NULL PRIMARY KEY,
      agency_id ${ID} NOT NULL,
      email VARCHAR(254) CHARACTER SET utf8mb4 COLLATE utf8mb4_nopad_bin NOT NULL,
      name VARCHAR(200) NOT NULL,
      password_hash VARCHAR(255) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      created_at DATETIME(3) NOT NULL,
      disabled_at DATETIME(3) NULL,
      UNIQUE KEY people_email (email),
      UNIQUE KEY people_agency (agency_id, id),
      CONSTRAINT people_agency FOREIGN KEY (agency_id) REFERENCES agencies (id)
    ) ${TABLE_OPTIONS}`,

    `CREATE TABLE IF NOT EXISTS memberships (
      agency_id ${ID} NOT NULL,
      person_id ${ID} NOT NULL,
      role VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      created_at DATETIME(3) NOT NULL,
      PRIMARY KEY (agency_id, person_id),
      CONSTRAINT memberships_role CHECK (role IN ('planner', 'safety-officer', 'crew', 'administrator')),
      CONSTRAINT memberships_person FOREIGN KEY (agency_id, person_id) REFERENCES people (agency_id, id)
    ) ${TABLE_OPTIONS}`,

    `CREATE TABLE IF NOT EXISTS sessions (
      id ${ID} NOT NULL PRIMARY KEY,
      agency_id ${ID} NOT NULL,
      person_id ${ID} NOT NULL,
      created_at DATETIME(3) NOT NULL,
      last_seen_at DATETIME(3) NOT NULL,
      expires_at DATETIME(3) NOT NULL,
      revoked_at DATETIME(3) NULL,
      KEY sessions_person (agency_id, person_id),
      CONSTRAINT sessions_person FOREIGN KEY (agency_id, person_id) REFERENCES people (agency_id, id)
    ) ${TABLE_OPTIONS}`,

    // Tries come before anyone is known, so agency_id stays empty where the account is unknown.
    `CREATE TABLE IF NOT EXISTS sign_in_attempts (
      id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      agency_id ${ID} NULL,
      account CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      address VARCHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      outcome VARCHAR(10) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      at DATETIME(3) NOT NULL,
      KEY sign_in_attempts_account (account, at),
      KEY sign_in_attempts_address (address, at),
      CONSTRAINT sign_in_attempts_outcome CHECK (outcome IN ('trying', 'failed', 'refused', 'signed-in')),
      CONSTRAINT sign_in_attempts_agency FOREIGN KEY (agency_id) REFERENCES agencies (id)
    ) ${TABLE_OPTIONS}`,

    `CREATE TABLE IF NOT EXISTS preferences (
      agency_id ${ID} NOT NULL,
      person_id ${ID} NOT NULL,
      choices JSON NOT NULL,
      changed_at DATETIME(3) NOT NULL,
      PRIMARY KEY (agency_id, person_id),
      CONSTRAINT preferences_person FOREIGN KEY (agency_id, person_id) REFERENCES people (agency_id, id)
    ) ${TABLE_OPTIONS}`,
  ),
};
