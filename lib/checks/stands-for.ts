import { angleBetween, normaliseDegrees } from '../geo';
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
  const { from_deg, speed_mph, swing_deg } = layout.conditions.wind ?? {};
  if (speed_mph == null || swing_deg == null || isCalm(layout, limits)) return null;
  const half = limits.values.upwind_max_deg - swingOf(swing_deg, limits);
  const bearings = waysFromSources(layout);
  if (bearings.length === 0 || half < 0) return null;
  return commonArc(bearings, half, from_deg ?? null);
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

/**
 * Where arcs of `half` to either side of every bearing overlap. Wide arcs may overlap in more than
 * one place: then the one that the wind blows from now, else the widest.
 */
function commonArc(bearings: readonly number[], half: number, now: number | null): WindArc | null {
  if (half >= 180) return { from_deg: 0, to_deg: 360 };
  const holds = (direction: number): boolean =>
    bearings.every((bearing) => angleBetween(direction, bearing) <= half + ON_AN_END);
  const ends = bearings
    .flatMap((bearing) => [normaliseDegrees(bearing - half), normaliseDegrees(bearing + half)])
    .filter(holds)
    .sort((a, b) => a - b);
  const arcs = ends.flatMap((from, i): WindArc[] => {
    const to = ends[(i + 1) % ends.length]!;
    return holds(from + turn(from, to) / 2) ? [{ from_deg: from, to_deg: to }] : [];
  });
  const blowing = now === null ? undefined : arcs.find((arc) => within(arc, now));
  return blowing ?? arcs.sort((a, b) => width(b) - width(a))[0] ?? null;
}

/** An arc's own end belongs to it, however its sum was rounded. */
const ON_AN_END = 1e-9;

const turn = (from: number, to: number): number => normaliseDegrees(to - from);
const width = (arc: WindArc): number => turn(arc.from_deg, arc.to_deg);

/** Whether a direction lies in an arc, ends included. */
export const within = (arc: WindArc, direction: number): boolean =>
  arc.to_deg - arc.from_deg >= 360 || turn(arc.from_deg, direction) <= width(arc);
