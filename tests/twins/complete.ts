import type { System } from '@/lib/layout';
import { areasMeet, inArea } from './ground';
import { LETTERS, tell, type Scene, type TwinFinding } from './scene';

/** Are the systems complete? */

/** How many separate groups `members` fall into once every link has been followed. */
function groups(members: readonly string[], links: readonly (readonly [string, string])[]): number {
  let left = [...members];
  let count = 0;
  while (left.length > 0) {
    count++;
    const reached = new Set([left[0]!]);
    for (let grown = true; grown;) {
      grown = false;
      for (const [a, b] of links) {
        if (reached.has(a) === reached.has(b)) continue;
        reached.add(a).add(b);
        grown = true;
      }
    }
    left = left.filter((member) => !reached.has(member));
  }
  return count;
}

export function sourcesKnown(scene: Scene): TwinFinding[] {
  const drawn = [scene.hasSource(), scene.all('hot-zone').length > 0, scene.vents().length > 0];
  const value = drawn.filter((is) => !is).length;
  const status = value === 0 ? 'meets' : 'not-known';
  return [tell('sources-known', 'ack', [], status, { value, unit: 'count' })];
}

export function systemComplete(scene: Scene): TwinFinding[] {
  return LETTERS.map((system) => {
    if (!scene.inUse.includes(system)) return tell('system-complete', 'stop', [system], 'n/a');
    const value = scene.rods(system).length;
    const status = value >= 1 ? 'meets' : 'not-met';
    return tell('system-complete', 'stop', [system], status, { value, unit: 'count' });
  });
}

export function rodsJoined(scene: Scene): TwinFinding[] {
  return LETTERS.map((system) => {
    if (!scene.inUse.includes(system)) return tell('rods-joined', 'deviation', [system], 'n/a');
    const rods = scene.rods(system).map(({ id }) => id);
    if (rods.length === 0) return tell('rods-joined', 'deviation', [system], 'not-known');
    const jumpers = scene.all('jumper').map(({ from, to }) => [from, to] as const);
    const value = groups(rods, jumpers);
    const status = value <= 1 ? 'meets' : 'not-met';
    return tell('rods-joined', 'deviation', [system], status, { value, unit: 'count' });
  });
}

export function unitsGrounded(scene: Scene): TwinFinding[] {
  return LETTERS.map((system) => {
    const unit = scene.unit(system);
    if (!scene.inUse.includes(system)) return tell('units-grounded', 'stop', [system], 'n/a');
    const own = new Set(scene.rods(system).map(({ id }) => id));
    const value = scene
      .all('ground-cable')
      .filter(({ from, to }) => from === unit?.id && own.has(to)).length;
    const status = value >= 1 ? 'meets' : 'not-met';
    return tell('units-grounded', 'stop', [system], status, { value, unit: 'count' });
  });
}

export function unitsBonded(scene: Scene): TwinFinding[] {
  // A unit that is not drawn can have no bond, so its letter stays a piece of its own.
  const units = scene.inUse.map((system) => scene.unit(system)?.id ?? `undrawn ${system}`);
  const bonds = scene
    .all('bond-cable')
    .filter(({ from, to }) => units.includes(from) && units.includes(to))
    .map(({ from, to }) => [from, to] as const);
  const value = groups(units, bonds);
  const status = value <= 1 ? 'meets' : 'not-met';
  return [tell('units-bonded', 'stop', [], status, { value, unit: 'count' })];
}

export function cablesSeparate(scene: Scene): TwinFinding[] {
  const systemOf = (id: string): System[] => [
    ...scene.all('rod').flatMap((rod) => (rod.id === id ? [rod.system] : [])),
    ...LETTERS.filter((system) => scene.unit(system)?.id === id),
  ];
  const cables = [...scene.all('jumper'), ...scene.all('ground-cable')];
  if (cables.length === 0) return [tell('cables-separate', 'deviation', [], 'n/a')];
  return cables.map(({ id, from, to }) => {
    const value = new Set([...systemOf(from), ...systemOf(to)]).size;
    const status = value <= 1 ? 'meets' : 'not-met';
    return tell('cables-separate', 'deviation', [id], status, { value, unit: 'count' });
  });
}

export function piecesClear(scene: Scene): TwinFinding[] {
  const units = scene.units();
  const rods = scene.all('rod');
  if (units.length === 0) return [tell('pieces-clear', 'deviation', [], 'n/a')];
  const overlaps = (wider: number): number => {
    const prints = units.map((unit) => scene.footprint(unit, wider));
    const pairs = prints.flatMap((one, i) => prints.slice(i + 1).map((other) => [one, other]));
    const standing = rods.flatMap((rod) => prints.filter((p) => inArea(scene.flat(rod.at), p)));
    return pairs.filter(([one, other]) => areasMeet(one!, other!)).length + standing.length;
  };
  const value = overlaps(0);
  const tie = overlaps(0.01) !== overlaps(-0.01);
  const status = value === 0 ? 'meets' : 'not-met';
  return [tell('pieces-clear', 'deviation', [], status, { value, unit: 'count', tie })];
}

export function acceptanceSet({ limits }: Scene): TwinFinding[] {
  const value = limits.acceptance?.max_ohm ?? null;
  if (value === null) return [tell('acceptance-set', 'stop', [], 'not-known')];
  return [tell('acceptance-set', 'stop', [], 'meets', { value, unit: 'ohm' })];
}

export function liquidKnown({ layout: { liquid } }: Scene): TwinFinding[] {
  const known = Boolean(liquid?.name) && liquid?.flash_point_c != null;
  return [tell('liquid-known', 'ack', [], known ? 'meets' : 'not-known')];
}
