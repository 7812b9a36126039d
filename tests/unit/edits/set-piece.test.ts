import { expect, test } from 'vitest';
import { applyEdit, type Edit } from '@/lib/edits';
import { distance, footprintToPoint, localPlane, metresToFeet } from '@/lib/geo';
import { findPiece, footprintOf } from '@/lib/layout';
import { everythingMet } from './everything';
import { expectRefused, pieceOf, type Refusal } from './refusals';

const sheet = everythingMet();
const plane = localPlane(sheet.layout.origin);
const set = (id: string, members: Record<string, unknown>): Edit => ({
  type: 'set-piece',
  id,
  members,
});

test('members are set, and null takes one back to not entered', () => {
  const after = applyEdit(sheet, set('rod-1', { length_ft: 8, driven_ft: null }));
  expect(findPiece(after, 'rod-1')).toMatchObject({ length_ft: 8, label: 'C1' });
  expect(findPiece(after, 'rod-1')).not.toHaveProperty('driven_ft');
  expect(after.site).toBe(sheet.site);
});

test('a feature of the site changes the site only', () => {
  const after = applyEdit(sheet, set('W1', { quality: 'A', private: true }));
  expect(after.layout).toBe(sheet.layout);
  expect(findPiece(after, 'W1')).toMatchObject({ quality: 'A', private: true });
});

test.each([
  ['what it says already', set('rod-1', { length_ft: 6 })],
  ['not entered, as it was', set('Z', { serves: null })],
  ['no members', set('rod-1', {})],
])('%s changes nothing', (_what, edit) => expect(applyEdit(sheet, edit)).toBe(sheet));

test('a rod led to another system loses a label that would lie', () => {
  expect(findPiece(applyEdit(sheet, set('rod-1', { system: 'R' })), 'rod-1')).toMatchObject({
    system: 'R',
    label: 'R3',
  });
  const named = applyEdit(sheet, set('rod-1', { label: 'by the gate' }));
  const after = applyEdit(named, set('rod-1', { system: 'R' }));
  expect(findPiece(after, 'rod-1')).toMatchObject({ label: 'by the gate' });
  const both = applyEdit(sheet, set('rod-1', { system: 'R', label: 'R9' }));
  expect(findPiece(both, 'rod-1')).toMatchObject({ label: 'R9' });
});

test('a unit that changes size keeps its clamps on it, in proportion', () => {
  const before = pieceOf(sheet, 'b1', 'bond-cable').path[0]!;
  const centre = plane.toPlane(pieceOf(sheet, 'cv', 'casualty-vehicle').at);
  const after = applyEdit(sheet, set('cv', { length_ft: 130, width_ft: 17 }));
  const now = pieceOf(after, 'b1', 'bond-cable').path[0]!;
  const away = (place: typeof now): number => metresToFeet(distance(plane.toPlane(place), centre));
  expect(away(now)).toBeCloseTo(2 * away(before), 1);
  const ring = footprintOf(plane, pieceOf(after, 'cv', 'casualty-vehicle'));
  expect(footprintToPoint(ring, plane.toPlane(now))).toBeLessThan(0.003);
});

test.each<Refusal>([
  ['an unknown id', set('nobody', { label: 'x' }), 'nobody', /no longer on the drawing/],
  ['its place', set('rod-1', { at: [-98.3, 41.2] }), 'rod-1', /at of a rod can't be set/],
  ['its kind', set('rod-1', { kind: 'note' }), 'rod-1', /kind of a rod/],
  ['its id', set('rod-1', { id: 'x' }), 'rod-1', /id of a rod/],
  ['what a run joins', set('g1', { to: 'rod-2' }), 'g1', /to of a ground cable/],
  ['a member unknown', set('rod-1', { colour: 'red' }), 'rod-1', /colour of a rod/],
  ['a value not allowed', set('rod-1', { length_ft: 0 }), 'rod-1', /more than 0/],
  ['a member it needs', set('rod-1', { system: null }), 'rod-1', /system is C, R or P/],
  ['a vent of a rod', set('vt', { of: 'rod-1' }), 'vt', /can't be the of/],
  ['a vent of nobody', set('vt', { of: 'nobody' }), 'vt', /not on the drawing/],
  ['a utility unknown', set('W1', { utility: 'tea' }), 'W1', /utility must be one of/],
])('%s is refused by name', (...refusal) => expectRefused(sheet, refusal));
