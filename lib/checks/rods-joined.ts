import { COMMON_PRACTICE } from '../limits';
import {
  placeOf,
  piecesOf,
  planeOf,
  rodsOf,
  SYSTEMS,
  systemsInUse,
  type Layout,
  type Rod,
  type System,
} from '../layout';
import { distance } from '../geo';
import { answer, atMost, measured } from './support/answer';
import { freshIds, runBetween } from './support/place';
import { groupsOf } from './support/runs';
import { NOT_IN_USE, systemWords } from './support/words';
import type { Check, Remedy } from './types';

const rule = { id: 'rods-joined', gate: 'deviation', backing: COMMON_PRACTICE } as const;
const MOST_GROUPS = 1;

export const rodsJoined: Check = {
  ...rule,
  question: 'Are the systems complete?',
  title: 'Rods of a system joined',
  check({ layout, site }) {
    const jumpers = piecesOf(layout.pieces, 'jumper').map((j) => [j.from, j.to] as const);
    const taken = freshIds({ layout, site });
    return SYSTEMS.map((system) => {
      if (!systemsInUse(layout).includes(system)) return answer(rule, [system], 'n/a', NOT_IN_USE);
      const rods = rodsOf(layout, system);
      if (rods.length === 0) {
        return answer(rule, [system], 'not-known', `No rod drawn for ${systemWords(system)}`, {
          missing: ['rods'],
        });
      }
      const groups = groupsOf(
        rods.map((rod) => rod.id),
        jumpers,
      );
      const joined = groups.length <= MOST_GROUPS;
      return answer(
        rule,
        [system],
        joined ? 'meets' : 'not-met',
        joined
          ? `The rods of ${systemWords(system)} form one piece`
          : `The rods of ${systemWords(system)} form ${groups.length} pieces; jumpers are missing`,
        {
          measured: measured(groups.length, 'count'),
          allowed: atMost(MOST_GROUPS, 'count'),
          remedy: joined ? null : joinThem(layout, system, rods, groups, taken),
        },
      );
    });
  },
};

/** A jumper from the first group to each other one, between their nearest rods. */
function joinThem(
  layout: Layout,
  system: System,
  rods: readonly Rod[],
  groups: string[][],
  fresh: (stem: string) => string,
): Remedy {
  const plane = planeOf(layout);
  const rodsIn = (group: string[]): Rod[] => rods.filter((rod) => group.includes(rod.id));
  const joined = rodsIn(groups[0]!);
  const jumpers = groups.slice(1).map((group) => {
    const pairs = joined.flatMap((a) => rodsIn(group).map((b) => [a, b] as const));
    const apart = ([a, b]: readonly [Rod, Rod]): number =>
      distance(placeOf(plane, a), placeOf(plane, b));
    const [from, to] = pairs.reduce((best, pair) => (apart(pair) < apart(best) ? pair : best));
    joined.push(...rodsIn(group));
    return runBetween(layout, 'jumper', fresh('jumper'), from, to);
  });
  return {
    type: 'place',
    pieces: jumpers,
    words: `Join the rods of ${systemWords(system)}`,
  };
}
