/** A WGS 84 place, longitude first (RFC 7946). A third number, a height, is carried but not used. */
export type LonLat = readonly [lon: number, lat: number];

/** A place in the local plane: metres east (x) and north (y) of the plane's origin. */
export type Vec = { readonly x: number; readonly y: number };

/** Eight decimals are 1.1 mm of latitude: finer than any tape, and short in a file. */
export const COORDINATE_DECIMALS = 8;

/** Every edit stores positions through here, so that a saved layout reads back identical. */
export function quantise([lon, lat]: LonLat): LonLat {
  return [roundTo8(lon), roundTo8(lat)];
}

function roundTo8(degrees: number): number {
  const rounded = Number(degrees.toFixed(COORDINATE_DECIMALS));
  return rounded === 0 ? 0 : rounded; // never −0, which JSON would write as 0
}

export const samePosition = (a: LonLat, b: LonLat): boolean => a[0] === b[0] && a[1] === b[1];
