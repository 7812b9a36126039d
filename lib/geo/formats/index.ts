import type { LonLat } from '../position';
import { formatDegrees, parseDegrees } from './degrees';
import { formatGrid, parseGrid } from './grid';

export { formatDegrees, formatGrid, parseDegrees, parseGrid };
export type { DegreeStyle } from './degrees';

/** How a person wants coordinates written. */
export const COORDINATE_FORMATS = ['decimal', 'minutes', 'seconds', 'grid'] as const;
export type CoordinateFormat = (typeof COORDINATE_FORMATS)[number];

export const FORMAT_WORDS: Record<CoordinateFormat, string> = {
  decimal: 'degrees',
  minutes: 'degrees and minutes',
  seconds: 'degrees, minutes, seconds',
  grid: 'US National Grid',
};

/** A place in the format wanted; beyond the grid's latitudes, degrees. */
export function formatPosition(place: LonLat, format: CoordinateFormat): string {
  if (format !== 'grid') return formatDegrees(place, format);
  return formatGrid(place) ?? formatDegrees(place, 'decimal');
}

export type ReadPosition =
  { readonly ok: true; readonly place: LonLat } | { readonly ok: false; readonly message: string };

/** Reads a place in any supported format, or says what is wrong with it. */
export function parsePosition(text: string): ReadPosition {
  const grid = parseGrid(text);
  if (grid) return { ok: true, place: grid };
  const place = parseDegrees(text);
  if (place === null) {
    return {
      ok: false,
      message:
        'Not understood. Write latitude and longitude (38.889463, -77.035242 or 38°53′22″ N 77°02′07″ W) or a grid reference (18S UJ 23483 06479).',
    };
  }
  return typeof place === 'string' ? { ok: false, message: place } : { ok: true, place };
}
