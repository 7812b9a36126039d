import type { Limits } from '../limits';
import type { Sheet } from '../layout';
import { runChecks } from './run';
import { standsFor, type WindArc } from './stands-for';
import type { Finding, Status } from './types';

/** What the command line and POST /api/checks answer. */
export type CheckReport = {
  readonly summary: Record<'meets' | 'caution' | 'not_met' | 'not_known' | 'na', number>;
  readonly stands_for: WindArc | null;
  readonly findings: readonly Omit<Finding, 'id' | 'missing'>[];
};

export function checkReport(sheet: Sheet, limits: Limits, at: string | null = null): CheckReport {
  const input = { ...sheet, limits, asOf: at ?? sheet.layout.planned_at };
  const findings = runChecks(input);
  return {
    summary: countByStatus(findings),
    stands_for: standsFor(input),
    findings: findings.map(
      ({ rule, status, gate, subjects, measured, allowed, message, source, mark, remedy }) => ({
        rule,
        status,
        gate,
        subjects,
        measured,
        allowed,
        message,
        source,
        mark,
        remedy,
      }),
    ),
  };
}

const SUMMARY_KEYS = {
  meets: 'meets',
  caution: 'caution',
  'not-met': 'not_met',
  'not-known': 'not_known',
  'n/a': 'na',
} as const satisfies Record<Status, keyof CheckReport['summary']>;

export function countByStatus(findings: readonly Finding[]): CheckReport['summary'] {
  const summary = { meets: 0, caution: 0, not_met: 0, not_known: 0, na: 0 };
  for (const { status } of findings) summary[SUMMARY_KEYS[status]]++;
  return summary;
}

/** True where something is not met or not known: the command line exits 1. */
export const hasOpenItems = ({ summary }: CheckReport): boolean =>
  summary.not_met > 0 || summary.not_known > 0;
