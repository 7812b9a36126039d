import { toRadians } from './angles';
import type { LocalPlane } from './local-plane';
import {
  beyondArea,
  insideArea,
  nearestOnPath,
  pathsMeet,
  pathToPath,
  type Area,
  type Ring,
} from './planar';
import type { Vec } from './position';

/**
 * The rectangle a unit covers: a closed ring, front left, front right, rear right, rear left.
 * `headingDeg` is the true direction of the front; lengths in metres.
 */
export function footprint(
  plane: LocalPlane,
  centre: Vec,
  headingDeg: number,
  lengthMetres: number,
  widthMetres: number,
): Ring {
  const along = toRadians(headingDeg - plane.convergence(centre));
  const ahead = { x: Math.sin(along), y: Math.cos(along) };
  const right = { x: ahead.y, y: -ahead.x };
  const corner = (forward: number, side: number): Vec => ({
    x: centre.x + ahead.x * forward + right.x * side,
    y: centre.y + ahead.y * forward + right.y * side,
  });
  const [l, w] = [lengthMetres / 2, widthMetres / 2];
  const frontLeft = corner(l, -w);
  return [frontLeft, corner(l, w), corner(-l, w), corner(-l, -w), frontLeft];
}

/** Metres from the footprint to p, 0 inside. */
export const footprintToPoint = (ring: Ring, p: Vec): number =>
  insideFootprint(p, ring) ? 0 : nearestOnPath(p, ring).metres;

/** On the edge counts as inside. Rings run clockwise, so inside lies to the right of every edge. */
export function insideFootprint(p: Vec, ring: Ring): boolean {
  for (let i = 1; i < ring.length; i++) {
    const a = ring[i - 1]!;
    const b = ring[i]!;
    if ((b.x - a.x) * (p.y - a.y) - (b.y - a.y) * (p.x - a.x) > 0) return false;
  }
  return true;
}

/** True where the two rings share ground; touching is not sharing. Both convex. */
export function footprintsOverlap(one: Ring, other: Ring): boolean {
  return !separatedByAnEdge(one, other) && !separatedByAnEdge(other, one);
}

function separatedByAnEdge(ring: Ring, other: Ring): boolean {
  for (let i = 1; i < ring.length; i++) {
    const a = ring[i - 1]!;
    const b = ring[i]!;
    // Rings run clockwise seen from above, so their outside lies to the left of each edge.
    const outside = (v: Vec): number => (b.x - a.x) * (v.y - a.y) - (b.y - a.y) * (v.x - a.x);
    if (other.every((v) => outside(v) >= -1e-9)) return true;
  }
  return false;
}

/** True where the footprint and the area share ground or touch. */
export function footprintMeetsArea(ring: Ring, area: Area): boolean {
  return (
    ring.some((corner) => insideArea(corner, area)) ||
    area.some((edge) => pathsMeet(ring, edge)) ||
    area.some((edge) => edge.some((v) => insideFootprint(v, ring) && insideArea(v, area)))
  );
}

/**
 * Metres of the footprint beyond the area: the least distance, or where they overlap minus the
 * depth of the corner deepest inside (0 where no corner is inside).
 */
export function footprintBeyondArea(ring: Ring, area: Area): number {
  if (footprintMeetsArea(ring, area)) {
    const deepest = Math.min(...ring.map((corner) => beyondArea(corner, area)));
    return Math.min(0, deepest);
  }
  return Math.min(...area.map((edge) => pathToPath(ring, edge)));
}
