import { forward, inverse } from 'mgrs';
import type { LonLat } from '../position';

/** The grid covers 80° S to 84° N; beyond lies the polar grid, which nobody here stands on. */
const SOUTHERNMOST = -80;
const NORTHERNMOST = 84;

/** Digits of each of easting and northing: 5 is a metre. */
export type GridDigits = 3 | 4 | 5;

/**
 * "18S UJ 23483 06479": US National Grid (FGDC-STD-011-2001), the same squares as MGRS on WGS 84.
 * Truncated, never rounded: the reference names the square that the place lies in.
 * Null beyond the grid's latitudes.
 */
export function formatGrid([lon, lat]: LonLat, digits: GridDigits = 5): string | null {
  if (lat < SOUTHERNMOST || lat > NORTHERNMOST) return null;
  const reference = forward([lon, lat], digits);
  const found = /^(\d{1,2}[C-X])([A-Z]{2})(\d*)$/.exec(reference);
  if (!found) return null;
  const [, zone, square, numbers] = found;
  return `${zone} ${square} ${numbers!.slice(0, digits)} ${numbers!.slice(digits)}`;
}

/** The south-west corner of the square named; null where the text is no grid reference. */
export function parseGrid(text: string): LonLat | null {
  const tidy = text.toUpperCase().replace(/\s+/g, '');
  const found = /^(\d{1,2})[C-HJ-NP-X][A-HJ-NP-Z]{2}(\d{2,10})$/.exec(tidy);
  if (!found || found[2]!.length % 2 === 1 || Number(found[1]) > 60) return null;
  try {
    const [west, south] = inverse(tidy);
    return [west, south];
  } catch {
    // The library throws on letters that no square of that zone has; to us that is "not a reference".
    return null;
  }
}
