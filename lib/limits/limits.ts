import { DEFAULT_LIMIT_VALUES, LIMIT_KEYS, type LimitKey, type LimitValues } from './limit-table';

/** The resistance below which the local authority accepts a system. None is ever shipped. */
export type Acceptance = { readonly max_ohm: number; readonly authority?: string | null };

/** What the checks measure against: a named set owned by the agency. */
export type Limits = {
  readonly name: string | null;
  readonly values: LimitValues;
  readonly acceptance: Acceptance | null;
};

export type LimitOverrides = Partial<Record<LimitKey, number>>;

export function limitsFrom(
  overrides: LimitOverrides = {},
  acceptance: Acceptance | null = null,
  name: string | null = null,
): Limits {
  return { name, values: { ...DEFAULT_LIMIT_VALUES, ...overrides }, acceptance };
}

/** Only what differs from the defaults, as an exchange file carries it. */
export function overridesOf(limits: Limits): LimitOverrides {
  return Object.fromEntries(
    LIMIT_KEYS.filter((key) => limits.values[key] !== DEFAULT_LIMIT_VALUES[key]).map((key) => [
      key,
      limits.values[key],
    ]),
  );
}
