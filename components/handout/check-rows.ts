import { groupFindings, type Row } from '@/components/checks/group-findings';
import { lineWords } from '@/components/checks/line-words';
import { allowedWords, rangeWords, valueWords } from '@/components/checks/measure-words';
import { countedSubjects } from '@/components/checks/subject-words';
import { CHECKS, type Allowed, type Finding, type Gate, type Status } from '@/lib/checks';
import type { Sheet } from '@/lib/layout';
import type { Blank } from './blanks';

/** One line of the printed checks. */
export type CheckLine = {
  readonly key: string;
  readonly status: Status;
  readonly words: string;
  readonly measured: string;
  readonly allowed: string;
  /** What it takes at approval, or the blank that it waits for. */
  readonly asks: string;
};

export type CheckPart = { readonly question: string; readonly lines: readonly CheckLine[] };

const GATE_WORDS: Record<Gate, string> = {
  stop: 'stops approval',
  deviation: 'needs a deviation',
  ack: 'to be acknowledged',
};

export function checkParts(
  sheet: Sheet,
  findings: readonly Finding[],
  blanks: readonly Blank[],
): CheckPart[] {
  return groupFindings(findings, CHECKS, 'all').groups.map(({ question, rows }) => ({
    question,
    lines: rows.map((row) => lineOf(sheet, row, blanks)),
  }));
}

function lineOf(sheet: Sheet, { key, title, findings }: Row, blanks: readonly Blank[]): CheckLine {
  const [first] = findings;
  const alone = findings.length === 1;
  const { status } = first;
  // Alike findings may still be held to different figures: then none of them speaks for all.
  const oneLimit = findings.every(({ allowed }) => sameLimit(allowed, first.allowed));
  const allowed = oneLimit ? first.allowed : null;
  return {
    key,
    status,
    words: alone ? lineWords(sheet, first) : `${title}: ${countedSubjects(sheet, findings)}`,
    measured: alone
      ? first.measured
        ? valueWords(first.measured, allowed, status === 'meets')
        : ''
      : (oneLimit && rangeWords(findings)) || '',
    allowed: (allowed && first.measured && allowedWords(allowed)) ?? '',
    asks: asksFor(findings, blanks),
  };
}

const sameLimit = (a: Allowed | null, b: Allowed | null): boolean =>
  a?.min === b?.min && a?.max === b?.max && a?.unit === b?.unit;

function asksFor(findings: readonly Finding[], blanks: readonly Blank[]): string {
  const [first] = findings;
  if (!first || first.status === 'meets' || first.status === 'n/a') return '';
  if (first.status === 'caution') return GATE_WORDS.ack;
  const numbers = blanks
    .filter((blank) => findings.some(({ id }) => blank.findings.includes(id)))
    .map(({ number }) => number);
  const fill = numbers.length > 0 ? `blank ${numbers.join(', ')}; ` : '';
  return `${fill}${GATE_WORDS[first.gate]}`;
}
