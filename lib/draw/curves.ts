import { distance, type Vec } from '../geo';
import { add, between, leftOf, subtract, times } from './vectors';

const STEPS = 24;

/**
 * A cable as it lies: a straight run of two vertices bows by `part` of its length to the left of
 * its direction, a longer one passes smoothly through every vertex. Ends stay exact.
 */
export function lying(path: readonly Vec[], part: number): readonly Vec[] {
  const [a, b] = path;
  if (path.length !== 2 || !a || !b) return smooth(path);
  if (part === 0) return path;
  const side = times(leftOf(subtract(b, a)), part * 2);
  const control = add(between(a, b, 0.5), side);
  return Array.from({ length: STEPS + 1 }, (_, i) => {
    if (i === 0) return a;
    if (i === STEPS) return b;
    const t = i / STEPS;
    return between(between(a, control, t), between(control, b, t), t);
  });
}

/** Through the vertices, leaving each in the direction of the chord between its neighbours. */
function smooth(path: readonly Vec[]): readonly Vec[] {
  const out: Vec[] = path.slice(0, 1);
  for (let i = 1; i < path.length; i++) {
    const [p1, p2] = [path[i - 1]!, path[i]!];
    const p0 = path[i - 2] ?? p1;
    const p3 = path[i + 1] ?? p2;
    const chord = distance(p1, p2);
    const c1 = add(p1, tangent(p0, p2, chord));
    const c2 = subtract(p2, tangent(p1, p3, chord));
    for (let step = 1; step < 8; step++) out.push(bezier(p1, c1, c2, p2, step / 8));
    out.push(p2);
  }
  return out;
}

/** Never longer than the chord asks, so that uneven vertices make no loops. */
function tangent(before: Vec, after: Vec, chord: number): Vec {
  const span = distance(before, after);
  return span === 0 ? { x: 0, y: 0 } : times(subtract(after, before), chord / (3 * span));
}

function bezier(a: Vec, b: Vec, c: Vec, d: Vec, t: number): Vec {
  const [ab, bc, cd] = [between(a, b, t), between(b, c, t), between(c, d, t)];
  return between(between(ab, bc, t), between(bc, cd, t), t);
}
