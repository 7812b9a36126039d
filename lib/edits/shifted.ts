import { quantise, type LocalPlane, type LonLat, type Vec } from '../geo';

/** Metres east and north that lead from one place to another. */
export function shiftBetween(plane: LocalPlane, from: LonLat, to: LonLat): Vec {
  const [a, b] = [plane.toPlane(from), plane.toPlane(to)];
  return { x: b.x - a.x, y: b.y - a.y };
}

/** The place so many metres east and north of another. */
export function shifted(plane: LocalPlane, place: LonLat, by: Vec): LonLat {
  const p = plane.toPlane(place);
  return quantise(plane.toLonLat({ x: p.x + by.x, y: p.y + by.y }));
}
