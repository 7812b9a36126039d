import { expect, test } from 'vitest';
import { fromSquare, tileAt, toSquare } from '@/tiles/mercator';

/**
 * Sources: OpenStreetMap wiki, "Slippy map tilenames" (Brandenburg Gate example; tile 17/70406/42987);
 * EPSG Guidance Note 7-2, method 1024 "Popular Visualisation Pseudo Mercator" (IOGP 373-7-2).
 */

test('the place of the published example lies in its tile', () => {
  expect(tileAt([13.37772, 52.51628], 17)).toEqual({ z: 17, x: 70406, y: 42987 });
});

test('the square agrees with the EPSG example', () => {
  const side = 2 * Math.PI * 6_378_137;
  const [x, y] = toSquare([-(100 + 20 / 60), 24 + 22 / 60 + 54.433 / 3600]);
  expect((x - 0.5) * side).toBeCloseTo(-11_169_055.58, 1);
  expect((0.5 - y) * side).toBeCloseTo(2_800_000.0, 1);
});

test('the square has the world between 85.0511° south and north, and turns back exactly', () => {
  const edge = (Math.atan(Math.sinh(Math.PI)) * 180) / Math.PI;
  expect(edge).toBeCloseTo(85.0511, 4);
  expect(toSquare([-180, edge])[1]).toBeCloseTo(0, 12);
  expect(toSquare([180, -edge])).toEqual([1, expect.closeTo(1, 12)]);
  for (const place of [
    [-100.87214, 42.21853],
    [151.2, -33.86],
    [0, 0],
  ] as const) {
    const [lon, lat] = fromSquare(toSquare(place));
    expect(lon).toBeCloseTo(place[0], 10);
    expect(lat).toBeCloseTo(place[1], 10);
  }
});
