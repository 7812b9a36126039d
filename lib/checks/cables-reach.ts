import { metresToFeet, pathLength } from '../geo';
import { OUR_DEFAULT, type LimitValues } from '../limits';
import { isRun, nameOf, type Kit, type KitItem, type Layout, type Run } from '../layout';
import { answer, atMost, measured } from './support/answer';
import { pieceById, runPath } from './support/runs';
import { capital, feet } from './support/words';
import type { Check, Finding } from './types';

const rule = { id: 'cables-reach', gate: 'deviation', backing: OUR_DEFAULT } as const;

type Needed = { readonly run: Run; readonly feet: number };

export const cablesReach: Check = {
  ...rule,
  question: 'Does the kit reach?',
  title: 'Cables, leads and hoses reach',
  check({ layout, limits }) {
    const runs = layout.pieces.filter(isRun);
    if (runs.length === 0) return [answer(rule, [], 'n/a', 'No cable, lead or hose drawn')];
    const needed = runs.map((run) => ({ run, feet: neededFt(layout, run, limits.values) }));
    const { kit } = layout;
    const given = kit ? handOut(kit, needed) : null;
    return needed.map((need) => judge(need, kit, given?.get(need.run.id) ?? null));
  },
};

/** The drawn path with slack, and the climb for each end that is clamped on a vehicle. */
export function neededFt(layout: Layout, run: Run, limits: LimitValues): number {
  const drawn = metresToFeet(pathLength(runPath(layout, run)));
  const climbs = [run.from, run.to].filter((id) => {
    const kind = pieceById(layout, id)?.kind;
    return kind === 'casualty-vehicle' || kind === 'receiving-vehicle';
  });
  return drawn * (1 + limits.cable_slack_pct / 100) + climbs.length * limits.cable_climb_ft;
}

/** Items to runs, one to one: the longest run chooses first and takes the shortest that will do. */
function handOut(kit: Kit, needed: readonly Needed[]): Map<string, KitItem> {
  const left = kit.items.map((item) => ({ item, count: item.count }));
  const given = new Map<string, KitItem>();
  for (const { run, feet: length } of [...needed].sort((a, b) => b.feet - a.feet)) {
    const fitting = left
      .filter(({ item, count }) => count > 0 && fits(item, run, length))
      .sort((a, b) => a.item.length_ft! - b.item.length_ft!)[0];
    if (!fitting) continue;
    fitting.count--;
    given.set(run.id, fitting.item);
  }
  return given;
}

function fits(item: KitItem, run: Run, length: number): boolean {
  if (item.kind !== run.kind || typeof item.length_ft !== 'number') return false;
  if (run.kind === 'hose' && item.diameter_in !== run.diameter_in) return false;
  return item.length_ft >= length;
}

function judge({ run, feet: length }: Needed, kit: Kit | null, item: KitItem | null): Finding {
  const name = capital(nameOf(run));
  const value = measured(length, 'ft');
  if (!kit) {
    return answer(rule, [run.id], 'not-known', `${name} needs ${feet(length)}; no kit is chosen`, {
      measured: value,
      missing: ['kit'],
    });
  }
  if (run.kind === 'hose' && run.diameter_in === undefined) {
    return answer(rule, [run.id], 'not-known', `The diameter of ${name} is not entered`, {
      measured: value,
      missing: ['kit'],
    });
  }
  if (item) {
    return answer(
      rule,
      [run.id],
      'meets',
      `${name} needs ${feet(length)}: the ${item.length_ft} ft one, ${feet(item.length_ft! - length)} to spare`,
      { measured: value, allowed: atMost(item.length_ft!, 'ft') },
    );
  }
  const longest = Math.max(
    0,
    ...kit.items.flatMap((one) => (one.kind === run.kind ? (one.length_ft ?? []) : [])),
  );
  return answer(
    rule,
    [run.id],
    'not-met',
    longest >= length
      ? `${name} needs ${feet(length)}; those that are long enough are taken`
      : `${name} needs ${feet(length)}; the longest in the kit is ${feet(longest)}`,
    { measured: value, allowed: atMost(longest, 'ft') },
  );
}
