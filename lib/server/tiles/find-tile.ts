import 'server-only';
import { QueryTypes } from 'sequelize';
import { database } from '../database';
import { notFound } from '../problems';
import type { SignedIn } from '../session';
import type { TileAddress } from './tile-address';

type Row = { hash: string | null; type: string | null; bytes: Buffer | null };

export type FoundTile = {
  readonly hash: string;
  /** Null where the caller holds the tile of `heldHash` already. */
  readonly picture: { readonly type: string; readonly bytes: Buffer } | null;
};

/**
 * The tile at the address in the person's agency; null where the pack has none there. Throws
 * not-found where the agency has no such pack. One query, and no bytes for a tile that is held.
 */
export async function findTile(
  person: Pick<SignedIn, 'agencyId'>,
  address: TileAddress,
  heldHash: string | null,
): Promise<FoundTile | null> {
  const [row] = await database.query<Row>(
    `SELECT tile_places.hash, tiles.type, tiles.bytes
       FROM base_maps
       LEFT JOIN tile_places ON tile_places.base_map_id = base_maps.id
        AND tile_places.z = :z AND tile_places.x = :x AND tile_places.y = :y
       LEFT JOIN tiles ON tiles.agency_id = base_maps.agency_id
        AND tiles.hash = tile_places.hash AND tiles.hash <> :heldHash
      WHERE base_maps.agency_id = :agencyId
        AND base_maps.pack = :pack AND base_maps.version = :version`,
    {
      type: QueryTypes.SELECT,
      replacements: { ...address, agencyId: person.agencyId, heldHash: heldHash ?? '' },
    },
  );
  if (!row) throw notFound('base map');
  const { hash, type, bytes } = row;
  if (hash === null) return null;
  return { hash, picture: type !== null && bytes !== null ? { type, bytes } : null };
}
