import { distance, metresToFeet, type Vec } from '../geo';
import { DRAWN_WITHIN_FT, LIMIT_TABLE, type Limits } from '../limits';
import {
  placeOf,
  planeOf,
  rodsOf,
  systemsInUse,
  type Layout,
  type Rod,
  type System,
} from '../layout';
import { quantise } from '../geo';
import { answer, atLeast, measured } from './support/answer';
import { nearestPlace } from './support/move';
import { NOT_IN_USE, feet, feetBeside, systemWords } from './support/words';
import type { Check, Remedy } from './types';

const rule = {
  id: 'systems-apart',
  gate: 'deviation',
  backing: LIMIT_TABLE.systems_apart_min_ft,
} as const;

const PAIRS: readonly (readonly [System, System])[] = [
  ['C', 'R'],
  ['C', 'P'],
  ['R', 'P'],
];

export const systemsApart: Check = {
  ...rule,
  question: 'Are they apart?',
  title: 'Systems apart',
  check({ layout, limits }) {
    const plane = planeOf(layout);
    const least = limits.values.systems_apart_min_ft;
    return PAIRS.map(([one, other]) => {
      if (![one, other].every((system) => systemsInUse(layout).includes(system))) {
        return answer(rule, [one, other], 'n/a', NOT_IN_USE);
      }
      const [ours, theirs] = [rodsOf(layout, one), rodsOf(layout, other)];
      if (ours.length === 0 || theirs.length === 0) {
        const bare = ours.length === 0 ? one : other;
        return answer(
          rule,
          [one, other],
          'not-known',
          `${systemWords(bare)} has no rod to measure from`.replace(/^s/, 'S'),
          { missing: ['rods'] },
        );
      }
      const apart = shortest(places(ours), places(theirs));
      const meets = apart >= least - DRAWN_WITHIN_FT.value;
      return answer(
        rule,
        [one, other],
        meets ? 'meets' : 'not-met',
        `${one} to ${other} ${meets ? feet(apart) : feetBeside(least, apart)}, at least ${feet(least)}`,
        {
          measured: measured(apart, 'ft'),
          allowed: atLeast(least, 'ft'),
          remedy: meets ? null : moveApart(layout, limits, ours, theirs, other),
        },
      );
    });

    function places(rods: readonly Rod[]): Vec[] {
      return rods.map((rod) => placeOf(plane, rod));
    }
  },
};

/** Shortest distance from a rod of one to a rod of the other, feet. */
const shortest = (ours: readonly Vec[], theirs: readonly Vec[]): number =>
  metresToFeet(Math.min(...ours.flatMap((a) => theirs.map((b) => distance(a, b)))));

/** Moves the second system as a whole: the nearest shift that clears the first. */
function moveApart(
  layout: Layout,
  limits: Limits,
  ours: readonly Rod[],
  theirs: readonly Rod[],
  system: System,
): Remedy | null {
  const plane = planeOf(layout);
  const fixed = ours.map((rod) => placeOf(plane, rod));
  const moving = theirs.map((rod) => placeOf(plane, rod));
  const head = moving[0]!;
  const shifted = (to: Vec): Vec[] =>
    moving.map((at) => ({ x: at.x + to.x - head.x, y: at.y + to.y - head.y }));
  const to = nearestPlace(
    plane,
    head,
    (at) => shortest(fixed, shifted(at)) >= limits.values.systems_apart_min_ft,
  );
  if (!to) return null;
  return {
    type: 'move',
    moves: shifted(to).map((at, i) => ({
      id: theirs[i]!.id,
      to: quantise(plane.toLonLat(at)),
    })),
    words: `Move ${systemWords(system)} ${feet(metresToFeet(distance(head, to)))} away`,
  };
}
