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
    const needs = [...needed(layout)].filter(([, count]) => count > 0);
    if (needs.length === 0) return [answer(rule, [], 'n/a', 'Nothing from a kit is drawn')];
    return needs.map(([kind, count]) => {
      const word = ITEM_WORDS[kind] ?? kind;
      if (!layout.kit) {
        return answer(rule, [kind], 'not-known', `${count} ${word} drawn; no kit is chosen`, {
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

/** Probes, leads and tester serve one system at a time: the most that any one system needs. */
function needed(layout: Layout): Map<KitKind, number> {
  const counts = new Map<KitKind, number>(
    DRAWN.map((kind) => [kind, piecesOf(layout.pieces, kind).length]),
  );
  const most = (count: (system: System) => number): number => Math.max(...SYSTEMS.map(count));
  counts.set(
    'probe',
    most(
      (system) =>
        Number(probeFor(layout, 'z-probe', system) !== null) +
        Number(probeFor(layout, 'y-probe', system) !== null),
    ),
  );
  const leads = piecesOf(layout.pieces, 'test-lead');
  counts.set(
    'test-lead',
    most((system) => leads.filter((lead) => serves(layout, lead, system)).length),
  );
  counts.set('tester', Math.min(1, piecesOf(layout.pieces, 'tester').length));
  return counts;
}

function serves(layout: Layout, lead: PieceOf<'test-lead'>, system: System): boolean {
  const target = pieceById(layout, lead.to);
  if (target?.kind === 'rod') return target.system === system;
  return target?.kind === 'z-probe' || target?.kind === 'y-probe'
    ? probeFor(layout, target.kind, system)?.id === target.id
    : false;
}
