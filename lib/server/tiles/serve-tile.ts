import 'server-only';
import type { NextRequest } from 'next/server';
import type { SignedIn } from '../session';
import { findTile } from './find-tile';
import type { TileAddress } from './tile-address';

/**
 * A pack's version names its pictures for good, so a browser never needs to ask twice; `private`,
 * because a shared cache would hand an agency's map to whoever asks next.
 */
const CACHE = { 'cache-control': 'private, max-age=31536000, immutable' };

/** The tile's picture, 204 where the pack has none there, 304 where the browser holds it. */
export async function serveTile(
  person: SignedIn,
  address: TileAddress,
  request: NextRequest,
): Promise<Response> {
  const held = hashHeld(request.headers.get('if-none-match'));
  const tile = await findTile(person, address, held);
  if (!tile) return new Response(null, { status: 204, headers: CACHE });
  const headers = { ...CACHE, etag: `"${tile.hash}"` };
  if (!tile.picture) return new Response(null, { status: 304, headers });
  const { type, bytes } = tile.picture;
  return new Response(new Uint8Array(bytes), {
    headers: { ...headers, 'content-type': type, 'content-length': String(bytes.length) },
  });
}

/** The first hash named in If-None-Match; browsers send the one that they hold. */
const hashHeld = (header: string | null): string | null =>
  /"([0-9a-f]{64})"/.exec(header ?? '')?.[1] ?? null;
