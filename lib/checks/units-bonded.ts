import { piecesOf, systemsInUse, unitOf, type Layout, type System } from '../layout';
import { answer, atMost, measured } from './support/answer';
import { freshIds, runBetween } from './support/place';
import { groupsOf } from './support/runs';
import { unitWords } from './support/words';
import type { Check, Remedy } from './types';

const rule = {
  id: 'units-bonded',
  gate: 'stop',
  backing: {
    mark: 'from-memory',
    source: '29 CFR 1926.152(e)(2), bonding of containers during transfer (from memory)',
  },
} as const;
const MOST_GROUPS = 1;

export const unitsBonded: Check = {
  ...rule,
  question: 'Are the systems complete?',
  title: 'Units bonded into one piece',
  check({ layout, site }) {
    const systems = systemsInUse(layout);
    const name = (system: System): string => unitOf(layout, system)?.id ?? `no ${system}`;
    const bonds = piecesOf(layout.pieces, 'bond-cable').map((b) => [b.from, b.to] as const);
    // A unit that is not drawn is a piece of its own: nothing can be bonded to it.
    const groups = groupsOf(systems.map(name), bonds);
    const bonded = groups.length <= MOST_GROUPS;
    return [
      answer(
        rule,
        [],
        bonded ? 'meets' : 'not-met',
        bonded
          ? 'Bond cables join the units into one piece'
          : `The units form ${groups.length} pieces; bond cables are missing`,
        {
          measured: measured(groups.length, 'count'),
          allowed: atMost(MOST_GROUPS, 'count'),
          remedy: bonded
            ? null
            : bondThem(layout, systems, groups, name, freshIds({ layout, site })),
        },
      ),
    ];
  },
};

function bondThem(
  layout: Layout,
  systems: readonly System[],
  groups: string[][],
  name: (system: System) => string,
  fresh: (stem: string) => string,
): Remedy | null {
  const heads = groups.map((group) => systems.find((system) => group.includes(name(system)))!);
  const units = heads.map((system) => unitOf(layout, system));
  const [first, ...others] = units;
  if (!first || others.some((unit) => unit === null)) return null;
  return {
    type: 'place',
    pieces: others.map((unit) =>
      runBetween(layout, 'bond-cable', fresh('bond-cable'), first, unit!),
    ),
    words: `Bond ${heads.map(unitWords).join(', ')}`,
  };
}
