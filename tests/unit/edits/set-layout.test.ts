import { expect, test } from 'vitest';
import { applyEdit, type Edit, type EditOf } from '@/lib/edits';
import { everythingMet } from './everything';
import { expectRefused, type Refusal } from './refusals';

const sheet = everythingMet();
const set = (members: EditOf<'set-layout'>['members']): Edit => ({ type: 'set-layout', members });

test.each<EditOf<'set-layout'>['members']>([
  { name: 'Plan B' },
  { name: null },
  { planned_at: '2031-05-05T08:00:00Z' },
  { pump: 'on-receiving-vehicle' },
  { liquid: { name: 'toluene', flash_point_c: 4 } },
  { kit: { items: [{ kind: 'rod', length_ft: 8, count: 4 }] } },
])('%o', (members) => {
  const after = applyEdit(sheet, set(members));
  expect(after.layout).toEqual({ ...sheet.layout, ...members });
  expect(after.site).toBe(sheet.site);
});

test.each([{}, { name: 'Everything met' }, { name: undefined }])('%o changes nothing', (members) =>
  expect(applyEdit(sheet, set(members))).toBe(sheet),
);

test.each<Refusal>([
  ['pieces', set({ pieces: [] } as EditOf<'set-layout'>['members']), null, /pieces of a layout/],
  ['a time unreadable', set({ planned_at: 'soon' }), null, /a time must be written/],
  ['half a clamp', set({ kit: { items: [{ kind: 'clamp', count: 0.5 }] } }), null, /whole number/],
])('%s is refused', (...refusal) => expectRefused(sheet, refusal));
