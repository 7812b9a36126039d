import { describe, expect, it } from 'vitest';
import { firstToFailWords } from '@/components/checks/first-to-fail-words';
import { lineWords, pieceOf } from '@/components/checks/line-words';
import { offerFields } from '@/components/checks/offer-fields';
import { EMPTY_GROUND, emptyLayout, type Sheet } from '@/lib/layout';
import { finding } from './finding';

const at = [-100, 40] as const;
const MADE = '3f2a1b4c-0000-4000-8000-123456789abc';
const sheet: Sheet = {
  layout: {
    ...emptyLayout(at),
    pieces: [
      { id: 'r1', label: 'R1', kind: 'rod', system: 'R', at },
      { id: 'r2', label: 'R2', kind: 'rod', system: 'R', at },
      { id: MADE, kind: 'jumper', from: 'r1', to: 'r2', path: [[...at], [...at]] },
    ],
  },
  site: EMPTY_GROUND,
};

describe('words of a line', () => {
  it('leaves alone what says its subjects', () => {
    const apart = finding({ subjects: ['r1', 'r2'], message: 'R1 to R2 7.4 ft, 3 to 6 ft' });
    expect(lineWords(sheet, apart)).toBe('R1 to R2 7.4 ft, 3 to 6 ft');
    expect(pieceOf(sheet, apart)).toBe('r2');
  });

  it('puts the subject before a sentence that does not', () => {
    const unknown = finding({ subjects: ['r1'], message: 'No hot zone is drawn' });
    expect(lineWords(sheet, unknown)).toBe('R1: No hot zone is drawn');
  });

  it('calls a run by what it joins, and never by its id', () => {
    const needs = finding({ subjects: [MADE], message: 'Jumper needs 5.0 ft' });
    expect(lineWords(sheet, needs)).toBe('Jumper R1 to R2 needs 5.0 ft');
  });

  it('leaves systems as they are, with no piece to select', () => {
    const apart = finding({ subjects: ['C', 'R'], message: 'C to R 13.1 ft' });
    expect(lineWords(sheet, apart)).toBe('C to R 13.1 ft');
    expect(pieceOf(sheet, apart)).toBeNull();
  });
});

describe('first to fail', () => {
  it('tells its times in the reader’s zone', () => {
    const first = {
      words: '',
      coming: [
        {
          kind: 'wind-too-old',
          words: 'wind too old at 19:23 UTC on 2031-05-04',
          at: '2031-05-04T19:23:00Z',
        },
        { kind: 'wind-past', words: 'wind past 017°', at: null },
      ],
    } as const;
    expect(firstToFailWords(first, '2031-05-04T19:02:00Z', 'America/Chicago')).toBe(
      'wind too old at 14:23, then wind past 017°',
    );
  });
});

describe('fields for what is not known', () => {
  const row = (key: string, missing: Parameters<typeof finding>[0]) => ({
    key,
    title: key,
    findings: [finding({ status: 'not-known', ...missing })] as const,
  });

  it('stand once for what is shared, and each time for what is its own', () => {
    const offers = offerFields([
      {
        question: 'Are they apart?',
        rows: [
          row('a', { missing: ['wind', 'source'] }),
          row('b', { missing: ['wind'] }),
          row('c', { missing: ['owner-answer'] }),
          row('d', { missing: ['owner-answer'] }),
        ],
      },
    ]);
    expect([...offers].map(([key, what]) => [key, [...what]])).toEqual([
      ['a', ['wind', 'source']],
      ['b', []],
      ['c', ['owner-answer']],
      ['d', ['owner-answer']],
    ]);
  });
});
