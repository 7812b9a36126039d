import type { Vec } from '../../geo';

/**
 * The part of segment ab that lies within `radius` of segment cd, as fractions of its length;
 * null where none does. What lies within a radius of a segment is convex, so it is one stretch.
 */
export function partWithin(
  a: Vec,
  b: Vec,
  c: Vec,
  d: Vec,
  radius: number,
): readonly [number, number] | null {
  const pieces = [
    inDisc(a, b, c, radius),
    inDisc(a, b, d, radius),
    inStrip(a, b, c, d, radius),
  ].flatMap((piece) => (piece ? [piece] : []));
  if (pieces.length === 0) return null;
  return [Math.min(...pieces.map(([from]) => from)), Math.max(...pieces.map(([, to]) => to))];
}

type Part = readonly [number, number] | null;

function inDisc(a: Vec, b: Vec, centre: Vec, radius: number): Part {
  const [dx, dy] = [b.x - a.x, b.y - a.y];
  const [fx, fy] = [a.x - centre.x, a.y - centre.y];
  const qa = dx * dx + dy * dy;
  const qb = fx * dx + fy * dy;
  const qc = fx * fx + fy * fy - radius * radius;
  if (qa === 0) return qc <= 0 ? [0, 1] : null;
  const root = qb * qb - qa * qc;
  if (root < 0) return null;
  const half = Math.sqrt(root);
  return clip((-qb - half) / qa, (-qb + half) / qa);
}

/** The rectangle along cd, `radius` to each side. */
function inStrip(a: Vec, b: Vec, c: Vec, d: Vec, radius: number): Part {
  const length = Math.hypot(d.x - c.x, d.y - c.y);
  if (length === 0) return null;
  const [ux, uy] = [(d.x - c.x) / length, (d.y - c.y) / length];
  const along = (p: Vec): number => (p.x - c.x) * ux + (p.y - c.y) * uy;
  const across = (p: Vec): number => (p.y - c.y) * ux - (p.x - c.x) * uy;
  const one = whileBetween(along(a), along(b), 0, length);
  const other = whileBetween(across(a), across(b), -radius, radius);
  return one && other ? clip(Math.max(one[0], other[0]), Math.min(one[1], other[1])) : null;
}

/** Fractions between which a value going evenly from `start` to `end` stays within the bounds. */
function whileBetween(start: number, end: number, least: number, most: number): Part {
  if (start === end) return start >= least && start <= most ? [0, 1] : null;
  const [enter, leave] = [(least - start) / (end - start), (most - start) / (end - start)];
  return clip(Math.min(enter, leave), Math.max(enter, leave));
}

const clip = (from: number, to: number): Part => {
  const [f, t] = [Math.max(0, from), Math.min(1, to)];
  return f <= t ? [f, t] : null;
};
