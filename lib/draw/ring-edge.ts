import type { Vec } from '../geo';
import type { Frame } from './frame';
import { add, leftOf, times } from './vectors';
import { walk } from './walk';

const TOOTH_EVERY_PX = 13;
const TOOTH_PX = 8;
const MOST_TEETH = 600;

/** Short slanting teeth on the inner side of the outer ring and on the outer side of holes. */
export function hachures(frame: Frame, rings: readonly (readonly Vec[])[]): Vec[][] {
  return rings.flatMap((ring, index) => {
    const way = walk(ring);
    const count = Math.min(MOST_TEETH, Math.floor(way.metres / frame.metres(TOOTH_EVERY_PX)));
    if (count < 6) return [];
    const inward = turnsLeft(ring) === (index === 0) ? 1 : -1;
    return Array.from({ length: count }, (_, i) => {
      const foot = way.at(((i + 0.5) * way.metres) / count);
      if (!foot) return [];
      const tooth = add(times(leftOf(foot.direction), inward), times(foot.direction, 0.45));
      return [foot.at, add(foot.at, times(tooth, frame.metres(TOOTH_PX)))];
    });
  });
}

/** True where the ring runs counter-clockwise seen from above: its inside lies to the left. */
export function turnsLeft(ring: readonly Vec[]): boolean {
  let area = 0;
  for (let i = 1; i < ring.length; i++) {
    area += ring[i - 1]!.x * ring[i]!.y - ring[i]!.x * ring[i - 1]!.y;
  }
  return area > 0;
}
