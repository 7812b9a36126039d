import sharp from 'sharp';
import { beforeAll, describe, expect, test } from 'vitest';
import { localPlane } from '@/lib/geo';
import { drawBaseMap, versionOf, type DrawnTile } from '@/tiles/draw-base-map';
import { MAP_FONT, readyMapFont } from '@/tiles/map-font';
import { TILE_PX, tileAt } from '@/tiles/mercator';
import { boxOf, penFor, projection } from '@/tiles/pen';
import type { Scene } from '@/tiles/scene';
import { sorrelCreekRamp } from '@/tiles/scenes';

beforeAll(readyMapFont);

describe('a point of the ground', () => {
  const project = projection(sorrelCreekRamp.origin);
  const plane = localPlane(sorrelCreekRamp.origin);

  test('falls on the pixel that Web Mercator gives it, within a hundredth', () => {
    for (const feet of [
      [0, 0],
      [512.5, -403.25],
      [-588, 470],
    ] as const) {
      const place = plane.toLonLat({ x: feet[0] * 0.3048, y: feet[1] * 0.3048 });
      const { x, y } = tileAt(place, 21);
      const [px, py] = penFor(project, { zoom: 21, left: x, top: y }, [1, 1]).point(feet);
      // The formula as the slippy-map convention writes it, apart from our own.
      const phi = (place[1] * Math.PI) / 180;
      const world = TILE_PX * 2 ** 21;
      const wantedX = ((place[0] + 180) / 360) * world - x * TILE_PX;
      const wantedY =
        ((1 - Math.log(Math.tan(phi) + 1 / Math.cos(phi)) / Math.PI) / 2) * world - y * TILE_PX;
      expect(px).toBeCloseTo(wantedX, 2);
      expect(py).toBeCloseTo(wantedY, 2);
      expect(px).toBeGreaterThanOrEqual(0);
      expect(px).toBeLessThan(TILE_PX);
    }
  });

  test('a foot is more than five pixels wide at the closest zoom of the whole map', () => {
    const { x, y } = tileAt(sorrelCreekRamp.origin, 21);
    expect(penFor(project, { zoom: 21, left: x, top: y }, [1, 1]).pxPerFt).toBeGreaterThan(5);
  });
});

/** A corner of a real scene, small enough to draw in a test. */
const corner: Scene = {
  ...sorrelCreekRamp,
  extent: { west: -60, south: -60, east: 60, north: 60 },
  close_up: { west: -10, south: -10, east: 10, north: 10 },
};

async function drawn(scene: Scene): Promise<{ tiles: DrawnTile[]; parts: number[] }> {
  const parts: number[] = [];
  const tiles: DrawnTile[] = [];
  for await (const batch of drawBaseMap(scene, (part) => parts.push(part))) tiles.push(...batch);
  return { tiles, parts };
}

test('a scene is drawn at every zoom, inside its bounds only, the same every time', async () => {
  const { tiles, parts } = await drawn(corner);
  expect([...new Set(tiles.map((tile) => tile.z))]).toEqual([14, 15, 16, 17, 18, 19, 20, 21, 22]);
  expect(parts.at(-1)).toBe(1);
  const box = boxOf([
    [-60, -60],
    [60, 60],
  ]);
  const project = projection(corner.origin);
  for (const { z, x, y } of tiles) {
    const { seen } = penFor(project, { zoom: z, left: x, top: y }, [1, 1]);
    expect(seen.west < box.east && seen.east > box.west).toBe(true);
  }
  const image = await sharp(tiles.at(-1)!.bytes).metadata();
  expect([image.format, image.width, image.height]).toEqual(['webp', TILE_PX, TILE_PX]);
  const again = await drawn(corner);
  expect(again.tiles.map((tile) => tile.hash)).toEqual(tiles.map((tile) => tile.hash));
}, 60_000);

test('open ground without a mark is stored once', async () => {
  const bare: Scene = {
    ...corner,
    ground: { ...corner.ground, grade_pct: 0, swells: [], height_ft: 600.5 },
    roads: [],
    hardstands: [],
    ditches: [],
    fences: [],
    guardrails: [],
    names: [],
    fixed: [],
  };
  const inside = (await drawn(bare)).tiles.filter((tile) => tile.z === 22);
  expect(inside.length).toBeGreaterThan(1);
  expect(new Set(inside.map((tile) => tile.hash)).size).toBe(1);
}, 60_000);

test('words are set in the shipped font, not in boxes', async () => {
  const inkOf = async (letters: string): Promise<number> => {
    const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="300" height="60"><text x="10" y="40" font-family="${MAP_FONT.bold}" font-size="30">${letters}</text></svg>`;
    const { data } = await sharp(Buffer.from(svg))
      .ensureAlpha()
      .raw()
      .toBuffer({ resolveWithObject: true });
    return data.reduce((sum, value, i) => (i % 4 === 3 ? sum + value : sum), 0);
  };
  // A missing font draws one box for every letter, so that all words of a length weigh the same.
  expect(await inkOf('WWWW')).toBeGreaterThan(2 * (await inkOf('iiii')));
});

test('a changed scene is another version', () => {
  expect(versionOf(sorrelCreekRamp)).toMatch(/^[0-9a-f]{12}$/);
  expect(versionOf(corner)).not.toBe(versionOf(sorrelCreekRamp));
});
