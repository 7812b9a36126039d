import { expect, test } from 'vitest';
import { applyEdit, type Edit } from '@/lib/edits';
import { everythingMet } from './everything';
import { expectRefused } from './refusals';

const sheet = everythingMet();
const head: Edit = { type: 'turn', id: 'cv', heading_deg: 90 };
const gone: Edit = { type: 'remove', ids: ['rv'] };

test('each edit sees what those before it did', () => {
  const one = applyEdit(applyEdit(sheet, head), gone);
  expect(applyEdit(sheet, { type: 'together', edits: [head, gone] })).toEqual(one);
  expectRefused(sheet, [
    'what is gone',
    { type: 'together', edits: [gone, { type: 'turn', id: 'rv', heading_deg: 0 }] },
    'rv',
    /no longer on the drawing/,
  ]);
});

test('nothing together changes nothing', () => {
  const nothing: Edit = { type: 'together', edits: [{ type: 'renumber' }] };
  expect(applyEdit(sheet, { type: 'together', edits: [] })).toBe(sheet);
  expect(applyEdit(sheet, { type: 'together', edits: [nothing, nothing] })).toBe(sheet);
});

test('the words of a remedy are not read', () => {
  const remedy = { ...head, words: 'Turn the casualty vehicle' };
  expect(applyEdit(sheet, remedy)).toEqual(applyEdit(sheet, head));
});

test('an edit of an unknown kind, as JSON may bring one, is refused', () => {
  const edit = { type: 'paint' } as unknown as Edit;
  expectRefused(sheet, ['', edit, null, /no edit called paint/]);
});
