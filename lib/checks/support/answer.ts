import type { Backing } from '../../limits';
import type {
  Allowed,
  Finding,
  Gate,
  Measured,
  MeasureUnit,
  Missing,
  Remedy,
  Status,
} from '../types';

/** What stays the same for every finding of one rule. */
export type Rule = { readonly id: string; readonly gate: Gate; readonly backing: Backing };

type Details = {
  readonly measured?: Measured | null;
  readonly allowed?: Allowed | null;
  readonly remedy?: Remedy | null;
  readonly missing?: readonly Missing[];
  readonly gate?: Gate;
};

/** One finding; what is left out is null or empty, so that every finding has every member. */
export function answer(
  rule: Rule,
  subjects: readonly string[],
  status: Status,
  message: string,
  details: Details = {},
): Finding {
  return {
    id: `${rule.id}|${subjects.join(',')}`,
    rule: rule.id,
    status,
    gate: details.gate ?? rule.gate,
    subjects,
    measured: details.measured ?? null,
    allowed: details.allowed ?? null,
    message,
    mark: rule.backing.mark,
    source: rule.backing.source,
    remedy: details.remedy ?? null,
    missing: details.missing ?? [],
  };
}

export const measured = (value: number, unit: MeasureUnit): Measured => ({ value, unit });
export const atLeast = (min: number, unit: MeasureUnit): Allowed => ({ min, max: null, unit });
export const atMost = (max: number, unit: MeasureUnit): Allowed => ({ min: null, max, unit });
export const between = (min: number, max: number, unit: MeasureUnit): Allowed => ({
  min,
  max,
  unit,
});
