import { parseNumber } from '@/components/conditions/parse-number';
import type { Polar } from './piece-place';
import type { PolarDraft } from './place-fields';

/** Five miles: what an exchange file may reach. */
const MOST_FEET = 26_400;

export type ReadPolar =
  | { readonly ok: true; readonly polar: Polar }
  | { readonly ok: false; readonly faults: { bearing?: string; feet?: string } };

/** What the fields say; both are needed, and each that is wrong gets its sentence. */
export function readPolar({ bearing, feet }: PolarDraft): ReadPolar {
  const [b, f] = [parseNumber(bearing, 0, 360), parseNumber(feet, 0, MOST_FEET)];
  const faults: { bearing?: string; feet?: string } = {};
  if ('fault' in b) faults.bearing = b.fault;
  else if (b.value === null) faults.bearing = 'Enter the bearing';
  if ('fault' in f) faults.feet = f.fault;
  else if (f.value === null) faults.feet = 'Enter the distance';
  if ('fault' in b || 'fault' in f || b.value === null || f.value === null) {
    return { ok: false, faults };
  }
  return { ok: true, polar: { bearingDeg: b.value, feet: f.value } };
}
