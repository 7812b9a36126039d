import { metresToFeet } from '../geo';
import { LIMIT_TABLE } from '../limits';
import { answer, atLeast, measured } from './support/answer';
import { forEachLine, lineNotDrawn } from './support/each-line';
import { extentFt, missingFrom } from './support/test-line';
import { systemWords } from './support/words';
import type { Check } from './types';

const rule = { id: 'z-far-enough', gate: 'ack', backing: LIMIT_TABLE.z_extent_min_ratio } as const;

export const zFarEnough: Check = {
  ...rule,
  question: 'Will the test line read true?',
  title: 'Z far from the system for its extent',
  check: ({ layout, limits }) =>
    forEachLine(layout, rule, (line) => {
      if (!line.z) return lineNotDrawn(rule, line, missingFrom(line, 'z'));
      const extent = extentFt(layout, line);
      if (extent === 0) return lineNotDrawn(rule, line, 'no driven length');
      const times = metresToFeet(line.z.metres) / extent;
      const least = limits.values.z_extent_min_ratio;
      return answer(
        rule,
        [line.system],
        times >= least ? 'meets' : 'caution',
        `Z is ${times.toFixed(1)} times the extent of ${systemWords(line.system)} away, at least ${least}`,
        { measured: measured(times, 'ratio'), allowed: atLeast(least, 'ratio') },
      );
    }),
};
