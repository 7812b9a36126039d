import type { Vec } from '../geo';
import type { Frame } from './frame';

/** However far the sheet is zoomed out, no area is filled with more strokes than these. */
const MOST_STROKES = 240;

/**
 * Parallel strokes that fill the area, at `deg` above the east, `everyPx` apart. They lie on one
 * raster for the whole sheet, so that neighbouring areas agree and nothing crawls when one moves.
 */
export function hatch(
  frame: Frame,
  rings: readonly (readonly Vec[])[],
  deg: number,
  everyPx: number,
): Vec[][] {
  const angle = (deg * Math.PI) / 180;
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  const turned = rings.map((ring) =>
    ring.map((v) => ({ x: v.x * cos + v.y * sin, y: v.y * cos - v.x * sin })),
  );
  const heights = turned.flatMap((ring) => ring.map((v) => v.y));
  const [low, high] = [Math.min(...heights), Math.max(...heights)];
  const every = Math.max(frame.metres(everyPx), (high - low) / MOST_STROKES);
  const strokes: Vec[][] = [];
  for (let y = Math.ceil(low / every) * every; y < high; y += every) {
    const cuts = turned.flatMap((ring) => crossingsAt(ring, y)).sort((a, b) => a - b);
    for (let i = 0; i + 1 < cuts.length; i += 2) {
      strokes.push([back(cuts[i]!, y, cos, sin), back(cuts[i + 1]!, y, cos, sin)]);
    }
  }
  return strokes;
}

/** Where the ring crosses the level `y`, in the order of its edges. */
export function crossingsAt(ring: readonly Vec[], y: number): number[] {
  const found: number[] = [];
  for (let i = 1; i < ring.length; i++) {
    const [a, b] = [ring[i - 1]!, ring[i]!];
    if (a.y <= y !== b.y <= y) found.push(a.x + ((y - a.y) / (b.y - a.y)) * (b.x - a.x));
  }
  return found;
}

const back = (x: number, y: number, cos: number, sin: number): Vec => ({
  x: x * cos - y * sin,
  y: y * cos + x * sin,
});
