import type { LonLat } from '../position';

/** Ways of writing latitude and longitude. */
export type DegreeStyle = 'decimal' | 'minutes' | 'seconds';

/** Decimals that keep a foot apart in each style: 1e-6° is 0.11 m, 0.0001′ 0.19 m, 0.01″ 0.31 m. */
const DECIMALS: Record<DegreeStyle, number> = { decimal: 6, minutes: 4, seconds: 2 };

/** "38.889463° N, 77.035242° W", "38°53.3678′ N …" or "38°53′22.07″ N …". */
export function formatDegrees([lon, lat]: LonLat, style: DegreeStyle): string {
  return `${oneAxis(lat, style, 'N', 'S')}, ${oneAxis(lon, style, 'E', 'W')}`;
}

function oneAxis(value: number, style: DegreeStyle, positive: string, negative: string): string {
  const side = value < 0 ? negative : positive;
  const size = Math.abs(value);
  const decimals = DECIMALS[style];
  if (style === 'decimal') return `${size.toFixed(decimals)}° ${side}`;
  // Round once, at the smallest unit, so that 59.999″ carries instead of printing 60.00″.
  const perDegree = style === 'minutes' ? 60 : 3600;
  const scale = 10 ** decimals;
  const units = Math.round(size * perDegree * scale);
  const whole = Math.floor(units / (perDegree * scale));
  const rest = units - whole * perDegree * scale;
  if (style === 'minutes') return `${whole}°${(rest / scale).toFixed(decimals)}′ ${side}`;
  const minutes = Math.floor(rest / (60 * scale));
  const seconds = (rest - minutes * 60 * scale) / scale;
  return `${whole}°${minutes}′${seconds.toFixed(decimals)}″ ${side}`;
}

type Axis = { readonly degrees: number; readonly side: 'lat' | 'lon' | null };

/**
 * Reads latitude and longitude in any of the styles. Two bare numbers are latitude, then
 * longitude, as people say them; a letter (N, S, E, W) settles the order otherwise.
 * Null where the text isn't in degrees at all; a sentence where it is, but can't be so.
 */
export function parseDegrees(text: string): LonLat | string | null {
  const parts = splitPair(text);
  if (!parts) return null;
  const axes = parts.map(readAxis);
  const [first, second] = axes;
  if (!first || !second) return null;
  if (typeof first === 'string') return first;
  if (typeof second === 'string') return second;
  if (first.side !== null && first.side === second.side) {
    return `both numbers are ${first.side === 'lat' ? 'latitudes' : 'longitudes'}`;
  }
  const lonFirst = first.side === 'lon' || second.side === 'lat';
  const [lat, lon] = lonFirst ? [second.degrees, first.degrees] : [first.degrees, second.degrees];
  if (Math.abs(lat) > 90) return `latitude ${lat} lies beyond 90°`;
  if (Math.abs(lon) > 180) return `longitude ${lon} lies beyond 180°`;
  return [lon, lat];
}

/** Splits at a comma, at a letter of the compass, or at the space between two numbers. */
function splitPair(text: string): [string, string] | null {
  const tidy = text.trim().toUpperCase();
  const byComma = tidy.split(/\s*[,;]\s*/);
  if (byComma.length === 2) return [byComma[0]!, byComma[1]!];
  const after = /^(.*?[NSEW])\s*([^NSEW].*[NSEW])$/.exec(tidy);
  if (after) return [after[1]!, after[2]!];
  const before = /^([NSEW].*?)\s+([NSEW].*)$/.exec(tidy);
  if (before) return [before[1]!, before[2]!];
  const bare = /^(-?\d+(?:\.\d+)?)\s+(-?\d+(?:\.\d+)?)$/.exec(tidy);
  return bare ? [bare[1]!, bare[2]!] : null;
}

const AXIS =
  /^([NSEW])?\s*(-?)(\d+(?:\.\d+)?)\s*[°D]?\s*(?:(\d+(?:\.\d+)?)\s*['′’M]?\s*(?:(\d+(?:\.\d+)?)\s*(?:["″”S]|'')?)?)?\s*([NSEW])?$/;

function readAxis(text: string): Axis | string | null {
  const found = AXIS.exec(text.trim());
  if (!found) return null;
  const [, before, minus, whole, minutes, seconds, after] = found;
  if (before && after) return `"${text}" names two sides of the compass`;
  const letter = before ?? after;
  if (minus && letter) return `"${text}" has both a minus and a letter: which side is meant?`;
  if (minutes && whole!.includes('.')) return `"${text}" has decimals and minutes`;
  if (seconds && minutes!.includes('.')) return `"${text}" has decimals and seconds`;
  if (Number(minutes ?? 0) >= 60) return `${minutes} minutes are more than 59`;
  if (Number(seconds ?? 0) >= 60) return `${seconds} seconds are more than 59`;
  const size = Number(whole) + Number(minutes ?? 0) / 60 + Number(seconds ?? 0) / 3600;
  const negative = minus === '-' || letter === 'S' || letter === 'W';
  const side = letter === undefined ? null : letter === 'N' || letter === 'S' ? 'lat' : 'lon';
  return { degrees: negative ? -size : size, side };
}
