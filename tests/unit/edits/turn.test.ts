import { expect, test } from 'vitest';
import { applyEdit, type Edit } from '@/lib/edits';
import { distance, footprintToPoint, localPlane, type LonLat } from '@/lib/geo';
import { findPiece, footprintOf } from '@/lib/layout';
import { everythingMet } from './everything';
import { expectRefused, pieceOf, type Refusal } from './refusals';

const sheet = everythingMet();
const plane = localPlane(sheet.layout.origin);
const turn = (id: string, heading_deg: number): Edit => ({ type: 'turn', id, heading_deg });

test.each([
  [0, 0],
  [359.5, 359.5],
  [360, 0],
  [-10, 350],
  [725, 5],
])('%d° is kept as %d°', (given, kept) => {
  expect(findPiece(applyEdit(sheet, turn('cv', given)), 'cv')).toMatchObject({ heading_deg: kept });
});

test('clamps and the release point on it turn with it and stay as far from its centre', () => {
  const leaking = applyEdit(sheet, {
    type: 'move',
    moves: [{ id: 'rp', to: [-98.29995, 41.20002] }],
  });
  const after = applyEdit(leaking, turn('cv', 150));
  const centre = plane.toPlane(pieceOf(after, 'cv', 'casualty-vehicle').at);
  const ring = footprintOf(plane, pieceOf(after, 'cv', 'casualty-vehicle'));
  const away = (place: LonLat): number => distance(plane.toPlane(place), centre);
  for (const id of ['g1', 'b1', 'h1']) {
    const [was, is] = [leaking, after].map((s) => {
      const run = findPiece(s, id);
      return run && 'path' in run ? run.path[0]! : s.layout.origin;
    });
    expect(is).not.toEqual(was);
    expect(away(is!)).toBeCloseTo(away(was!), 2);
    expect(footprintToPoint(ring, plane.toPlane(is!))).toBeLessThan(0.003);
  }
  const [leaked, leak] = [leaking, after].map((s) => pieceOf(s, 'rp', 'release-point').at);
  expect(leak).not.toEqual(leaked);
  expect(away(leak!)).toBeCloseTo(away(leaked!), 2);
});

test('turned to where it points changes nothing, 360 for 0 and not entered included', () => {
  expect(applyEdit(sheet, turn('cv', 60))).toBe(sheet);
  expect(applyEdit(sheet, turn('cv', 420))).toBe(sheet);
  const plain = applyEdit(sheet, { type: 'set-piece', id: 'cv', members: { heading_deg: null } });
  expect(applyEdit(plain, turn('cv', 360))).toBe(plain);
});

test.each<Refusal>([
  ['an unknown id', turn('nobody', 0), 'nobody', /no longer on the drawing/],
  ['a rod', turn('rod-1', 0), 'rod-1', /no front/],
  ['not a number', turn('cv', Number.NaN), 'cv', /must be a number/],
  ['endless', turn('cv', Number.POSITIVE_INFINITY), 'cv', /must be a number/],
])('%s is refused by name', (...refusal) => expectRefused(sheet, refusal));
