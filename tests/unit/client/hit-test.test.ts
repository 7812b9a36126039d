import { expect, test } from 'vitest';
import { piecesAt } from '@/lib/client/hit-test';
import type { DisplayList, Group, Hit, Layer } from '@/lib/draw';

const group = (id: string, layer: Layer, hit: Hit): Group => ({ id, layer, hit, marks: [] });
const square = (half: number) => [
  [
    { x: -half, y: -half },
    { x: half, y: -half },
    { x: half, y: half },
    { x: -half, y: half },
    { x: -half, y: -half },
  ],
];
const spot = (id: string, x: number, y: number, layer: Layer = 'piece'): Group =>
  group(id, layer, { type: 'spot', at: { x, y }, radiusPx: 12 });
const line = (id: string, y: number, layer: Layer): Group =>
  group(id, layer, {
    type: 'lines',
    lines: [
      [
        { x: -100, y },
        { x: 100, y },
      ],
    ],
    nearPx: 8,
  });
const area = (id: string, half: number, layer: Layer, edge = false): Group =>
  group(id, layer, { type: 'area', rings: square(half), nearPx: 6, edge });

const list = (...groups: Group[]): DisplayList => ({ groups });
/** A tenth of a metre to the pixel. */
const at = (x: number, y: number, lists: DisplayList[], pointer: 'mouse' | 'touch' = 'mouse') =>
  piecesAt(lists, { x, y }, 0.1, pointer);

test('a rod on a vehicle is taken before the vehicle, and the vehicle before the road', () => {
  const plan = list(area('truck', 3, 'piece'), spot('rod', 0, 0));
  const ground = list(area('road', 50, 'ground'), line('kerb', 0, 'ground'));
  expect(at(0, 0, [plan, ground])).toEqual(['rod', 'truck', 'kerb', 'road']);
  expect(at(2, 2, [plan, ground])[0]).toBe('truck');
});

test('of two rods under one press the nearer is meant', () => {
  const plan = list(spot('far', 1, 0), spot('near', 0.4, 0));
  expect(at(0, 0, [plan])).toEqual(['near', 'far']);
});

test('a finger reaches 22 px, a mouse only what is drawn', () => {
  const plan = list(line('hose', 0, 'run'));
  expect(at(0, 2.1, [plan], 'touch')).toEqual(['hose']);
  expect(at(0, 2.3, [plan], 'touch')).toEqual([]);
  expect(at(0, 2.1, [plan])).toEqual([]);
  expect(at(0, 0.7, [plan])).toEqual(['hose']);
});

test('a zone is taken by its edge only, so that it swallows nothing that stands in it', () => {
  const plan = list(area('zone', 10, 'zone', true));
  expect(at(0, 0, [plan])).toEqual([]);
  expect(at(10, 0, [plan])).toEqual(['zone']);
});

test('of two areas one in the other the smaller is meant', () => {
  const ground = list(area('large', 50, 'ground'), area('small', 5, 'ground'));
  expect(at(0, 0, [ground])).toEqual(['small', 'large']);
});
