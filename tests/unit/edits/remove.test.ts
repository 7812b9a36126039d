import { expect, test } from 'vitest';
import { applyEdit, type Edit } from '@/lib/edits';
import { everythingMet } from './everything';
import { expectRefused } from './refusals';

const sheet = everythingMet();
const remove = (...ids: string[]): Edit => ({ type: 'remove', ids });
const ids = [...sheet.layout.pieces, ...sheet.site.features].map((piece) => piece.id);

test.each([
  ['a jumper', ['j1'], ['j1']],
  ['a rod with its jumper and cable', ['rod-1'], ['rod-1', 'j1', 'g1']],
  ['a unit with its runs and its vent', ['rv'], ['rv', 'vt', 'g2', 'b1', 'h2']],
  ['the casualty, but not the leak', ['cv'], ['cv', 'g1', 'b1', 'b2', 'h1']],
  ['several, one named twice', ['Z', 'T', 'Z'], ['Z', 'T']],
  ['a run and what it joins', ['j1', 'rod-1'], ['rod-1', 'j1', 'g1']],
  ['a line of the site', ['W1'], ['W1']],
  ['nothing', [], []],
])('%s', (_what, named, gone) => {
  const after = applyEdit(sheet, remove(...named));
  const left = [...after.layout.pieces, ...after.site.features].map((piece) => piece.id);
  expect(left).toEqual(ids.filter((id) => !gone.includes(id)));
});

test('layout and site keep their identity where nothing of theirs goes', () => {
  expect(applyEdit(sheet, remove())).toBe(sheet);
  expect(applyEdit(sheet, remove('W1')).layout).toBe(sheet.layout);
  expect(applyEdit(sheet, remove('Z')).site).toBe(sheet.site);
});

test('an unknown id is refused by name, and nothing goes', () => {
  expectRefused(sheet, ['', remove('Z', 'nobody'), 'nobody', /no longer on the drawing/]);
});
