import { expect, test } from 'vitest';
import { applyEdit, circleOf, circleRing, resizeCircle } from '@/lib/edits';
import { distance, localPlane, metresToFeet, type LonLat } from '@/lib/geo';
import { everythingMet } from './everything';
import { pieceOf } from './refusals';

const sheet = everythingMet();
const plane = localPlane(sheet.layout.origin);
const centre: LonLat = [-98.3003, 41.2002];
const feet = (place: LonLat): number =>
  metresToFeet(distance(plane.toPlane(place), plane.toPlane(centre)));

test.each([
  [3, 10],
  [36, 45],
  [64, 150],
])('%d corners at %d ft, clockwise from the north and closed', (corners, radius) => {
  const ring = circleRing(sheet.layout, centre, radius, corners);
  expect(ring).toHaveLength(corners + 1);
  expect(ring[0]).toEqual(ring[corners]);
  for (const corner of ring) expect(feet(corner)).toBeCloseTo(radius, 1);
  expect(ring[0]![1]).toBeGreaterThan(centre[1]);
  expect(ring[1]![0]).toBeGreaterThan(centre[0]);
});

test('a circle is known for one, with centre and radius, whoever drew it', () => {
  const circle = circleOf(sheet.layout, pieceOf(sheet, 'hot', 'hot-zone'));
  expect(circle?.radiusFt).toBeCloseTo(45, 1);
});

test('a circle is spread about its centre; another shape is left to its corners', () => {
  const hot = pieceOf(sheet, 'hot', 'hot-zone');
  const edit = resizeCircle(sheet.layout, hot, 60);
  const after = applyEdit(sheet, edit!);
  const circle = circleOf(after.layout, pieceOf(after, 'hot', 'hot-zone'));
  expect(circle?.radiusFt).toBeCloseTo(60, 1);
  const bent = { ...hot, rings: [hot.rings[0]!.with(3, centre)] };
  expect(resizeCircle(sheet.layout, bent, 60)).toBeNull();
  expect(circleOf(sheet.layout, { ...hot, rings: [hot.rings[0]!, hot.rings[0]!] })).toBeNull();
});
