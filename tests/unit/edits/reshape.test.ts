import { expect, test } from 'vitest';
import { applyEdit, type Edit, type EditOf } from '@/lib/edits';
import { distance, localPlane, metresToFeet, type LonLat } from '@/lib/geo';
import { everythingMet } from './everything';
import { expectRefused, pieceOf, type Refusal } from './refusals';

const sheet = everythingMet();
const plane = localPlane(sheet.layout.origin);
const to: LonLat = [-98.3003, 41.2003];
const reshape = (id: string, vertex: number, more: Partial<EditOf<'reshape'>> = {}): Edit => ({
  type: 'reshape',
  id,
  part: 0,
  vertex,
  to,
  ...more,
});
const hot = pieceOf(sheet, 'hot', 'hot-zone').rings[0]!;
const ring = (edit: Edit): LonLat[] => pieceOf(applyEdit(sheet, edit), 'hot', 'hot-zone').rings[0]!;

test.each<[string, Edit, LonLat[]]>([
  ['a corner moves', reshape('hot', 3), hot.with(3, to)],
  ['the first corner takes the closing one along', reshape('hot', 0), hot.with(0, to).with(-1, to)],
  ['a corner is added before another', reshape('hot', 3, { insert: true }), hot.toSpliced(3, 0, to)], // prettier-ignore
  ['a corner is added on the closing edge', reshape('hot', hot.length - 1, { insert: true }), hot.toSpliced(-1, 0, to)], // prettier-ignore
  ['a corner is taken out', reshape('hot', 3, { to: null }), hot.toSpliced(3, 1)],
  ['the first corner is taken out', reshape('hot', 0, { to: null }), [...hot.slice(1, -1), hot[1]!]], // prettier-ignore
])('%s', (_what, edit, expected) => expect(ring(edit)).toEqual(expected));

test('a line of the site changes the site only', () => {
  const after = applyEdit(sheet, reshape('W1', 1));
  expect(after.layout).toBe(sheet.layout);
  expect(pieceOf(after, 'W1', 'buried-line').paths[0]!.at(-1)).toEqual(to);
});

test('a corner put where it is changes nothing', () => {
  expect(applyEdit(sheet, reshape('hot', 3, { to: hot[3]! }))).toBe(sheet);
});

test('a clamp slides on its unit; led away it stays on the edge', () => {
  const clamp = (edit: Edit): LonLat =>
    pieceOf(applyEdit(sheet, edit), 'b1', 'bond-cable').path[0]!;
  const centre = pieceOf(sheet, 'cv', 'casualty-vehicle').at;
  expect(clamp(reshape('b1', 0, { to: centre }))).toEqual(centre);
  const away = clamp(reshape('b1', 0, { to: [-98.3, 41.201] }));
  // Heading 60°, 8.5 ft wide: the edge is at most half the diagonal from the centre.
  const feet = metresToFeet(distance(plane.toPlane(away), plane.toPlane(centre)));
  expect(feet).toBeGreaterThan(4.2);
  expect(feet).toBeLessThan(32.8);
});

test('a run takes bends between its ends', () => {
  const path = pieceOf(sheet, 'h1', 'hose').path;
  const after = applyEdit(sheet, reshape('h1', 1, { insert: true }));
  expect(pieceOf(after, 'h1', 'hose').path).toEqual([path[0], to, path[1]]);
});

test.each<Refusal>([
  ['an unknown id', reshape('nobody', 0), 'nobody', /no longer on the drawing/],
  ['a point', reshape('rod-1', 0), 'rod-1', /no line/],
  ['a part that is not there', reshape('hot', 0, { part: 1 }), 'hot', /no ring/],
  ['a corner that is not there', reshape('hot', hot.length - 1), 'hot', /no corner/],
  ['a corner below nothing', reshape('hot', -1), 'hot', /no corner/],
  ['the end on a rod', reshape('g1', 1), 'g1', /on C1/],
  ['an end taken out', reshape('h1', 0, { to: null }), 'h1', /on casualty vehicle/],
  ['a bend before an end', reshape('h1', 0, { insert: true }), 'h1', /on casualty vehicle/],
  ['a bend after an end', reshape('h1', 2, { insert: true }), 'h1', /on pump/],
  ['a bend in a jumper', reshape('j1', 1, { insert: true }), 'j1', /two positions/],
  ['a line of one end', reshape('W1', 0, { to: null }), 'W1', /too few corners/],
  ['a place out of range', reshape('hot', 0, { to: [-98.3, 95] }), 'hot', /latitude/],
])('%s is refused by name', (...refusal) => expectRefused(sheet, refusal));

test('an area keeps three corners', () => {
  let small = applyEdit(sheet, {
    type: 'place',
    pieces: [{ id: 'p', kind: 'pool', rings: [[...hot.slice(0, 4), hot[0]!]] }],
  });
  small = applyEdit(small, reshape('p', 0, { to: null }));
  expectRefused(small, ['two', reshape('p', 0, { to: null }), 'p', /too few corners/]);
});
