import { CHECKS } from './all';
import type { CheckInput, Finding } from './types';

/** Every check's findings, sorted by rule, then subjects: the same input gives the same list. */
export function runChecks(input: CheckInput): Finding[] {
  return CHECKS.flatMap((check) => check.check(input)).sort(
    (a, b) => compareText(a.rule, b.rule) || compareSubjects(a.subjects, b.subjects),
  );
}

function compareSubjects(a: readonly string[], b: readonly string[]): number {
  for (let i = 0; i < Math.min(a.length, b.length); i++) {
    const order = compareText(a[i]!, b[i]!);
    if (order !== 0) return order;
  }
  return a.length - b.length;
}

/** By code units, so that every machine sorts alike. */
const compareText = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);
