import type { Edit } from '@/lib/edits';
import type { Conditions, Slope, Soil, Wind } from '@/lib/layout';

/** One member of a condition set, the rest as it was; null is "not entered". */

type Change<T> = { readonly [K in keyof T]?: T[K] | null };

const changed = <T extends object>(before: T | null | undefined, members: Change<T>): T | null => {
  const after = { ...before, ...members } as T;
  return Object.values(after).every((value) => value === null || value === undefined)
    ? null
    : after;
};

export const windEdit = (before: Conditions, members: Change<Wind>): Edit => ({
  type: 'set-conditions',
  conditions: { wind: changed(before.wind, members) },
});

export const slopeEdit = (before: Conditions, members: Change<Slope>): Edit => ({
  type: 'set-conditions',
  conditions: { slope: changed(before.slope, members) },
});

export const soilEdit = (before: Conditions, members: Change<Soil>): Edit => ({
  type: 'set-conditions',
  conditions: { soil: changed(before.soil, members) },
});
