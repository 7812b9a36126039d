import { describe, expect, test } from 'vitest';
import { contours } from '@/tiles/contours';
import { bend, hollow, lengthOf, stretch } from '@/tiles/curves';
import type { Ft } from '@/tiles/scene';
import { SCENES } from '@/tiles/scenes';
import { fitTilt, slopeOf, terrain } from '@/tiles/terrain';

describe.each(SCENES)('$name', (scene) => {
  const height = terrain(scene.ground);

  test('the working ground slopes as the scene says', () => {
    const { down_deg, grade_pct } = slopeOf(fitTilt(height, scene.ground.working_radius_ft));
    expect(down_deg).toBeCloseTo(scene.ground.down_deg, 6);
    expect(grade_pct).toBeCloseTo(scene.ground.grade_pct, 6);
  });

  test('its contours lie at their heights, and fall the way the slope does', () => {
    const lines = contours(height, scene.extent, 4);
    expect(lines.length).toBeGreaterThan(10);
    const off = lines.map(({ height_ft, path }) =>
      Math.max(...path.map((at) => Math.abs(height(at) - height_ft))),
    );
    expect(Math.max(...off)).toBeLessThan(0.01);
    // The plane through the contours' own points near the origin, as a reader would take it.
    const near = lines.flatMap(({ height_ft, path }) =>
      path.filter(([e, n]) => Math.hypot(e, n) <= 150).map((at) => ({ at, height_ft })),
    );
    const read = slopeOf(planeThrough(near));
    expect(Math.abs(read.down_deg - scene.ground.down_deg)).toBeLessThan(1);
    expect(Math.abs(read.grade_pct - scene.ground.grade_pct)).toBeLessThan(0.1);
  });

  test('everything named on it lies on it', () => {
    const { west, south, east, north } = scene.extent;
    for (const { at } of [...scene.names, ...scene.fixed]) {
      expect(at[0]).toBeGreaterThan(west);
      expect(at[0]).toBeLessThan(east);
      expect(at[1]).toBeGreaterThan(south);
      expect(at[1]).toBeLessThan(north);
    }
  });
});

/** Least squares through scattered points, the whole normal equations. */
function planeThrough(points: readonly { readonly at: Ft; readonly height_ft: number }[]) {
  const mean = (of: (p: (typeof points)[number]) => number): number =>
    points.reduce((sum, p) => sum + of(p), 0) / points.length;
  const [e0, n0, h0] = [mean((p) => p.at[0]), mean((p) => p.at[1]), mean((p) => p.height_ft)];
  const by = (f: (e: number, n: number, h: number) => number): number =>
    points.reduce((sum, p) => sum + f(p.at[0] - e0, p.at[1] - n0, p.height_ft - h0), 0);
  const [ee, nn, en] = [by((e) => e * e), by((_, n) => n * n), by((e, n) => e * n)];
  const [eh, nh] = [by((e, _, h) => e * h), by((_, n, h) => n * h)];
  const det = ee * nn - en * en;
  return { at_origin: h0, east: (eh * nn - nh * en) / det, north: (nh * ee - eh * en) / det };
}

test('a saddle keeps its lines apart', () => {
  const saddle = ([e, n]: Ft): number => (e * n) / 100;
  const lines = contours(saddle, { west: -50, south: -50, east: 50, north: 50 }, 4);
  const ofOne = lines.filter((line) => line.height_ft === 1);
  expect(ofOne).toHaveLength(2);
  for (const { path } of ofOne) {
    const signs = new Set(path.map(([e]) => Math.sign(e)));
    expect(signs.size).toBe(1);
  }
});

test('a bend passes through its points and a stretch of it has its length', () => {
  const points: Ft[] = [
    [0, 0],
    [100, 20],
    [180, 90],
    [200, 200],
  ];
  const line = bend(points);
  for (const point of points) {
    expect(line.some((at) => Math.hypot(at[0] - point[0], at[1] - point[1]) < 1e-9)).toBe(true);
  }
  expect(lengthOf(stretch(line, 50, 120))).toBeCloseTo(70, 6);
  const outline = hollow(line, 10);
  expect(outline[0]).toEqual(outline.at(-1));
});
