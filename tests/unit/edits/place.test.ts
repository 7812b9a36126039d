import { expect, test } from 'vitest';
import { applyEdit, type Edit } from '@/lib/edits';
import type { LonLat } from '@/lib/geo';
import { emptyLayout, EMPTY_GROUND, MOST_PIECES, type Piece } from '@/lib/layout';
import { deepFreeze, everythingMet } from './everything';
import { expectRefused, pieceOf, type Refusal } from './refusals';

const sheet = everythingMet();
const here: LonLat = [-98.3002, 41.2002];
const place = (...pieces: Piece[]): Edit => ({ type: 'place', pieces });
const rod = (id: string, more: Partial<Piece> = {}): Piece =>
  ({ id, kind: 'rod', system: 'C', at: here, ...more }) as Piece;

test('pieces are added in the order given, after those drawn', () => {
  const after = applyEdit(sheet, place(rod('a'), rod('b')));
  expect(after.layout.pieces.slice(-2).map((piece) => piece.id)).toEqual(['a', 'b']);
  expect(after.layout.pieces.slice(0, -2)).toEqual(sheet.layout.pieces);
  expect(after.site).toBe(sheet.site);
});

test('what the site holds goes to the site', () => {
  const point: Piece = { id: 'f', kind: 'fixed-point', at: here, name: 'Hydrant' };
  const after = applyEdit(sheet, place(point));
  expect(after.layout).toBe(sheet.layout);
  expect(after.site.features.at(-1)).toEqual(point);
});

test('a run may come before what it joins, and its ends are laid onto it', () => {
  const jumper: Piece = { id: 'j', kind: 'jumper', from: 'a', to: 'rod-1', path: [here, here] };
  const after = applyEdit(sheet, place(jumper, rod('a')));
  expect(pieceOf(after, 'j', 'jumper').path).toEqual([here, pieceOf(sheet, 'rod-1', 'rod').at]);
});

test('positions are quantised, a height survives, members not entered are left out', () => {
  const at = [-98.300200004, 41.2002, 212.5] as unknown as LonLat;
  const after = applyEdit(sheet, place(rod('a', { at, label: undefined })));
  expect(after.layout.pieces.at(-1)).toEqual({
    id: 'a',
    kind: 'rod',
    system: 'C',
    at: [-98.3002, 41.2002, 212.5],
  });
  expect(after.layout.pieces.at(-1)).not.toHaveProperty('label');
});

test('no pieces, no change', () => expect(applyEdit(sheet, place())).toBe(sheet));

test('the piece kept is not the caller’s own object', () => {
  const mine = { id: 'a', kind: 'note', at: here, text: 'as it was' } as const;
  const after = applyEdit(sheet, place(mine));
  expect(after.layout.pieces.at(-1)).not.toBe(mine);
});

test('a layout is full at its most', () => {
  const rods = Array.from({ length: MOST_PIECES }, (_, i) => rod(`r${i}`));
  const full = applyEdit({ layout: emptyLayout(here), site: EMPTY_GROUND }, place(...rods));
  expectRefused(deepFreeze(full), ['one more', place(rod('more')), 'more', /at most 2000/]);
});

const cable = (from: string, to: string): Piece => ({
  id: 'g',
  kind: 'ground-cable',
  from,
  to,
  path: [here, here],
});

test.each<Refusal>([
  ['an id in use', place(rod('rod-1')), 'rod-1', /already a piece/],
  ['an id in use by the site', place(rod('W1')), 'W1', /already a piece/],
  ['an id given twice', place(rod('a'), rod('a')), 'a', /already a piece/],
  ['a second casualty', place({ id: 'x', kind: 'casualty-vehicle', at: here }), 'x', /already a casualty vehicle/], // prettier-ignore
  ['a second receiver', place({ id: 'x', kind: 'receiving-vehicle', at: here }), 'x', /already a receiving vehicle/], // prettier-ignore
  ['a second pump', place({ id: 'x', kind: 'pump', at: here }), 'x', /already a pump/],
  ['a cable from nothing', place(cable('nobody', 'rod-1')), 'g', /from: nobody/],
  ['a cable from a rod', place(cable('rod-1', 'rod-2')), 'g', /C1 can't be the from/],
  ['a cable to a unit', place(cable('cv', 'rv')), 'g', /receiving vehicle can't be the to/],
  ['a bond to itself', place({ id: 'b', kind: 'bond-cable', from: 'cv', to: 'cv', path: [here, here] }), 'b', /itself/], // prettier-ignore
  ['a vent of a rod', place({ id: 'v', kind: 'vent', at: here, of: 'rod-1' }), 'v', /can't be the of/], // prettier-ignore
  ['a rod without a system', place(rod('a', { system: undefined })), 'a', /system is C, R or P/],
  ['a length below nothing', place(rod('a', { length_ft: -1 })), 'a', /length_ft must be more/],
  ['a member unknown', place(rod('a', { colour: 'red' } as Partial<Piece>)), 'a', /has no colour/],
  ['an unclosed ring', place({ id: 'p', kind: 'pool', rings: [[here, here, here, [-98, 41.2]]] }), 'p', /not closed/], // prettier-ignore
  ['a kind unknown', place({ id: 'q', kind: 'kite', at: here } as unknown as Piece), 'q', /no kind of piece/], // prettier-ignore
])('%s is refused by name', (...refusal) => expectRefused(sheet, refusal));
