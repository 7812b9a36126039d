import { isUnit, type KitItem, type Kind, type PieceOf, type System } from '@/lib/layout';
import type { LonLat } from '@/lib/geo';
import { feetBetween } from './ground';
import { HAIR, LETTERS, tell, type Scene, type TwinFinding } from './scene';

/** Does the kit reach? */

const RUN_KINDS = ['ground-cable', 'bond-cable', 'jumper', 'test-lead', 'hose'] as const;
type RunKind = (typeof RUN_KINDS)[number];

/** Where a reference and a line's end disagree the reference wins; a clamp may sit anywhere. */
export function drawnPath(scene: Scene, { path, from, to }: PieceOf<RunKind>): LonLat[] {
  const at = (id: string, drawn: LonLat): LonLat => {
    const end = scene.pieces.find((piece) => piece.id === id);
    return end && 'at' in end && !isUnit(end) ? end.at : drawn;
  };
  return [at(from, path[0]!), ...path.slice(1, -1), at(to, path[path.length - 1]!)];
}

function neededFeet(scene: Scene, run: PieceOf<RunKind>): number {
  const { from, to } = run;
  const path = drawnPath(scene, run);
  const drawn = path.slice(1).reduce((sum, at, i) => sum + feetBetween(path[i]!, at), 0);
  const vehicles = [scene.unit('C')?.id, scene.unit('R')?.id];
  const climbs = [from, to].filter((end) => vehicles.includes(end)).length;
  const { cable_slack_pct, cable_climb_ft } = scene.values;
  return drawn * (1 + cable_slack_pct / 100) + climbs * cable_climb_ft;
}

/** Which runs find an item; `more` is added to every need, to see whether a hair would matter. */
function served(scene: Scene, kind: RunKind, items: readonly KitItem[], more: number): Set<string> {
  const lying = items
    .filter((item) => item.kind === kind)
    .flatMap((item) => Array.from({ length: item.count }, () => item));
  const runs = scene
    .all(kind)
    .map((run) => ({ run, needed: neededFeet(scene, run) + more }))
    .sort((a, b) => b.needed - a.needed);
  const found = new Set<string>();
  for (const { run, needed } of runs) {
    const fitting = lying
      .filter((item) => item.length_ft != null && item.length_ft >= needed)
      .filter((item) => run.kind !== 'hose' || item.diameter_in === (run.diameter_in ?? null))
      .sort((a, b) => a.length_ft! - b.length_ft!);
    const taken = fitting[0];
    if (!taken) continue;
    lying.splice(lying.indexOf(taken), 1);
    found.add(run.id);
  }
  return found;
}

export function cablesReach(scene: Scene): TwinFinding[] {
  const rule = ['cables-reach', 'deviation'] as const;
  const items = scene.layout.kit?.items ?? null;
  const told = RUN_KINDS.flatMap((kind) => {
    const runs = scene.all(kind);
    const [found, less, more] = [0, -HAIR.ft, HAIR.ft].map((by) =>
      served(scene, kind, items ?? [], by),
    );
    const needs = runs.map((run) => neededFeet(scene, run));
    return runs.map((run, i) => {
      const value = needs[i]!;
      // Two runs of one length are served in either order.
      const twins = needs.some((other, j) => j !== i && Math.abs(other - value) < HAIR.ft);
      const tie = less!.has(run.id) !== more!.has(run.id) || (twins && found!.size < runs.length);
      const status = found!.has(run.id) ? 'meets' : 'not-met';
      const unsized = run.kind === 'hose' && run.diameter_in === undefined;
      if (!items || unsized) return tell(...rule, [run.id], 'not-known', { value, unit: 'ft' });
      return tell(...rule, [run.id], status, { value, unit: 'ft', tie });
    });
  });
  return told.length > 0 ? told : [tell(...rule, [], 'n/a')];
}

export function kitCovers(scene: Scene): TwinFinding[] {
  const rule = ['kit-covers', 'deviation'] as const;
  const drawn = (kind: Kind): number => scene.all(kind).length;
  // Probes of a P that is not in use are still pieces on the truck, so every system is asked.
  const most = (count: (system: System) => number): number =>
    Math.max(...LETTERS.map((system) => count(system)));
  const serving = (system: System) =>
    (['z-probe', 'y-probe'] as const).flatMap((kind) => scene.probe(kind, system) ?? []);
  const leadsOf = (system: System): number => {
    const ends = [...serving(system), ...scene.rods(system)].map(({ id }) => id);
    return scene.all('test-lead').filter(({ to }) => ends.includes(to)).length;
  };
  const needs: Record<string, number> = {
    probe: most((system) => serving(system).length),
    'test-lead': most(leadsOf),
    tester: Math.min(1, drawn('tester')),
  };
  for (const kind of ['rod', 'jumper', 'ground-cable', 'bond-cable', 'hose'] as const)
    needs[kind] = drawn(kind);
  const items = scene.layout.kit?.items ?? null;
  const told = Object.entries(needs)
    .filter(([kind]) =>
      kind === 'probe' ? drawn('z-probe') + drawn('y-probe') > 0 : drawn(kind as Kind) > 0,
    )
    .map(([kind, needed]) => {
      const has = (items ?? [])
        .filter((item) => item.kind === kind)
        .reduce((sum, item) => sum + item.count, 0);
      if (!items) return tell(...rule, [kind], 'not-known', { value: needed, unit: 'count' });
      const status = needed <= has ? 'meets' : 'not-met';
      return tell(...rule, [kind], status, { value: needed, unit: 'count' });
    });
  return told.length > 0 ? told : [tell(...rule, [], 'n/a')];
}
