import { describe, expect, test } from 'vitest';
import {
  draftComplaint,
  draftLabel,
  EMPTY_DRAFT,
  isTouched,
  rebasedLocates,
  withDraft,
} from '@/components/sites/ground-draft';
import { EMPTY_GROUND, type Locate, type SiteGround } from '@/lib/layout';

const ticket = (number: string, valid_until: string | null = null): Locate => ({
  ticket: number,
  valid_until,
});

const ground: SiteGround = {
  ...EMPTY_GROUND,
  answers: { electric: { answer: 'waiting' }, sewer: { answer: 'clear' } },
  locates: [ticket('A')],
};

describe('entries laid on the ground', () => {
  test('an empty draft changes nothing', () => {
    expect(isTouched(EMPTY_DRAFT)).toBe(false);
    expect(withDraft(ground, EMPTY_DRAFT)).toEqual(ground);
  });

  test('only what was entered is replaced', () => {
    const draft = { answers: { electric: { answer: 'marked' as const } }, overhead: '2031-05-04' };
    expect(withDraft(ground, draft)).toEqual({
      ...ground,
      answers: { electric: { answer: 'marked' }, sewer: { answer: 'clear' } },
      overhead_none_known_as_of: '2031-05-04',
    });
    expect(draftLabel(draft)).toBe('Enter owners’ answers, overhead lines');
  });

  test('an answer can be taken back to not asked', () => {
    expect(withDraft(ground, { answers: { sewer: null } }).answers.sewer).toBeNull();
  });

  test('a ticket without a number is not sent', () => {
    expect(draftComplaint({ answers: {}, locates: [ticket(' ')] })).toMatch(/needs its number/);
    expect(draftComplaint({ answers: {}, locates: [ticket('A')] })).toBeNull();
  });
});

describe('my tickets on theirs, after both changed the same list', () => {
  const base = [ticket('A'), ticket('B')];

  test.each([
    ['I added, they added', [...base, ticket('M')], [...base, ticket('T')], ['A', 'B', 'T', 'M']],
    ['I took out, they added', [ticket('B')], [...base, ticket('T')], ['B', 'T']],
    ['they took out, I left alone', base, [ticket('B')], ['B']],
    ['I took out everything', [], base, []],
  ])('%s', (_, mine, theirs, left) => {
    expect(rebasedLocates(base, mine, theirs).map((locate) => locate.ticket)).toEqual(left);
  });

  test('what I changed is mine even where they took it out', () => {
    const mine = [ticket('A', '2031-05-18'), ticket('B')];
    expect(rebasedLocates(base, mine, base)).toEqual(mine);
    expect(rebasedLocates(base, mine, [ticket('B')])).toEqual([
      ticket('B'),
      ticket('A', '2031-05-18'),
    ]);
  });
});
