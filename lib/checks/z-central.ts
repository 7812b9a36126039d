import { metresToFeet } from '../geo';
import { DRAWN_WITHIN_FT, LIMIT_TABLE } from '../limits';
import { systemsInUse } from '../layout';
import { answer, atMost, measured } from './support/answer';
import { testLineOf } from './support/test-line';
import { feet, feetBeside } from './support/words';
import type { Check } from './types';

const rule = { id: 'z-central', gate: 'ack', backing: LIMIT_TABLE.z_spread_max_ft } as const;

export const zCentral: Check = {
  ...rule,
  question: 'Will the test line read true?',
  title: 'Z probe central to the systems',
  check({ layout, limits }) {
    const lines = systemsInUse(layout).map((system) => testLineOf(layout, system));
    const reaches = lines.flatMap((line) => (line.z ? [metresToFeet(line.z.metres)] : []));
    if (reaches.length < lines.length) {
      return [
        answer(rule, [], 'not-known', 'Not every system has rods and a Z to measure between', {
          missing: ['test-line'],
        }),
      ];
    }
    const spread = Math.max(...reaches) - Math.min(...reaches);
    const most = limits.values.z_spread_max_ft;
    const meets = spread <= most + DRAWN_WITHIN_FT.value;
    return [
      answer(
        rule,
        [],
        meets ? 'meets' : 'caution',
        `Z is ${meets ? feet(spread) : feetBeside(most, spread)} farther from one system than from another, at most ${feet(most)}`,
        { measured: measured(spread, 'ft'), allowed: atMost(most, 'ft') },
      ),
    ];
  },
};
