import { booleanPointInPolygon } from '@turf/turf';
import { distance } from './local-plane';
import type { Vec } from './position';

/** Plane geometry in metres. A ring is closed: its last vertex repeats its first. */
export type Ring = readonly Vec[];
/** Outer ring first, then holes. */
export type Area = readonly Ring[];

/** Where on segment ab the point nearest to p lies, and how far it is. */
export function nearestOnSegment(p: Vec, a: Vec, b: Vec): { at: Vec; metres: number } {
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  const length2 = dx * dx + dy * dy;
  const along =
    length2 === 0 ? 0 : Math.min(1, Math.max(0, ((p.x - a.x) * dx + (p.y - a.y) * dy) / length2));
  const at = { x: a.x + along * dx, y: a.y + along * dy };
  return { at, metres: distance(p, at) };
}

/** Nearest point of a path of one vertex or more. An empty path is infinitely far. */
export function nearestOnPath(p: Vec, path: readonly Vec[]): { at: Vec; metres: number } {
  const first = path[0];
  if (!first) return { at: p, metres: Infinity };
  // Plain numbers until the end: this runs for every zone at every frame of a drag.
  let [bestX, bestY] = [first.x, first.y];
  let least = (p.x - bestX) ** 2 + (p.y - bestY) ** 2;
  for (let i = 1; i < path.length; i++) {
    const a = path[i - 1]!;
    const b = path[i]!;
    const dx = b.x - a.x;
    const dy = b.y - a.y;
    const length2 = dx * dx + dy * dy;
    let along = length2 === 0 ? 0 : ((p.x - a.x) * dx + (p.y - a.y) * dy) / length2;
    along = along < 0 ? 0 : along > 1 ? 1 : along;
    const x = a.x + along * dx;
    const y = a.y + along * dy;
    const square = (p.x - x) ** 2 + (p.y - y) ** 2;
    if (square < least) [least, bestX, bestY] = [square, x, y];
  }
  return { at: { x: bestX, y: bestY }, metres: Math.sqrt(least) };
}

export function pathLength(path: readonly Vec[]): number {
  let metres = 0;
  for (let i = 1; i < path.length; i++) metres += distance(path[i - 1]!, path[i]!);
  return metres;
}

type TurfPolygon = Parameters<typeof booleanPointInPolygon>[1] & { bbox: number[] };
const asTurf = new WeakMap<Area, TurfPolygon>();

/** Inside the outer ring and in none of the holes; on an edge counts as inside. */
export function insideArea(p: Vec, area: Area): boolean {
  let polygon = asTurf.get(area);
  if (!polygon) asTurf.set(area, (polygon = toTurf(area)));
  return booleanPointInPolygon([p.x, p.y], polygon);
}

/** Turf looks at the box first, so that most places outside cost four comparisons. */
function toTurf(area: Area): TurfPolygon {
  const outer = area[0] ?? [];
  const [xs, ys] = [outer.map((v) => v.x), outer.map((v) => v.y)];
  return {
    type: 'Polygon',
    coordinates: area.map((ring) => ring.map((v) => [v.x, v.y])),
    bbox: [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)],
  } as TurfPolygon;
}

/** Metres from p to the nearest edge of the area, holes' edges included, wherever p is. */
export function nearestEdge(p: Vec, area: Area): { at: Vec; metres: number } {
  let best = { at: p, metres: Infinity };
  for (const ring of area) {
    const near = nearestOnPath(p, ring);
    if (near.metres < best.metres) best = near;
  }
  return best;
}

/** Metres beyond the area's edge, negative inside. */
export function beyondArea(p: Vec, area: Area): number {
  const { metres } = nearestEdge(p, area);
  return insideArea(p, area) ? 0 - metres : metres;
}

/** Metres from p to the area, 0 inside. */
export const distanceToArea = (p: Vec, area: Area): number => Math.max(0, beyondArea(p, area));

/** True where the segments share a point, touching ends included. */
export function segmentsMeet(a: Vec, b: Vec, c: Vec, d: Vec): boolean {
  if (Math.max(a.x, b.x) < Math.min(c.x, d.x) || Math.max(c.x, d.x) < Math.min(a.x, b.x)) {
    return false;
  }
  if (Math.max(a.y, b.y) < Math.min(c.y, d.y) || Math.max(c.y, d.y) < Math.min(a.y, b.y)) {
    return false;
  }
  const s1 = side(a, b, c);
  const s2 = side(a, b, d);
  const s3 = side(c, d, a);
  const s4 = side(c, d, b);
  if (s1 !== s2 && s3 !== s4) return true;
  return (
    (s1 === 0 && withinBox(c, a, b)) ||
    (s2 === 0 && withinBox(d, a, b)) ||
    (s3 === 0 && withinBox(a, c, d)) ||
    (s4 === 0 && withinBox(b, c, d))
  );
}

/** −1 right of the line pq, 1 left of it, 0 on it. */
const side = (p: Vec, q: Vec, r: Vec): number =>
  Math.sign((q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x));

const withinBox = (p: Vec, a: Vec, b: Vec): boolean =>
  p.x >= Math.min(a.x, b.x) &&
  p.x <= Math.max(a.x, b.x) &&
  p.y >= Math.min(a.y, b.y) &&
  p.y <= Math.max(a.y, b.y);

/** True where some part of the path lies in the area or on its edge. */
export const pathMeetsArea = (path: readonly Vec[], area: Area): boolean =>
  path.some((p) => insideArea(p, area)) || area.some((ring) => pathsMeet(path, ring));

/** Least distance between two paths, 0 where they meet. */
export function pathToPath(one: readonly Vec[], other: readonly Vec[]): number {
  if (pathsMeet(one, other)) return 0;
  // Paths that don't meet are nearest at a vertex of one of them.
  let least = Infinity;
  for (const p of one) least = Math.min(least, nearestOnPath(p, other).metres);
  for (const p of other) least = Math.min(least, nearestOnPath(p, one).metres);
  return least;
}

/** True where some edge of one shares a point with some edge of the other. */
export function pathsMeet(one: readonly Vec[], other: readonly Vec[]): boolean {
  for (let i = 1; i < one.length; i++) {
    for (let j = 1; j < other.length; j++) {
      if (segmentsMeet(one[i - 1]!, one[i]!, other[j - 1]!, other[j]!)) return true;
    }
  }
  return false;
}

/** Mean of one place or more; null for none. */
export function meanOf(places: readonly Vec[]): Vec | null {
  if (places.length === 0) return null;
  const sum = places.reduce((s, p) => ({ x: s.x + p.x, y: s.y + p.y }), { x: 0, y: 0 });
  return { x: sum.x / places.length, y: sum.y / places.length };
}
