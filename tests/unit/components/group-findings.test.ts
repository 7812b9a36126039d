import { describe, expect, it } from 'vitest';
import { countFindings, verdictWords } from '@/components/checks/count-findings';
import { foldWords } from '@/components/checks/fold-words';
import { groupFindings } from '@/components/checks/group-findings';
import type { Finding } from '@/lib/checks';
import { EMPTY_GROUND, emptyLayout, type Sheet } from '@/lib/layout';
import { finding } from './finding';

const checks = [
  { id: 'system-complete', question: 'Are the systems complete?', title: 'System complete' },
  { id: 'rods-apart', question: 'Are they apart?', title: 'Rods apart' },
  {
    id: 'outside-hot-zone',
    question: 'Is everything in the right place?',
    title: 'Outside the hot zone',
  },
  { id: 'upwind', question: 'Is everything in the right place?', title: 'Upwind' },
  { id: 'buried-lines-known', question: 'What is under and over us?', title: 'Owners answered' },
] as const;

const many = (
  rule: string,
  status: Finding['status'],
  count: number,
  more: Partial<Finding> = {},
) =>
  Array.from({ length: count }, (_, i) => finding({ rule, status, subjects: [`p${i}`], ...more }));

const sheet: Sheet = {
  layout: {
    ...emptyLayout([-100, 40]),
    pieces: [0, 1, 2].map((i) =>
      i < 2
        ? { id: `p${i}`, kind: 'rod', system: 'C', at: [-100, 40] as const }
        : { id: `p${i}`, kind: 'z-probe', at: [-100, 40] as const },
    ),
  },
  site: EMPTY_GROUND,
};

describe('grouping of findings', () => {
  it('puts the worst question first, and the worst first inside it', () => {
    const { groups } = groupFindings(
      [
        ...many('upwind', 'meets', 1),
        ...many('upwind', 'caution', 1, { subjects: ['q'] }),
        ...many('outside-hot-zone', 'not-met', 1),
        ...many('outside-hot-zone', 'not-known', 1, { subjects: ['q'] }),
        ...many('rods-apart', 'meets', 1),
      ],
      checks,
      'all',
    );
    expect(groups.map((group) => group.question)).toEqual([
      'Is everything in the right place?',
      'Are they apart?',
    ]);
    expect(groups[0]!.rows.map((row) => row.findings[0].status)).toEqual([
      'not-met',
      'not-known',
      'caution',
      'meets',
    ]);
  });

  it('folds a long run of met findings to one line, and never what is not met', () => {
    const { groups } = groupFindings(
      [...many('outside-hot-zone', 'meets', 3), ...many('upwind', 'not-met', 9)],
      checks,
      'all',
    );
    const rows = groups[0]!.rows;
    expect(rows).toHaveLength(10);
    const folded = rows.at(-1)!;
    expect(folded.findings).toHaveLength(3);
    expect(foldWords(sheet, folded.title, folded.findings)).toBe(
      '3 rods and probes outside the hot zone',
    );
  });

  it('folds what is not known for the same lack, with the lack in words', () => {
    const { groups } = groupFindings(
      [
        ...many('upwind', 'not-known', 2, { missing: ['wind'] }),
        ...many('buried-lines-known', 'not-known', 3, { missing: ['owner-answer'] }),
      ],
      checks,
      'all',
    );
    const [place, under] = groups;
    expect(foldWords(sheet, place!.rows[0]!.title, place!.rows[0]!.findings)).toBe(
      'Upwind, 2 rods: wind not entered',
    );
    expect(under!.rows).toHaveLength(3);
  });

  it('leaves out what is met when only what needs attention is asked for', () => {
    const { groups, notApplicable } = groupFindings(
      [
        ...many('rods-apart', 'meets', 4),
        ...many('upwind', 'n/a', 2),
        ...many('upwind', 'caution', 1),
      ],
      checks,
      'attention',
    );
    expect(groups.map((group) => group.rows.length)).toEqual([1]);
    expect(notApplicable).toHaveLength(2);
  });
});

describe('the verdict', () => {
  const verdict = (findings: Finding[]) => verdictWords(countFindings(findings), 'Quillan County');

  it('is said only when nothing is open', () => {
    expect(verdict(many('upwind', 'meets', 2))).toBe('Meets the limits set by Quillan County');
    expect(
      verdict([...many('upwind', 'meets', 2), ...many('rods-apart', 'n/a', 1)]),
    ).not.toBeNull();
  });

  it.each(['not-met', 'not-known', 'caution'] as const)('is withheld for one %s', (status) => {
    expect(verdict([...many('upwind', 'meets', 2), ...many('rods-apart', status, 1)])).toBeNull();
  });

  it('is not said of nothing', () => {
    expect(verdict([])).toBeNull();
    expect(verdict(many('upwind', 'n/a', 3))).toBeNull();
  });
});
