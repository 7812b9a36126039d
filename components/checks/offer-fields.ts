import type { Missing } from '@/lib/checks';
import { needsAttention } from './count-findings';
import type { Group } from './group-findings';

/** What each line needs of its own: the answer of one class, one ticket, one line's voltage. */
const ITS_OWN: ReadonlySet<Missing> = new Set(['owner-answer', 'voltage']);

/**
 * Which line carries the field for what is missing. The wind may be wanting for thirty findings,
 * but it is entered once: the first line has the field, the others lead to it.
 */
export function offerFields(groups: readonly Group[]): ReadonlyMap<string, ReadonlySet<Missing>> {
  const taken = new Set<Missing>();
  const offers = new Map<string, ReadonlySet<Missing>>();
  for (const { rows } of groups) {
    for (const { key, findings } of rows) {
      if (!needsAttention(findings[0].status)) continue;
      const here = findings[0].missing.filter((what) => ITS_OWN.has(what) || !taken.has(what));
      here.forEach((what) => taken.add(what));
      offers.set(key, new Set(here));
    }
  }
  return offers;
}
