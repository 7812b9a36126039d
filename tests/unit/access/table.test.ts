import { expect, test } from 'vitest';
import { ACTIONS, actionsOf, can, ROLES, whoMay, type Action, type Role } from '@/lib/access';

/** Who may do what, as it was agreed; the columns are ROLES in their order. */
const AGREED: Record<Action, string> = {
  'agency.see': '✓ ✓ ✓ ✓',
  'site.change': '✓ ✓ – ✓',
  'layout.draw': '✓ ✓ – –',
  'layout.review': '– ✓ – –',
  'record.keep': '✓ ✓ ✓ –',
  'limits.change': '– ✓ – ✓',
  'kit.change': '✓ ✓ – ✓',
  'people.change': '– – – ✓',
  'agency.change': '– – – ✓',
  'audit.read': '– ✓ – ✓',
};

test.each(ACTIONS)('%s', (action) => {
  const row = ROLES.map((role) => (can(role, action) ? '✓' : '–')).join(' ');
  expect(ROLES).toEqual(['planner', 'safety-officer', 'crew', 'administrator']);
  expect(row).toBe(AGREED[action]);
});

test('a role’s actions are the ones its column allows', () => {
  expect(actionsOf('crew')).toEqual(['agency.see', 'record.keep']);
});

test('a refusal can name who may', () => {
  expect(whoMay('layout.draw')).toBe('a planner or a safety officer');
  expect(whoMay('people.change')).toBe('an administrator');
  expect(whoMay('site.change')).toBe('a planner, a safety officer or an administrator');
});

test('a role that is none may nothing', () => {
  for (const action of ACTIONS) expect(can('owner' as Role, action)).toBe(false);
});
