import { COMMON_PRACTICE } from '../limits';
import { answer, measured } from './support/answer';
import type { Check } from './types';

const rule = { id: 'acceptance-set', gate: 'stop', backing: COMMON_PRACTICE } as const;

/** Figures in use differ by orders of magnitude, so none is ever assumed. */
export const acceptanceSet: Check = {
  ...rule,
  question: 'Are the systems complete?',
  title: 'Acceptance resistance set',
  check({ limits }) {
    const { acceptance } = limits;
    if (!acceptance) {
      return [
        answer(
          rule,
          [],
          'not-known',
          "The local authority's acceptance resistance is not entered",
          {
            missing: ['acceptance'],
          },
        ),
      ];
    }
    return [
      answer(rule, [], 'meets', `Accepted below ${acceptance.max_ohm} Ω`, {
        measured: measured(acceptance.max_ohm, 'ohm'),
      }),
    ];
  },
};
