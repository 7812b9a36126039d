import { expect, test } from 'vitest';
import { applyEdit, type Edit, type EditOf } from '@/lib/edits';
import { everythingMet } from './everything';
import { expectRefused, type Refusal } from './refusals';

const sheet = everythingMet();
const set = (members: Omit<EditOf<'set-ground'>, 'type'>): Edit => ({
  type: 'set-ground',
  ...members,
});

test('answers are recorded one by one, the others kept', () => {
  const after = applyEdit(sheet, set({ answers: { electric: { answer: 'waiting' } } }));
  expect(after.site.answers).toEqual({
    ...sheet.site.answers,
    electric: { answer: 'waiting' },
  });
  expect(after.layout).toBe(sheet.layout);
  expect(after.site.features).toBe(sheet.site.features);
});

test('null takes an answer back: not known again', () => {
  const after = applyEdit(sheet, set({ answers: { sewer: null } }));
  expect(after.site.answers).not.toHaveProperty('sewer');
});

test('tickets and overhead lines', () => {
  const after = applyEdit(sheet, set({ locates: [], overhead_none_known_as_of: null }));
  expect(after.site).toEqual({ ...sheet.site, locates: [], overhead_none_known_as_of: null });
});

test.each([
  ['nothing', set({})],
  ['what is recorded', set({ locates: sheet.site.locates, answers: { ...sheet.site.answers } })],
])('%s changes nothing', (_what, edit) => expect(applyEdit(sheet, edit)).toBe(sheet));

test.each<Refusal>([
  ['an answer unknown', set({ answers: { sewer: { answer: 'perhaps' } } as never }), null, /marked, clear or waiting/], // prettier-ignore
  ['a class unknown', set({ answers: { steam: { answer: 'clear' } } as never }), null, /./],
  ['a ticket without a number', set({ locates: [{ ticket: '' }] }), null, /needs its number/],
  ['a time unreadable', set({ overhead_none_known_as_of: 'today' }), null, /a time must be/],
])('%s is refused', (...refusal) => expectRefused(sheet, refusal));
