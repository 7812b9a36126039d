import { expect, test } from 'vitest';
import { applyEdit } from '@/lib/edits';
import { findPiece, piecesOf, type Rod } from '@/lib/layout';
import { everythingMet } from './everything';

const sheet = everythingMet();
const labels = (rods: readonly Rod[]) => rods.map((rod) => `${rod.id} ${rod.label}`);

test('rods are labelled by system in the order drawn; ids and joins stay', () => {
  const mixed = applyEdit(sheet, {
    type: 'together',
    edits: [
      { type: 'remove', ids: ['rod-1'] },
      { type: 'set-piece', id: 'rod-5', members: { label: 'far one' } },
    ],
  });
  const after = applyEdit(mixed, { type: 'renumber' });
  expect(labels(piecesOf(after.layout.pieces, 'rod'))).toEqual([
    'rod-2 C1',
    'rod-3 P1',
    'rod-4 R1',
    'rod-5 R2',
  ]);
  expect(findPiece(after, 'j2')).toBe(findPiece(mixed, 'j2'));
  expect(findPiece(after, 'rod-3')).toBe(findPiece(mixed, 'rod-3'));
});

test('labels in order already change nothing', () => {
  expect(applyEdit(sheet, { type: 'renumber' })).toBe(sheet);
});
