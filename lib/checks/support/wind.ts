import type { Layout } from '../../layout';
import { CROSSWIND_DEG, type Limits } from '../../limits';
import { angleBetween } from '../../geo';

/** What the checks make of the wind entered. */
export type WindReading =
  | { readonly kind: 'not-known' }
  /** Too little wind to have a direction: nowhere is upwind. */
  | { readonly kind: 'calm' }
  | { readonly kind: 'blowing'; readonly fromDeg: number; readonly swingDeg: number };

export function readWind(layout: Layout, limits: Limits): WindReading {
  const wind = layout.conditions.wind;
  const { from_deg, speed_mph, swing_deg } = wind ?? {};
  if (!isEntered(from_deg) || !isEntered(speed_mph) || !isEntered(swing_deg)) {
    return { kind: 'not-known' };
  }
  if (speed_mph < limits.values.calm_below_mph) return { kind: 'calm' };
  return { kind: 'blowing', fromDeg: from_deg, swingDeg: swingOf(swing_deg, limits) };
}

/** A wind that seems steady is still taken to swing this much. */
export const swingOf = (entered: number, limits: Limits): number =>
  Math.max(entered, limits.values.swing_floor_deg);

/** What the checks make of the slope entered. Level ground needs no direction. */
export type SlopeReading =
  | { readonly kind: 'not-known' }
  | { readonly kind: 'level' }
  | { readonly kind: 'sloping'; readonly uphillDeg: number };

export function readSlope(layout: Layout, limits: Limits): SlopeReading {
  const { down_deg, grade_pct } = layout.conditions.slope ?? {};
  if (!isEntered(grade_pct)) return { kind: 'not-known' };
  if (grade_pct < limits.values.level_below_pct) return { kind: 'level' };
  if (!isEntered(down_deg)) return { kind: 'not-known' };
  return { kind: 'sloping', uphillDeg: (down_deg + 180) % 360 };
}

/** True in calm whether or not the rest of the wind was entered. */
export function isCalm(layout: Layout, limits: Limits): boolean {
  const speed = layout.conditions.wind?.speed_mph;
  return isEntered(speed) && speed < limits.values.calm_below_mph;
}

/**
 * Width of the wedge of ground that is both upwind, swing allowed for, and uphill; degrees.
 * Null where there is none to speak of: calm, level, or something not entered.
 */
export function wedge(layout: Layout, limits: Limits): number | null {
  const wind = readWind(layout, limits);
  const slope = readSlope(layout, limits);
  if (wind.kind !== 'blowing' || slope.kind !== 'sloping') return null;
  const apart = angleBetween(wind.fromDeg, slope.uphillDeg);
  const { swingDeg } = wind;
  return Math.max(0, Math.min(2 * (CROSSWIND_DEG - swingDeg), 180 - swingDeg - apart));
}

const isEntered = (value: number | null | undefined): value is number =>
  value !== null && value !== undefined;
