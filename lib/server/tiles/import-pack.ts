import 'server-only';
import { randomUUID } from 'node:crypto';
import { QueryTypes, type Transaction } from 'sequelize';
import { database, inTransaction } from '../database';

export type Pack = {
  readonly pack: string;
  readonly version: string;
  readonly min_zoom: number;
  readonly max_zoom: number;
  /** West, south, east, north in degrees. */
  readonly bounds: readonly [number, number, number, number];
  readonly attribution: string;
  readonly type: string;
};

export type PackTile = {
  readonly z: number;
  readonly x: number;
  readonly y: number;
  readonly hash: string;
  readonly bytes: Buffer;
};

/**
 * Puts a pack's tiles into the database, all or none, and answers with its base map's id. A
 * version that is there already is left as it is and `tiles` is not asked. An older version of the
 * pack makes way: its sites go over to the new one. `tiles` is asked again if the database had to
 * undo the work to end a deadlock.
 */
export async function importPack(
  agencyId: string,
  pack: Pack,
  tiles: () => AsyncIterable<readonly PackTile[]>,
): Promise<string> {
  return inTransaction(async (transaction) => {
    const { id, isNew } = await enter(agencyId, pack, transaction);
    if (!isNew) return id;
    for await (const batch of tiles()) {
      if (batch.length > 0) await store(agencyId, id, pack.type, batch, transaction);
    }
    await replaceOlder(agencyId, id, pack.pack, transaction);
    return id;
  });
}

async function enter(
  agencyId: string,
  pack: Pack,
  transaction: Transaction,
): Promise<{ id: string; isNew: boolean }> {
  const id = randomUUID();
  // Writes before reading: two imports of one version meet here, and the later finds the row.
  await database.query(
    `INSERT INTO base_maps
       (id, agency_id, pack, version, min_zoom, max_zoom, bounds, attribution, created_at)
     VALUES (:id, :agencyId, :pack, :version, :min_zoom, :max_zoom, :bounds, :attribution, :now)
     ON DUPLICATE KEY UPDATE attribution = VALUES(attribution)`,
    {
      transaction,
      replacements: {
        ...pack,
        id,
        agencyId,
        bounds: JSON.stringify(pack.bounds),
        now: new Date(),
      },
    },
  );
  const [row] = await database.query<{ id: string }>(
    `SELECT id FROM base_maps
      WHERE agency_id = :agencyId AND pack = :pack AND version = :version`,
    {
      type: QueryTypes.SELECT,
      transaction,
      replacements: { agencyId, pack: pack.pack, version: pack.version },
    },
  );
  return { id: row!.id, isNew: row!.id === id };
}

async function store(
  agencyId: string,
  baseMapId: string,
  type: string,
  batch: readonly PackTile[],
  transaction: Transaction,
): Promise<void> {
  const pictures = new Map(batch.map((tile) => [tile.hash, tile.bytes]));
  await database.query(
    `INSERT INTO tiles (agency_id, hash, type, bytes) VALUES :rows
     ON DUPLICATE KEY UPDATE hash = VALUES(hash)`,
    {
      transaction,
      replacements: {
        rows: [...pictures].map(([hash, bytes]) => [agencyId, hash, type, bytes]),
      },
    },
  );
  await database.query(
    'INSERT INTO tile_places (base_map_id, z, x, y, agency_id, hash) VALUES :rows',
    {
      transaction,
      replacements: {
        rows: batch.map(({ z, x, y, hash }) => [baseMapId, z, x, y, agencyId, hash]),
      },
    },
  );
}

async function replaceOlder(
  agencyId: string,
  baseMapId: string,
  pack: string,
  transaction: Transaction,
): Promise<void> {
  const replacements = { agencyId, baseMapId, pack };
  const older = `SELECT id FROM base_maps
    WHERE agency_id = :agencyId AND pack = :pack AND id <> :baseMapId`;
  await database.query(
    `UPDATE sites SET base_map_id = :baseMapId
      WHERE agency_id = :agencyId AND base_map_id IN (${older})`,
    { transaction, replacements },
  );
  await database.query(
    `DELETE FROM base_maps WHERE agency_id = :agencyId AND pack = :pack AND id <> :baseMapId`,
    { transaction, replacements },
  );
  await database.query(
    `DELETE tiles FROM tiles
       LEFT JOIN tile_places
         ON tile_places.agency_id = tiles.agency_id AND tile_places.hash = tiles.hash
      WHERE tiles.agency_id = :agencyId AND tile_places.hash IS NULL`,
    { transaction, replacements },
  );
}
