import { expect, test } from 'vitest';
import { applyEdit, type Edit } from '@/lib/edits';
import { emptyLayout, EMPTY_GROUND, type Piece, type Sheet } from '@/lib/layout';
import { everythingMet } from './everything';
import { expectRefused, type Refusal } from './refusals';

const sheet = everythingMet();
const replace = (next: Sheet): Edit => ({ type: 'replace', sheet: next });
const withPieces = (...pieces: Piece[]): Edit =>
  replace({ ...sheet, layout: { ...sheet.layout, pieces: pieces as never } });
const at = sheet.layout.origin;

test('the whole sheet comes as it was', () => {
  const empty: Sheet = { layout: emptyLayout([10, 50]), site: EMPTY_GROUND };
  expect(applyEdit(sheet, replace(empty))).toEqual(empty);
  expect(applyEdit(empty, replace(sheet))).toEqual(sheet);
});

test('a half that says the same keeps its identity; the whole changes nothing', () => {
  const copy = structuredClone(sheet);
  expect(applyEdit(sheet, replace(copy))).toBe(sheet);
  const other = applyEdit(sheet, replace({ ...copy, site: EMPTY_GROUND }));
  expect(other.layout).toBe(sheet.layout);
});

test.each<Refusal>([
  ['an id twice', withPieces({ id: 'n', kind: 'note', at }, { id: 'n', kind: 'note', at }), 'n', /used twice/], // prettier-ignore
  ['an id that the site has', withPieces({ id: 'W1', kind: 'note', at }), 'W1', /used twice/],
  ['two pumps', withPieces({ id: 'a', kind: 'pump', at }, { id: 'b', kind: 'pump', at }), 'b', /one pump/], // prettier-ignore
  ['a run to nobody', withPieces({ id: 'j', kind: 'jumper', from: 'x', to: 'y', path: [at, at] }), 'j', /not on the drawing/], // prettier-ignore
  ['a piece that is none', withPieces({ id: 'r', kind: 'rod', at } as Piece), null, /layout.pieces.0/], // prettier-ignore
])('%s is refused', (...refusal) => expectRefused(sheet, refusal));
