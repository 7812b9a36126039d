import type { LonLat } from '../lib/geo';

/**
 * Web Mercator (EPSG:3857) as slippy maps cut it: the world is a square, 0 … 1 from its
 * north-west corner, 2^zoom tiles a side. It takes ellipsoidal latitude as if spherical, by
 * definition; that is why ground feet never turn into pixels by one factor.
 */
export type Square = readonly [x: number, y: number];

export const TILE_PX = 256;

export function toSquare([lon, lat]: LonLat): Square {
  const phi = (lat * Math.PI) / 180;
  return [lon / 360 + 0.5, 0.5 - Math.asinh(Math.tan(phi)) / (2 * Math.PI)];
}

export function fromSquare([x, y]: Square): LonLat {
  const phi = Math.atan(Math.sinh((0.5 - y) * 2 * Math.PI));
  return [(x - 0.5) * 360, (phi * 180) / Math.PI];
}

export type TileNumber = { readonly z: number; readonly x: number; readonly y: number };

/** The tile that holds the place. */
export function tileAt(place: LonLat, zoom: number): TileNumber {
  const [x, y] = toSquare(place);
  const tiles = 2 ** zoom;
  return { z: zoom, x: Math.floor(x * tiles), y: Math.floor(y * tiles) };
}
