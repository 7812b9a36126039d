import { readFileSync } from 'node:fs';
import { parseExchange } from '@/lib/layout/exchange';
import type { Sheet } from '@/lib/layout';

/** A sheet with every kind a layout is made of, frozen to the last member. */
export function everythingMet(): Sheet {
  const url = new URL('../../fixtures/exchange/everything-met.geojson', import.meta.url);
  const parsed = parseExchange(JSON.parse(readFileSync(url, 'utf8')));
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.faults));
  return deepFreeze(parsed.sheet);
}

/** Any write to a frozen value throws in a module, so a mutation can't pass unseen. */
export function deepFreeze<T>(value: T): T {
  if (typeof value === 'object' && value !== null && !Object.isFrozen(value)) {
    Object.freeze(value);
    Object.values(value).forEach(deepFreeze);
  }
  return value;
}
