import { LIMIT_TABLE } from '../limits';
import { answer, atMost, measured } from './support/answer';
import type { Check } from './types';

const rule = { id: 'wind-fresh', gate: 'ack', backing: LIMIT_TABLE.wind_fresh_min } as const;
const MS_PER_MINUTE = 60_000;

export const windFresh: Check = {
  ...rule,
  question: 'Is everything in the right place?',
  title: 'Wind reading fresh',
  check({ layout, limits, asOf }) {
    const seen = layout.conditions.wind?.observed_at;
    if (!seen || !asOf) {
      return [
        answer(
          rule,
          [],
          'not-known',
          seen
            ? 'No time is set to judge the wind at'
            : 'When the wind was observed is not entered',
          {
            missing: ['wind'],
          },
        ),
      ];
    }
    const age = (Date.parse(asOf) - Date.parse(seen)) / MS_PER_MINUTE;
    if (age < 0) {
      return [
        answer(rule, [], 'not-known', 'The wind is noted as observed later than the time judged', {
          missing: ['wind'],
        }),
      ];
    }
    const most = limits.values.wind_fresh_min;
    return [
      answer(
        rule,
        [],
        age <= most ? 'meets' : 'caution',
        `Wind observed ${Math.floor(age)} min before, at most ${most}`,
        { measured: measured(age, 'min'), allowed: atMost(most, 'min') },
      ),
    ];
  },
};
