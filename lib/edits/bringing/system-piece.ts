import { distance, feetToMetres, type LonLat } from '../../geo';
import {
  piecesOf,
  placeOf,
  planeOf,
  rodsOf,
  systemsInUse,
  type Layout,
  type Rod,
  type System,
} from '../../layout';
import type { LimitValues } from '../../limits';

/**
 * The system a rod put there belongs to. Nearer to a rod than systems may be to one another it
 * can only be of that rod's system; elsewhere it goes to the one with the fewest rods.
 */
export function systemFor(layout: Layout, at: LonLat, limits: LimitValues): System {
  const near = nearestRod(layout, piecesOf(layout.pieces, 'rod'), at);
  if (near && near.metres < feetToMetres(limits.systems_apart_min_ft)) return near.rod.system;
  const [first, ...others] = systemsInUse(layout);
  return others.reduce(
    (fewest, system) =>
      rodsOf(layout, system).length < rodsOf(layout, fewest).length ? system : fewest,
    first ?? 'C',
  );
}

/** Rods of the system that jumpers join to its ground cable; all of them while it has no cable. */
export function joinedRods(layout: Layout, system: System): Rod[] {
  const rods = rodsOf(layout, system);
  const cabled = new Set(piecesOf(layout.pieces, 'ground-cable').map((cable) => cable.to));
  const reached = new Set(rods.filter((rod) => cabled.has(rod.id)).map((rod) => rod.id));
  if (reached.size === 0) return rods;
  const jumpers = piecesOf(layout.pieces, 'jumper');
  for (let before = -1; before !== reached.size;) {
    before = reached.size;
    for (const { from, to } of jumpers) {
      if (reached.has(from)) reached.add(to);
      else if (reached.has(to)) reached.add(from);
    }
  }
  return rods.filter((rod) => reached.has(rod.id));
}

export function nearestRod(
  layout: Layout,
  rods: readonly Rod[],
  to: LonLat,
): { readonly rod: Rod; readonly metres: number } | null {
  const plane = planeOf(layout);
  const place = plane.toPlane(to);
  let best: { rod: Rod; metres: number } | null = null;
  for (const rod of rods) {
    const metres = distance(place, placeOf(plane, rod));
    if (!best || metres < best.metres) best = { rod, metres };
  }
  return best;
}
