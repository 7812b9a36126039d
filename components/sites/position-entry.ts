import { quantise, type LonLat } from '@/lib/geo';

/** Latitude first, as people write it; longitude first, as files do, is what comes out. */
export function parsePosition(text: string): LonLat | null {
  const numbers = text.match(/^\s*(-?\d+(?:\.\d+)?)\s*[°]?\s*[,; ]\s*(-?\d+(?:\.\d+)?)\s*[°]?\s*$/);
  if (!numbers) return null;
  const [lat, lon] = [Number(numbers[1]), Number(numbers[2])];
  if (Math.abs(lat) > 90 || Math.abs(lon) > 180) return null;
  return quantise([lon, lat]);
}

export const positionWords = ([lon, lat]: LonLat): string => `${lat.toFixed(6)}, ${lon.toFixed(6)}`;
