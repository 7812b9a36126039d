import { normaliseDegrees, turnBetween } from '../geo';
import { planeOf, type Layout } from '../layout';
import { noSources, sourcesOf } from './support/sources';
import { isCalm, swingOf } from './support/wind';
import type { CheckInput } from './types';
import { upwindSubjects } from './upwind';

/** Directions the wind may come from while the layout stands, clockwise from `from_deg`. */
export type WindArc = { readonly from_deg: number; readonly to_deg: number };

/**
 * The wind directions for which every rod, tester, pump and receiving vehicle drawn is upwind of
 * every source, swing allowed for. Null where there is none, or not enough is entered to say.
 */
export function standsFor({
  layout,
  limits,
}: Pick<CheckInput, 'layout' | 'limits'>): WindArc | null {
  const { speed_mph, swing_deg } = layout.conditions.wind ?? {};
  if (speed_mph == null || swing_deg == null || isCalm(layout, limits)) return null;
  const half = limits.values.upwind_max_deg - swingOf(swing_deg, limits);
  const bearings = waysFromSources(layout);
  if (bearings.length === 0 || half < 0) return null;
  return commonArc(bearings, half);
}

/** The true direction of every piece that must be upwind, from every source. */
function waysFromSources(layout: Layout): number[] {
  const plane = planeOf(layout);
  const sources = sourcesOf(layout);
  if (noSources(sources)) return [];
  return upwindSubjects(layout).flatMap((subject) =>
    subject.kind === 'piece' && !subject.outOfUse && subject.role !== 'probe'
      ? sources.outlets.map((outlet) => plane.bearing(outlet, subject.at))
      : [],
  );
}

/** Where arcs of `half` to either side of every bearing overlap, in turns from the first. */
function commonArc(bearings: readonly number[], half: number): WindArc | null {
  const first = bearings[0]!;
  let [least, most] = [-half, half];
  for (const bearing of bearings) {
    const turn = turnBetween(first, bearing);
    least = Math.max(least, turn - half);
    most = Math.min(most, turn + half);
  }
  if (least > most) return null;
  return { from_deg: normaliseDegrees(first + least), to_deg: normaliseDegrees(first + most) };
}
