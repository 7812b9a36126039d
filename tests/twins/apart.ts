import { feetBetween } from './ground';
import { DRAWN, near, tell, type Scene, type TwinFinding } from './scene';

/** Are they apart? */

export function systemsApart(scene: Scene): TwinFinding[] {
  const rule = ['systems-apart', 'deviation'] as const;
  const pairs = [
    ['C', 'R'],
    ['C', 'P'],
    ['R', 'P'],
  ] as const;
  return pairs.map((pair) => {
    if (!pair.every((system) => scene.inUse.includes(system))) return tell(...rule, pair, 'n/a');
    const [one, other] = pair.map((system) => scene.rods(system));
    const feet = one!.flatMap((a) => other!.map((b) => feetBetween(a.at, b.at)));
    if (feet.length === 0) return tell(...rule, pair, 'not-known');
    const value = Math.min(...feet);
    const least = scene.values.systems_apart_min_ft - DRAWN;
    const tie = near(value, 'ft', [least]);
    return tell(...rule, pair, value >= least ? 'meets' : 'not-met', { value, unit: 'ft', tie });
  });
}

export function rodsApart(scene: Scene): TwinFinding[] {
  const { rods_apart_min_ft: min, rods_apart_max_ft: max } = scene.values;
  const rods = scene.all('rod');
  const joined = (a: string, b: string): boolean =>
    scene
      .all('jumper')
      .some(({ from, to }) => (from === a && to === b) || (from === b && to === a));
  const found = rods.flatMap((one, i) =>
    rods.slice(i + 1).flatMap((other) => {
      const value = feetBetween(one.at, other.at);
      const isJoined = joined(one.id, other.id);
      // "Nearer than the minimum" is read with the allowance too: what meets is not told of.
      const tooNear = one.system === other.system && value < min - DRAWN;
      const maybe = !isJoined && one.system === other.system && near(value, 'ft', [min - DRAWN]);
      if (!isJoined && !tooNear && !maybe) return [];
      const meets = value >= min - DRAWN && value <= max + DRAWN;
      const tie = near(value, 'ft', [min - DRAWN, max + DRAWN]);
      const subjects = [one.id, other.id];
      const told = { value, unit: 'ft', tie, maybe } as const;
      return [tell('rods-apart', 'deviation', subjects, meets ? 'meets' : 'not-met', told)];
    }),
  );
  if (found.every(({ maybe }) => maybe)) {
    const maybe = found.length > 0;
    return [...found, tell('rods-apart', 'deviation', [], 'n/a', { maybe })];
  }
  return found;
}
