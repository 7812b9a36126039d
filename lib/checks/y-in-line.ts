import { metresToFeet, toDegrees, type Vec } from '../geo';
import { DRAWN_WITHIN_FT, TRUE_POINT_RATIO, type Limits } from '../limits';
import type { Layout } from '../layout';
import { answer, atMost, measured } from './support/answer';
import { forEachLine, lineNotDrawn } from './support/each-line';
import { missingFrom, type TestLine } from './support/test-line';
import { feet, feetBeside, systemWords } from './support/words';
import { moveY } from './support/y-place';
import type { Check, Finding, Status } from './types';

const rule = {
  id: 'y-in-line',
  gate: 'deviation',
  backing: {
    mark: 'common-practice',
    source: 'Common practice of the trade for in line; the figures are defaults of this product',
  },
} as const;

export const yInLine: Check = {
  ...rule,
  question: 'Will the test line read true?',
  title: 'Y in line with Z',
  check: ({ layout, limits }) => forEachLine(layout, rule, (line) => judge(layout, limits, line)),
};

function judge(layout: Layout, limits: Limits, line: TestLine): Finding {
  if (!line.y || !line.z || !line.centre) {
    return lineNotDrawn(rule, line, missingFrom(line, 'z', 'y'));
  }
  const [centre, z] = [line.centre, line.z.at];
  const { offsetFt, between } = offLine(centre, z, line.y.at);
  const status = statusOf(centre, z, line.y.at, limits);
  const most = limits.values.y_offset_max_ft;
  return answer(
    rule,
    [line.system],
    status,
    between
      ? `Y is ${status === 'meets' ? feet(offsetFt) : feetBeside(most, offsetFt)} off the line from ${systemWords(line.system)} to Z, at most ${feet(most)}`
      : `Y is not between ${systemWords(line.system)} and Z`,
    {
      measured: measured(offsetFt, 'ft'),
      allowed: atMost(most, 'ft'),
      remedy:
        status === 'meets'
          ? null
          : moveY(layout, line, (y) => statusOf(centre, z, y, limits) === 'meets', [
              ...sharesOf(centre, z, line.y.at),
              TRUE_POINT_RATIO.value,
            ]),
    },
  );
}

function statusOf(centre: Vec, z: Vec, y: Vec, { values }: Limits): Status {
  const { offsetFt, between, angleDeg } = offLine(centre, z, y);
  if (!between) return 'not-met';
  if (offsetFt <= values.y_offset_max_ft + DRAWN_WITHIN_FT.value) return 'meets';
  return angleDeg <= values.y_angle_max_deg ? 'caution' : 'not-met';
}

/** How far Y lies off the infinite line, whether strictly between its ends, and at what angle. */
function offLine(centre: Vec, z: Vec, y: Vec) {
  const along = { x: z.x - centre.x, y: z.y - centre.y };
  const out = { x: y.x - centre.x, y: y.y - centre.y };
  const length = Math.hypot(along.x, along.y);
  const dot = length === 0 ? 0 : (along.x * out.x + along.y * out.y) / length;
  const cross =
    length === 0 ? Math.hypot(out.x, out.y) : Math.abs(along.x * out.y - along.y * out.x) / length;
  return {
    offsetFt: metresToFeet(cross),
    between: dot > 0 && dot < length,
    angleDeg: toDegrees(Math.atan2(cross, dot)),
  };
}

/** Y's present share of the way, so that it is moved square onto the line where that will do. */
function sharesOf(centre: Vec, z: Vec, y: Vec): number[] {
  const along = { x: z.x - centre.x, y: z.y - centre.y };
  const length2 = along.x ** 2 + along.y ** 2;
  if (length2 === 0) return [];
  return [(along.x * (y.x - centre.x) + along.y * (y.y - centre.y)) / length2];
}
