import { distance, metresToFeet } from '../geo';
import { LIMIT_TABLE, TRUE_POINT_RATIO, type Limits } from '../limits';
import type { Layout } from '../layout';
import { answer, between, measured } from './support/answer';
import { forEachLine, lineNotDrawn } from './support/each-line';
import { missingFrom, type TestLine } from './support/test-line';
import { feet, feetBeside, systemWords } from './support/words';
import { moveY } from './support/y-place';
import type { Check, Finding } from './types';
import { bandStatus, ratioMeets } from './z-distance';

const rule = { id: 'y-distance', gate: 'deviation', backing: LIMIT_TABLE.y_min_ft } as const;

export const yDistance: Check = {
  ...rule,
  question: 'Will the test line read true?',
  title: 'Y probe far enough, within reach',
  check: ({ layout, limits }) => forEachLine(layout, rule, (line) => judge(layout, limits, line)),
};

function judge(layout: Layout, limits: Limits, line: TestLine): Finding {
  if (!line.y || !line.centre) return lineNotDrawn(rule, line, missingFrom(line, 'y'));
  const { y_min_ft: least, y_max_ft: most } = limits.values;
  const far = metresToFeet(line.y.metres);
  const status = bandStatus(far, least, most, ratioMeets(line, limits));
  const centre = line.centre;
  return answer(
    rule,
    [line.system],
    status,
    `Y is ${status === 'meets' ? feet(far) : feetBeside(far < least ? least : most, far)} from ${systemWords(line.system)}, ${feet(least)} to ${feet(most)}${parting(line, most)}`,
    {
      measured: measured(far, 'ft'),
      allowed: between(least, most, 'ft'),
      remedy:
        status === 'meets' || !line.z
          ? null
          : moveY(
              layout,
              line,
              (y) => bandStatus(metresToFeet(distance(centre, y)), least, most, false) === 'meets',
              partsWithin(line, least, most),
            ),
    },
  );
}

/** Where 61.8 % of the way to Z lies beyond the band, the two rules of thumb part company. */
function parting(line: TestLine, most: number): string {
  if (!line.z) return '';
  const truePoint = TRUE_POINT_RATIO.value * metresToFeet(line.z.metres);
  return truePoint > most
    ? `; the true point, 61.8 % of the way to Z, lies at ${feet(truePoint)}, beyond the band: go by the share`
    : '';
}

/** Shares of the way to Z, best first: the true point, then the ends of the band. */
function partsWithin(line: TestLine, least: number, most: number): number[] {
  const z = metresToFeet(line.z!.metres);
  return [TRUE_POINT_RATIO.value, most / z, least / z];
}
