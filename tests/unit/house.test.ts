import { expect, test } from 'vitest';
import { limitsFrom, LIMIT_KEYS } from '@/lib/limits';

test('limits not set by the agency keep their defaults', () => {
  const limits = limitsFrom({ systems_apart_min_ft: 12 });
  expect(limits.values.systems_apart_min_ft).toBe(12);
  expect(limits.values.rods_apart_max_ft).toBe(6);
  expect(Object.keys(limits.values)).toEqual(LIMIT_KEYS);
  expect(limits.acceptance).toBeNull();
});
