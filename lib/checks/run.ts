import { CHECKS } from './all';
import type { CheckInput, Finding } from './types';

/** Every check's findings, sorted by rule, then subjects: the same input gives the same list. */
export function runChecks(input: CheckInput): Finding[] {
  return CHECKS.flatMap((check) => check.check(input)).sort((a, b) => compareText(a.id, b.id));
}

const compareText = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);
