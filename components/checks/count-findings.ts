import type { Finding, Status } from '@/lib/checks';

export type StatusCounts = Readonly<Record<Status, number>>;

export function countFindings(findings: readonly Finding[]): StatusCounts {
  const counts: Record<Status, number> = {
    meets: 0,
    caution: 0,
    'not-met': 0,
    'not-known': 0,
    'n/a': 0,
  };
  for (const finding of findings) counts[finding.status] += 1;
  return counts;
}

/** Worst first: what is wrong, then what may be the deadliest because nobody knows it. */
export const WORST_FIRST: readonly Status[] = ['not-met', 'not-known', 'caution', 'meets', 'n/a'];

export const rankOf = (status: Status): number => WORST_FIRST.indexOf(status);

export const needsAttention = (status: Status): boolean =>
  status === 'not-met' || status === 'not-known' || status === 'caution';

/**
 * The only sentence that may praise a layout. It is said when every check answered and none asks
 * for anything; checks that have not run yet are no answer.
 */
export function verdictWords(counts: StatusCounts, agencyName: string): string | null {
  const open = counts['not-met'] + counts['not-known'] + counts.caution;
  return open === 0 && counts.meets > 0 ? `Meets the limits set by ${agencyName}` : null;
}
