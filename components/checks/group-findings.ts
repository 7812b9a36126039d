import { QUESTIONS, type Check, type Finding, type Question } from '@/lib/checks';
import { needsAttention, rankOf } from './count-findings';

/** One line of the list: a finding alone, or a run of alike findings of one rule. */
export type Row = {
  readonly key: string;
  readonly title: string;
  readonly findings: readonly [Finding, ...Finding[]];
};

export type Group = { readonly question: Question; readonly rows: readonly Row[] };

export type Grouped = {
  readonly groups: readonly Group[];
  readonly notApplicable: readonly Finding[];
};

export type Show = 'all' | 'attention';

/** Runs as long as this become one line. What is not met never does: each is its own remedy. */
const FOLD_FROM: Partial<Record<Finding['status'], number>> = {
  meets: 3,
  caution: 4,
  'not-known': 2,
};

/** Each subject of these has its own answer to enter, so they stay apart while not known. */
const ANSWERED_ONE_BY_ONE = new Set(['buried-lines-known', 'locates-current']);

type CheckFacts = Pick<Check, 'id' | 'question' | 'title'>;

export function groupFindings(
  findings: readonly Finding[],
  checks: readonly CheckFacts[],
  show: Show,
): Grouped {
  const order = new Map(checks.map((check, place) => [check.id, { check, place }]));
  const shown = findings.filter(
    ({ status }) => status !== 'n/a' && (show === 'all' || needsAttention(status)),
  );
  const groups = QUESTIONS.map((question) => {
    const ofQuestion = shown.filter(({ rule }) => order.get(rule)?.check.question === question);
    const sorted = ofQuestion.sort(
      (a, b) =>
        rankOf(a.status) - rankOf(b.status) ||
        order.get(a.rule)!.place - order.get(b.rule)!.place ||
        (a.id < b.id ? -1 : 1),
    );
    return { question, rows: rowsOf(sorted, (rule) => order.get(rule)!.check.title) };
  }).filter(({ rows }) => rows.length > 0);
  // A question with something wrong or unknown is read first; the sort keeps the rest in order.
  groups.sort((a, b) => worstOf(a) - worstOf(b));
  return { groups, notApplicable: findings.filter(({ status }) => status === 'n/a') };
}

/** Rows stand worst first. */
const worstOf = ({ rows }: Group): number => rankOf(rows[0]!.findings[0].status);

function rowsOf(sorted: readonly Finding[], titleOf: (rule: string) => string): Row[] {
  const runs: [Finding, ...Finding[]][] = [];
  for (const finding of sorted) {
    const run = runs.at(-1);
    if (run && alike(run[0], finding)) run.push(finding);
    else runs.push([finding]);
  }
  return runs.flatMap((run): Row[] => {
    const [first] = run;
    const title = titleOf(first.rule);
    const from = FOLD_FROM[first.status];
    const apart = first.status === 'not-known' && ANSWERED_ONE_BY_ONE.has(first.rule);
    if (from !== undefined && run.length >= from && !apart) {
      return [
        { key: `${first.rule}|${first.status}|${first.missing.join()}`, title, findings: run },
      ];
    }
    return run.map((finding) => ({ key: finding.id, title, findings: [finding] }));
  });
}

const alike = (a: Finding, b: Finding): boolean =>
  a.rule === b.rule && a.status === b.status && a.missing.join() === b.missing.join();
