import { ID, statements, TABLE_OPTIONS, type Migration } from './migration';

/** A tile's bytes are kept once under their hash; many places (empty grass) share one. */
export const baseMaps: Migration = {
  name: '0002-base-maps',
  up: statements(
    `CREATE TABLE IF NOT EXISTS base_maps (
      id ${ID} NOT NULL PRIMARY KEY,
      agency_id ${ID} NOT NULL,
      pack VARCHAR(60) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      version VARCHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      min_zoom TINYINT UNSIGNED NOT NULL,
      max_zoom TINYINT UNSIGNED NOT NULL,
      bounds JSON NOT NULL,
      attribution VARCHAR(500) NOT NULL,
      created_at DATETIME(3) NOT NULL,
      UNIQUE KEY base_maps_pack (agency_id, pack, version),
      UNIQUE KEY base_maps_agency (agency_id, id),
      CONSTRAINT base_maps_agency FOREIGN KEY (agency_id) REFERENCES agencies (id)
    ) ${TABLE_OPTIONS}`,

    `CREATE TABLE IF NOT EXISTS tiles (
      agency_id ${ID} NOT NULL,
      hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      type VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      bytes MEDIUMBLOB NOT NULL,
      PRIMARY KEY (agency_id, hash),
      CONSTRAINT tiles_agency FOREIGN KEY (agency_id) REFERENCES agencies (id)
    ) ${TABLE_OPTIONS}`,

    `CREATE TABLE IF NOT EXISTS tile_places (
      base_map_id ${ID} NOT NULL,
      z TINYINT UNSIGNED NOT NULL,
      x INT UNSIGNED NOT NULL,
      y INT UNSIGNED NOT NULL,
      agency_id ${ID} NOT NULL,
      hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      PRIMARY KEY (base_map_id, z, x, y),
      KEY tile_places_tile (agency_id, hash),
      CONSTRAINT tile_places_base_map FOREIGN KEY (agency_id, base_map_id)
        REFERENCES base_maps (agency_id, id) ON DELETE CASCADE,
      CONSTRAINT tile_places_tile FOREIGN KEY (agency_id, hash) REFERENCES tiles (agency_id, hash)
    ) ${TABLE_OPTIONS}`,
  ),
};
