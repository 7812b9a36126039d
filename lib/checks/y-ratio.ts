import { distance } from '../geo';
import { LIMIT_TABLE, TRUE_POINT_RATIO, type Limits } from '../limits';
import type { Layout } from '../layout';
import { answer, between, measured } from './support/answer';
import { forEachLine, lineNotDrawn } from './support/each-line';
import { missingFrom, yRatio, type TestLine } from './support/test-line';
import { ratio, systemWords } from './support/words';
import { moveY } from './support/y-place';
import type { Check, Finding, Status } from './types';

const rule = {
  id: 'y-ratio',
  gate: 'deviation',
  backing: {
    mark: TRUE_POINT_RATIO.mark,
    source: `${TRUE_POINT_RATIO.source} for 61.8 %; ${LIMIT_TABLE.y_ratio_min.source.toLowerCase()} for the bands`,
  },
} as const;

export const yRatioCheck: Check = {
  ...rule,
  question: 'Will the test line read true?',
  title: "Y's share of the way to Z",
  check: ({ layout, limits }) => forEachLine(layout, rule, (line) => judge(layout, limits, line)),
};

function judge(layout: Layout, limits: Limits, line: TestLine): Finding {
  const share = yRatio(line);
  if (share === null || !line.z) return lineNotDrawn(rule, line, missingFrom(line, 'z', 'y'));
  const { y_ratio_min: least, y_ratio_max: most, y_ratio_low, y_ratio_high } = limits.values;
  const status: Status =
    share >= least && share <= most
      ? 'meets'
      : share >= y_ratio_low && share <= y_ratio_high
        ? 'caution'
        : 'not-met';
  const centre = line.centre!;
  const z = line.z.metres;
  return answer(
    rule,
    [line.system],
    status,
    `Y stands at ${ratio(share)} of the way from ${systemWords(line.system)} to Z, aim at ${TRUE_POINT_RATIO.value}`,
    {
      measured: measured(share, 'ratio'),
      allowed: between(least, most, 'ratio'),
      remedy:
        status === 'meets'
          ? null
          : moveY(
              layout,
              line,
              (y) => distance(centre, y) / z >= least && distance(centre, y) / z <= most,
              [TRUE_POINT_RATIO.value],
            ),
    },
  );
}
