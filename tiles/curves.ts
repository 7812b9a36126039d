import type { Ft } from './scene';

/** Shapes that scenes are made of, in feet. All pure. */

const STEPS_A_BEND = 12;

/** A smooth line through every point (centripetal Catmull-Rom), for roads and tracks. */
export function bend(points: readonly Ft[]): Ft[] {
  if (points.length < 3) return [...points];
  const first = mirror(points[1]!, points[0]!);
  const last = mirror(points.at(-2)!, points.at(-1)!);
  const all = [first, ...points, last];
  const line: Ft[] = [points[0]!];
  for (let i = 1; i < all.length - 2; i++) {
    for (let step = 1; step <= STEPS_A_BEND; step++) {
      line.push(between(all[i - 1]!, all[i]!, all[i + 1]!, all[i + 2]!, step / STEPS_A_BEND));
    }
  }
  return line;
}

const mirror = (of: Ft, at: Ft): Ft => [2 * at[0] - of[0], 2 * at[1] - of[1]];

function between(p0: Ft, p1: Ft, p2: Ft, p3: Ft, part: number): Ft {
  // Knots spaced by the square root of the distance: no loops or cusps where spacing is uneven.
  const t1 = Math.sqrt(span(p0, p1));
  const t2 = t1 + Math.sqrt(span(p1, p2));
  const t3 = t2 + Math.sqrt(span(p2, p3));
  const t = t1 + part * (t2 - t1);
  const a1 = mix(p0, p1, t / t1);
  const a2 = mix(p1, p2, (t - t1) / (t2 - t1));
  const a3 = mix(p2, p3, (t - t2) / (t3 - t2));
  return mix(mix(a1, a2, t / t2), mix(a2, a3, (t - t1) / (t3 - t1)), (t - t1) / (t2 - t1));
}

const mix = (a: Ft, b: Ft, part: number): Ft => [
  a[0] + (b[0] - a[0]) * part,
  a[1] + (b[1] - a[1]) * part,
];

export const span = (a: Ft, b: Ft): number => Math.hypot(b[0] - a[0], b[1] - a[1]);

/** The line `right` feet to the right of `path`, looking along it (left where negative). */
export function beside(path: readonly Ft[], right: number): Ft[] {
  return path.map((at, i) => {
    const a = path[Math.max(0, i - 1)]!;
    const b = path[Math.min(path.length - 1, i + 1)]!;
    const length = span(a, b);
    return [
      at[0] + (right * (b[1] - a[1])) / length,
      at[1] - (right * (b[0] - a[0])) / length,
    ] as const;
  });
}

/** The outline of a band of that width along `path`, closed. */
export function band(path: readonly Ft[], widthFt: number): Ft[] {
  const left = beside(path, -widthFt / 2);
  return [...left, ...beside(path, widthFt / 2).reverse(), left[0]!];
}

/** A hollow's outline: a band that runs out over `taperFt` at both ends. */
export function hollow(path: readonly Ft[], widthFt: number, taperFt = 14): Ft[] {
  const along = path.map((_, i) => lengthOf(path.slice(0, i + 1)));
  const whole = along.at(-1) ?? 0;
  const half = along.map((ft) => {
    const fromEnd = Math.min(ft, whole - ft);
    return (widthFt / 2) * Math.min(1, 0.25 + (0.75 * fromEnd) / taperFt);
  });
  const side = (sign: number): Ft[] => path.map((_, i) => beside(path, sign * (half[i] ?? 0))[i]!);
  const left = side(-1);
  return [...left, ...side(1).reverse(), left[0]!];
}

export const lengthOf = (path: readonly Ft[]): number =>
  path.slice(1).reduce((sum, at, i) => sum + span(path[i]!, at), 0);

/** The part of the path between two distances along it. */
export function stretch(path: readonly Ft[], fromFt: number, toFt: number): Ft[] {
  const out: Ft[] = [];
  let done = 0;
  for (let i = 1; i < path.length; i++) {
    const [a, b] = [path[i - 1]!, path[i]!];
    const length = span(a, b);
    const [from, to] = [Math.max(fromFt, done), Math.min(toFt, done + length)];
    if (from <= to && length > 0) {
      if (out.length === 0) out.push(mix(a, b, (from - done) / length));
      out.push(mix(a, b, (to - done) / length));
    }
    done += length;
  }
  return out;
}

export type Station = { readonly at: Ft; readonly toward_deg: number };

/** Points every `stepFt` along the path, with the direction it runs there. */
export function stations(path: readonly Ft[], stepFt: number, startFt = 0): Station[] {
  const out: Station[] = [];
  let next = startFt;
  let done = 0;
  for (let i = 1; i < path.length; i++) {
    const [a, b] = [path[i - 1]!, path[i]!];
    const length = span(a, b);
    const toward_deg = directionOf(a, b);
    for (; next <= done + length; next += stepFt) {
      out.push({ at: mix(a, b, (next - done) / length), toward_deg });
    }
    done += length;
  }
  return out;
}

/** Degrees clockwise from the plane's north. */
export const directionOf = (a: Ft, b: Ft): number =>
  (Math.atan2(b[0] - a[0], b[1] - a[1]) * 180) / Math.PI;

/** The point `ahead` feet from `at` in direction `towardDeg`, and `right` feet to its right. */
export function step(at: Ft, towardDeg: number, ahead: number, right = 0): Ft {
  const turn = (towardDeg * Math.PI) / 180;
  const [sin, cos] = [Math.sin(turn), Math.cos(turn)];
  return [at[0] + ahead * sin + right * cos, at[1] + ahead * cos - right * sin];
}

/** A rectangle's outline, closed; `towardDeg` is the direction of its length. */
export function rectangle(centre: Ft, towardDeg: number, lengthFt: number, widthFt: number): Ft[] {
  const [l, w] = [lengthFt / 2, widthFt / 2];
  const corner = (ahead: number, right: number): Ft => step(centre, towardDeg, ahead, right);
  return [corner(l, -w), corner(l, w), corner(-l, w), corner(-l, -w), corner(l, -w)];
}

export const close = (outline: readonly Ft[]): Ft[] =>
  outline[0] && span(outline[0], outline.at(-1)!) > 0 ? [...outline, outline[0]] : [...outline];
