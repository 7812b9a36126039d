import { threeDigits } from '../geo';
import { LIMIT_TABLE } from '../limits';
import { answer, atLeast, measured } from './support/answer';
import { isCalm, readSlope, readWind, wedge } from './support/wind';
import { degrees, degreesBeside } from './support/words';
import type { Check } from './types';

const rule = {
  id: 'wind-and-slope-agree',
  gate: 'ack',
  backing: LIMIT_TABLE.wedge_min_deg,
} as const;

/** Is there ground both upwind and uphill, and how wide is it? */
export const windAndSlopeAgree: Check = {
  ...rule,
  question: 'Is everything in the right place?',
  title: 'Wind and slope agree',
  check({ layout, limits }) {
    if (isCalm(layout, limits)) return [answer(rule, [], 'n/a', 'Calm: there is no upwind side')];
    const slope = readSlope(layout, limits);
    if (slope.kind === 'level') return [answer(rule, [], 'n/a', 'The ground is level')];
    const wind = readWind(layout, limits);
    const width = wedge(layout, limits);
    if (width === null || wind.kind !== 'blowing') {
      return [
        answer(rule, [], 'not-known', 'Wind, its swing or the slope is not entered', {
          missing: [
            ...(wind.kind === 'not-known' ? (['wind'] as const) : []),
            ...(slope.kind === 'not-known' ? (['slope'] as const) : []),
          ],
        }),
      ];
    }
    const least = limits.values.wedge_min_deg;
    const meets = width >= least;
    return [
      answer(
        rule,
        [],
        meets ? 'meets' : 'caution',
        meets
          ? `Ground both upwind and uphill spans ${degrees(width)}`
          : `Uphill is downwind: ground both upwind and uphill spans only ${degreesBeside(least, width)}; ${crosswindChoice(wind.fromDeg, slope.kind === 'sloping' ? slope.uphillDeg : 0)}`,
        { measured: measured(width, 'deg'), allowed: atLeast(least, 'deg') },
      ),
    ];
  },
};

/** Of the two crosswind sides, the one that lies more uphill. */
function crosswindChoice(fromDeg: number, uphillDeg: number): string {
  const left = fromDeg - 90;
  const right = fromDeg + 90;
  const rise = (side: number): number => Math.cos(((side - uphillDeg) * Math.PI) / 180);
  const better = rise(left) > rise(right) ? left : right;
  return `crosswind, the higher side lies to ${threeDigits(better)}°`;
}
