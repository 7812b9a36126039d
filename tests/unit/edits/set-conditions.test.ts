import { expect, test } from 'vitest';
import { applyEdit, type Edit, type EditOf } from '@/lib/edits';
import type { Conditions } from '@/lib/layout';
import { everythingMet } from './everything';
import { expectRefused, type Refusal } from './refusals';

const sheet = everythingMet();
const set = (conditions: EditOf<'set-conditions'>['conditions']): Edit => ({
  type: 'set-conditions',
  conditions,
});
const before = sheet.layout.conditions;

test.each<[string, Edit, Conditions]>([
  ['one is set whole', set({ wind: { from_deg: 10 } }), { ...before, wind: { from_deg: 10 } }],
  ['null is not entered', set({ slope: null }), { wind: before.wind, soil: before.soil }],
  ['a null member is left out', set({ slope: { down_deg: 5, grade_pct: null } }), { ...before, slope: { down_deg: 5 } }], // prettier-ignore
])('%s', (_what, edit, expected) => {
  const after = applyEdit(sheet, edit);
  expect(after.layout.conditions).toEqual(expected);
  expect(after.site).toBe(sheet.site);
  expect(after.layout.pieces).toBe(sheet.layout.pieces);
});

test('what another program added stays', () => {
  const added = applyEdit(sheet, set({ wind: { from_deg: 10, gust_mph: 20 } }));
  const after = applyEdit(added, set({ wind: { from_deg: 20 } }));
  expect(after.layout.conditions.wind).toEqual({ from_deg: 20, gust_mph: 20 });
});

test('the same again, or null where nothing was, changes nothing', () => {
  expect(applyEdit(sheet, set({ wind: { ...before.wind } }))).toBe(sheet);
  const calm = applyEdit(sheet, set({ wind: null }));
  expect(applyEdit(calm, set({ wind: null }))).toBe(calm);
});

test.each<Refusal>([
  ['a wind beyond north', set({ wind: { from_deg: 361 } }), null, /from_deg must be 360 or less/],
  ['a time unreadable', set({ wind: { observed_at: 'noon' } }), null, /a time must be written/],
  ['no such condition', set({ rain: {} } as EditOf<'set-conditions'>['conditions']), null, /rain/],
])('%s is refused', (...refusal) => expectRefused(sheet, refusal));
