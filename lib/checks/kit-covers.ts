import { COMMON_PRACTICE } from '../limits';
import {
  piecesOf,
  probeFor,
  SYSTEMS,
  type KitKind,
  type Layout,
  type PieceOf,
  type System,
} from '../layout';
import { answer, atMost, measured } from './support/answer';
import { pieceById } from './support/runs';
import type { Check } from './types';

const rule = { id: 'kit-covers', gate: 'deviation', backing: COMMON_PRACTICE } as const;

/** Counted one for each drawn. Couplers, clamps and drivers are listed but not drawn. */
const DRAWN = ['rod', 'jumper', 'ground-cable', 'bond-cable', 'hose'] as const;

const ITEM_WORDS: Partial<Record<KitKind, string>> = {
  rod: 'rods',
  jumper: 'jumpers',
  'ground-cable': 'ground cables',
  'bond-cable': 'bond cables',
  hose: 'hoses',
  probe: 'probes',
  'test-lead': 'test leads',
  tester: 'testers',
};

export const kitCovers: Check = {
  ...rule,
  question: 'Does the kit reach?',
  title: 'The kit has enough of each',
  check({ layout }) {
    const needs = [...needed(layout)];
    if (needs.length === 0) return [answer(rule, [], 'n/a', 'Nothing from a kit is drawn')];
    return needs.map(([kind, count]) => {
      const word = ITEM_WORDS[kind] ?? kind;
      if (!layout.kit) {
        return answer(rule, [kind], 'not-known', `${count} ${word} drawn; no kit is chosen`, {
          measured: measured(count, 'count'),
          missing: ['kit'],
        });
      }
      const has = layout.kit.items
        .filter((item) => item.kind === kind)
        .reduce((sum, item) => sum + item.count, 0);
      return answer(
        rule,
        [kind],
        count <= has ? 'meets' : 'not-met',
        `${count} ${word} needed, ${has} in the kit`,
        { measured: measured(count, 'count'), allowed: atMost(has, 'count') },
      );
    });
  },
};

/**
 * How many of each kind that is drawn. Probes, leads and tester serve one system at a time: the
 * most that any one system needs.
 */
function needed(layout: Layout): Map<KitKind, number> {
  const counts = new Map<KitKind, number>();
  const count = (kind: KitKind, drawn: number, need = drawn): void => {
    if (drawn > 0) counts.set(kind, need);
  };
  const most = (need: (system: System) => number): number => Math.max(...SYSTEMS.map(need));
  for (const kind of DRAWN) count(kind, piecesOf(layout.pieces, kind).length);
  count(
    'probe',
    piecesOf(layout.pieces, 'z-probe', 'y-probe').length,
    most(
      (system) =>
        Number(probeFor(layout, 'z-probe', system) !== null) +
        Number(probeFor(layout, 'y-probe', system) !== null),
    ),
  );
  const leads = piecesOf(layout.pieces, 'test-lead');
  count(
    'test-lead',
    leads.length,
    most((system) => leads.filter((lead) => serves(layout, lead, system)).length),
  );
  count('tester', piecesOf(layout.pieces, 'tester').length, 1);
  return counts;
}

function serves(layout: Layout, lead: PieceOf<'test-lead'>, system: System): boolean {
  const target = pieceById(layout, lead.to);
  if (target?.kind === 'rod') return target.system === system;
  return target?.kind === 'z-probe' || target?.kind === 'y-probe'
    ? probeFor(layout, target.kind, system)?.id === target.id
    : false;
}
