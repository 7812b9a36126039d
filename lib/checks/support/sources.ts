import {
  distance,
  distanceToArea,
  footprintMeetsArea,
  footprintToPoint,
  pathToPath,
  toDegrees,
  toRadians,
  type Area,
  type LocalPlane,
  type Ring,
  type Vec,
} from '../../geo';
import { piecesOf, placeOf, placesOf, planeOf, unitOf, type Layout } from '../../layout';

/** Where vapour comes from: every release point and pool. */
export type Sources = {
  /** Places that directions are taken from: release points, and every vertex of a pool's edge. */
  readonly outlets: readonly Vec[];
  readonly points: readonly Vec[];
  readonly pools: readonly Area[];
};

export function sourcesOf(layout: Layout): Sources {
  const plane = planeOf(layout);
  const points = piecesOf(layout.pieces, 'release-point').map((piece) => placeOf(plane, piece));
  const pools = piecesOf(layout.pieces, 'pool').map((piece) => placesOf(plane, piece));
  // A ring's last vertex repeats its first.
  const vertices = pools.flatMap((pool) => pool[0]!.slice(1));
  return { points, pools, outlets: [...points, ...vertices] };
}

export const noSources = (sources: Sources): boolean => sources.outlets.length === 0;

/**
 * The largest angle, over sources, between the way from the source to a place and `toward`.
 * Directions are true ones at each source; made once and asked of many places.
 */
export function worstAngleTo(
  plane: LocalPlane,
  sources: Sources,
  towardDeg: number,
): (at: Vec) => number {
  const outlets = sources.outlets.map((outlet) => {
    const turn = toRadians(towardDeg - plane.convergence(outlet));
    return { outlet, ux: Math.sin(turn), uy: Math.cos(turn) };
  });
  return (at) => {
    let worst = 0;
    for (const { outlet, ux, uy } of outlets) {
      const [dx, dy] = [at.x - outlet.x, at.y - outlet.y];
      // Standing on a source is in no direction from it; that is never the right side.
      const angle =
        dx === 0 && dy === 0 ? Math.PI : Math.abs(Math.atan2(dx * uy - dy * ux, dx * ux + dy * uy));
      if (angle > worst) worst = angle;
    }
    return toDegrees(worst);
  };
}

/** Metres from a place or a footprint to the nearest source, 0 inside a pool. */
export function metresToSource(sources: Sources, shape: Vec | Ring): number {
  if ('x' in shape) {
    return Math.min(
      ...sources.points.map((point) => distance(point, shape)),
      ...sources.pools.map((pool) => distanceToArea(shape, pool)),
    );
  }
  return Math.min(
    ...sources.points.map((point) => footprintToPoint(shape, point)),
    ...sources.pools.map((pool) => footprintToArea(shape, pool)),
  );
}

const footprintToArea = (ring: Ring, area: Area): number =>
  footprintMeetsArea(ring, area) ? 0 : Math.min(...area.map((edge) => pathToPath(ring, edge)));

/** Openings of the receiving vehicle. A vent that names no unit is taken to be one of them. */
export function ventsOf(layout: Layout): Vec[] {
  const plane = planeOf(layout);
  const receiver = unitOf(layout, 'R');
  return piecesOf(layout.pieces, 'vent')
    .filter((vent) => vent.of === undefined || vent.of === receiver?.id)
    .map((vent) => placeOf(plane, vent));
}
