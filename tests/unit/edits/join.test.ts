import { expect, test } from 'vitest';
import { applyEdit, type Edit, type End } from '@/lib/edits';
import { footprintToPoint, localPlane } from '@/lib/geo';
import { footprintOf } from '@/lib/layout';
import { everythingMet } from './everything';
import { expectRefused, pieceOf, type Refusal } from './refusals';

const sheet = everythingMet();
const plane = localPlane(sheet.layout.origin);
const join = (id: string, end: End, piece: string): Edit => ({ type: 'join', id, end, piece });

test('an end led to a rod lies on it; the other end stays', () => {
  const after = pieceOf(applyEdit(sheet, join('g1', 'to', 'rod-2')), 'g1', 'ground-cable');
  expect(after).toMatchObject({ from: 'cv', to: 'rod-2' });
  expect(after.path).toEqual([
    pieceOf(sheet, 'g1', 'ground-cable').path[0],
    pieceOf(sheet, 'rod-2', 'rod').at,
  ]);
});

test('an end led to a unit lands on its edge', () => {
  const after = applyEdit(sheet, join('g1', 'from', 'pu'));
  const cable = pieceOf(after, 'g1', 'ground-cable');
  expect([cable.from, cable.to]).toEqual(['pu', 'rod-1']);
  const ring = footprintOf(plane, pieceOf(after, 'pu', 'pump'));
  expect(footprintToPoint(ring, plane.toPlane(cable.path[0]!))).toBeLessThan(0.003);
});

test('led to where it is joined changes nothing', () => {
  expect(applyEdit(sheet, join('g1', 'to', 'rod-1'))).toBe(sheet);
});

test.each<Refusal>([
  ['an unknown run', join('nobody', 'to', 'rod-1'), 'nobody', /no longer on the drawing/],
  ['an unknown piece', join('g1', 'to', 'nobody'), 'nobody', /no longer on the drawing/],
  ['what is no run', join('rod-1', 'to', 'rod-2'), 'rod-1', /joins nothing/],
  ['a cable to a unit', join('g1', 'to', 'rv'), 'g1', /can't be the to of a ground cable/],
  ['a hose to a rod', join('h1', 'from', 'rod-1'), 'h1', /can't be the from of a hose/],
  ['a bond to itself', join('b1', 'to', 'cv'), 'b1', /itself/],
  ['a jumper to a zone', join('j1', 'to', 'hot'), 'j1', /can't be the to/],
])('%s is refused by name', (...refusal) => expectRefused(sheet, refusal));
