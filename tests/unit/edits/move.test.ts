import { expect, test } from 'vitest';
import { applyEdit, EditError, type Edit } from '@/lib/edits';
import { findPiece, type PieceOf, type Kind } from '@/lib/layout';
import { everythingMet } from './everything';

const sheet = everythingMet();
const get = <K extends Kind>(from: typeof sheet, id: string, kind: K): PieceOf<K> => {
  const piece = findPiece(from, id);
  if (piece?.kind !== kind) throw new Error(`${id} is not a ${kind}`);
  return piece as PieceOf<K>;
};
const move = (...moves: { id: string; to: readonly [number, number] }[]): Edit => ({
  type: 'move',
  moves,
});

test('a rod takes the ends of its jumper and cable along', () => {
  const to = [-98.3002, 41.2001] as const;
  const after = applyEdit(sheet, move({ id: 'rod-1', to }));
  expect(get(after, 'rod-1', 'rod').at).toEqual(to);
  expect(get(after, 'j1', 'jumper').path[0]).toEqual(to);
  expect(get(after, 'g1', 'ground-cable').path.at(-1)).toEqual(to);
  expect(get(after, 'g1', 'ground-cable').path[0]).toEqual(
    get(sheet, 'g1', 'ground-cable').path[0],
  );
});

test('the sheet given, the site and every untouched piece keep their identity', () => {
  const after = applyEdit(sheet, move({ id: 'rod-1', to: [-98.3002, 41.2001] }));
  expect(after.site).toBe(sheet.site);
  expect(findPiece(after, 'rod-2')).toBe(findPiece(sheet, 'rod-2'));
  expect(findPiece(after, 'j2')).toBe(findPiece(sheet, 'j2'));
});

test('a line of the site moves whole and leaves the layout alone', () => {
  const after = applyEdit(sheet, move({ id: 'W1', to: [-98.3005, 41.2002] }));
  expect(after.layout).toBe(sheet.layout);
  expect(get(after, 'W1', 'buried-line').paths[0]![0]).toEqual([-98.3005, 41.2002]);
});

test.each<[string, Edit, string]>([
  ['an unknown id', move({ id: 'nobody', to: [-98.3, 41.2] }), 'nobody'],
  ['a run', move({ id: 'j1', to: [-98.3, 41.2] }), 'j1'],
  ['a latitude past the pole', move({ id: 'Z', to: [-98.3, 91] }), 'Z'],
  ['not a number', move({ id: 'Z', to: [Number.NaN, 41.2] }), 'Z'],
  ['ten miles off', move({ id: 'Z', to: [-98.3, 41.35] }), 'Z'],
  ['the far side of the world', move({ id: 'Z', to: [81.7, -41.2] }), 'Z'],
  ['one id twice', move({ id: 'Z', to: [-98.3, 41.2] }, { id: 'Z', to: [-98.3, 41.2] }), 'Z'],
])('%s is refused by name', (_what, edit, id) => {
  expect(() => applyEdit(sheet, edit)).toThrow(EditError);
  expect(() => applyEdit(sheet, edit)).toThrow(expect.objectContaining({ pieceId: id }));
});
