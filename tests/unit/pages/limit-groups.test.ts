import { expect, test } from 'vitest';
import { limitGroups, limitWords } from '@/components/limits/groups';
import { LIMIT_KEYS } from '@/lib/limits';

test('every limit is shown, once', () => {
  const shown = limitGroups().flatMap((group) => group.keys);
  expect([...shown].sort()).toEqual([...LIMIT_KEYS].sort());
});

test('values carry their unit as it is written', () => {
  expect(limitWords(6, 'ft')).toBe('6 ft');
  expect(limitWords(90, 'deg')).toBe('90°');
  expect(limitWords(0.52, 'ratio')).toBe('0.52');
  expect(limitWords(10, 'pct')).toBe('10 %');
});
