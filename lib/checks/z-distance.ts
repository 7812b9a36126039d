import { distance, feetToMetres, metresToFeet, type Vec } from '../geo';
import { DRAWN_WITHIN_FT, LIMIT_TABLE, type Limits } from '../limits';
import { nameOf, planeOf, type Layout } from '../layout';
import { answer, between, measured } from './support/answer';
import { moveRemedy, nearestPlace } from './support/move';
import { forEachLine, lineNotDrawn } from './support/each-line';
import { missingFrom, yRatio, type TestLine } from './support/test-line';
import { feet, feetBeside, systemWords } from './support/words';
import type { Check, Finding, Remedy, Status } from './types';

const rule = { id: 'z-distance', gate: 'deviation', backing: LIMIT_TABLE.z_min_ft } as const;

export const zDistance: Check = {
  ...rule,
  question: 'Will the test line read true?',
  title: 'Z probe far enough, within reach',
  check: ({ layout, limits }) => forEachLine(layout, rule, (line) => judge(layout, limits, line)),
};

function judge(layout: Layout, limits: Limits, line: TestLine): Finding {
  if (!line.z || !line.centre) {
    return lineNotDrawn(rule, line, missingFrom(line, 'z'));
  }
  const { z_min_ft: least, z_max_ft: most } = limits.values;
  const far = metresToFeet(line.z.metres);
  const status = bandStatus(far, least, most, ratioMeets(line, limits));
  return answer(
    rule,
    [line.system],
    status,
    `Z is ${status === 'meets' ? feet(far) : feetBeside(far < least ? least : most, far)} from ${systemWords(line.system)}, ${feet(least)} to ${feet(most)}${
      status === 'caution' ? '; longer than usual, but Y keeps its share' : ''
    }`,
    {
      measured: measured(far, 'ft'),
      allowed: between(least, most, 'ft'),
      remedy: status === 'meets' ? null : moveZ(layout, line, far < least ? least : most, limits),
    },
  );
}

/**
 * The bands are rules of thumb for keeping Y's share of the way to Z. Beyond the far end, what
 * they stand for still holds while the share itself does.
 */
export function bandStatus(
  value: number,
  least: number,
  most: number,
  ratioHolds: boolean,
): Status {
  if (value < least - DRAWN_WITHIN_FT.value) return 'not-met';
  if (value <= most + DRAWN_WITHIN_FT.value) return 'meets';
  return ratioHolds ? 'caution' : 'not-met';
}

export function ratioMeets(line: TestLine, { values }: Limits): boolean {
  const share = yRatio(line);
  return share !== null && share >= values.y_ratio_min && share <= values.y_ratio_max;
}

function moveZ(layout: Layout, line: TestLine, wantedFt: number, limits: Limits): Remedy | null {
  const plane = planeOf(layout);
  const { at, probe, metres } = line.z!;
  const centre = line.centre!;
  const { z_min_ft: least, z_max_ft: most } = limits.values;
  const ok = (place: Vec): boolean =>
    bandStatus(metresToFeet(distance(centre, place)), least, most, false) === 'meets';
  const part = metres === 0 ? null : feetToMetres(wantedFt) / metres;
  const straight =
    part === null
      ? []
      : [{ x: centre.x + (at.x - centre.x) * part, y: centre.y + (at.y - centre.y) * part }];
  return moveRemedy(
    plane,
    { id: probe.id, name: nameOf(probe) },
    at,
    nearestPlace(plane, at, ok, straight),
  );
}
