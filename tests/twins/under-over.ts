import type { BuriedLine } from '@/lib/layout';
import { feetToPath, feetBetweenPaths, inArea, type Flat } from './ground';
import { HAIR, near, tell, type Scene, type TwinFinding } from './scene';
import { answerOf, OWNERS } from './test-line';

/** What is under and over us? */

const electricOrGas = (utility: string): boolean =>
  utility === 'electric' || utility === 'gas-oil-steam';

export function buriedLinesKnown(scene: Scene): TwinFinding[] {
  return OWNERS.map((owner) => {
    const gate = electricOrGas(owner) ? 'stop' : 'ack';
    const answer = answerOf(scene, owner);
    if (answer === null) return tell('buried-lines-known', gate, [owner], 'not-known');
    const drawn = scene
      .all('buried-line')
      .some((line) => (line.private === true ? 'private' : line.utility) === owner);
    const agrees = drawn === (answer === 'marked');
    return tell('buried-lines-known', gate, [owner], agrees ? 'meets' : 'caution');
  });
}

/** Feet from a place to the line's side: half the diameter off the distance to its middle. */
function clearance(scene: Scene, at: Flat, { paths, diameter_in }: BuriedLine): number {
  const feet = paths.map((path) => feetToPath(at, scene.path(path)));
  return Math.min(...feet) - (diameter_in ?? 12) / 12 / 2;
}

export function clearOfBuriedLines(scene: Scene): TwinFinding[] {
  const lines = scene.all('buried-line');
  const pieces = [...scene.all('rod'), ...scene.all('z-probe'), ...scene.all('y-probe')];
  const rule = 'clear-of-buried-lines';
  if (lines.length === 0 || pieces.length === 0) return [tell(rule, 'deviation', [], 'n/a')];
  const { buried_tolerance_ft: tolerance, ...values } = scene.values;
  const doubts = {
    A: values.doubt_a_ft,
    B: values.doubt_b_ft,
    C: values.doubt_c_ft,
    D: values.doubt_d_ft,
  };
  return pieces.flatMap((piece) => {
    const measured = lines.map((line) => clearance(scene, scene.flat(piece.at), line));
    const nearest = Math.min(...measured);
    return lines.flatMap((line, i) => {
      const value = measured[i]!;
      const listed = value < 30 || value === nearest;
      const maybe =
        near(value, 'ft', [30]) ||
        (value >= 30 && value - nearest < HAIR.ft && measured.length > 1) ||
        (nearest < 30 && near(nearest, 'ft', [30]));
      if (!listed && !maybe) return [];
      const quality = line.quality ?? 'D';
      const reach = tolerance + doubts[quality];
      const grave = electricOrGas(line.utility);
      const isRod = piece.kind === 'rod';
      const status = !isRod
        ? value < reach
          ? 'caution'
          : 'meets'
        : value < tolerance
          ? 'not-met'
          : value < reach
            ? grave && (quality === 'C' || quality === 'D')
              ? 'not-met'
              : 'caution'
            : 'meets';
      const gate = isRod && grave && value < tolerance ? 'stop' : 'deviation';
      const tie = near(value, 'ft', [tolerance, reach]);
      return [tell(rule, gate, [piece.id, line.id], status, { value, unit: 'ft', tie, maybe })];
    });
  });
}

export function locatesCurrent({ site, layout, asOf }: Scene): TwinFinding[] {
  const rule = 'locates-current';
  if (site.locates.length === 0) return [tell(rule, 'deviation', [], 'not-known')];
  const when = layout.planned_at ?? asOf;
  return site.locates.map(({ ticket, lawful_start, valid_until, emergency }) => {
    const startMissing = emergency !== true && lawful_start == null;
    if (when === null || valid_until == null || startMissing)
      return tell(rule, 'deviation', [ticket], 'not-known');
    const begun = emergency === true || Date.parse(lawful_start!) <= Date.parse(when);
    const runs = Date.parse(when) <= Date.parse(valid_until);
    return tell(rule, 'deviation', [ticket], begun && runs ? 'meets' : 'not-met');
  });
}

/** 29 CFR 1926.1408 Table A, typed again from the regulation. */
function tableA(volts: number): number | null {
  if (volts <= 50_000) return 10;
  if (volts <= 200_000) return 15;
  if (volts <= 350_000) return 20;
  if (volts <= 500_000) return 25;
  if (volts <= 750_000) return 35;
  if (volts <= 1_000_000) return 45;
  return null;
}

export function clearOfOverhead(scene: Scene): TwinFinding[] {
  const rule = ['clear-of-overhead', 'deviation'] as const;
  const lines = scene.all('overhead-line');
  if (lines.length === 0) {
    const noneKnown = scene.site.overhead_none_known_as_of !== null;
    return [tell(...rule, [], noneKnown ? 'n/a' : 'not-known')];
  }
  const units = (['C', 'R', 'P'] as const).flatMap((system) => scene.unit(system) ?? []);
  const pieces = [...units, ...scene.all('rod')];
  const undrawn = scene
    .undrawn()
    .flatMap(({ system }) => lines.map(({ id }) => tell(...rule, [system, id], 'not-known')));
  const told = pieces.flatMap((piece) =>
    lines.map((line) => {
      const subjects = [piece.id, line.id];
      if (piece.kind === 'pump' && !scene.pumpApart) return tell(...rule, subjects, 'n/a');
      const path = scene.path(line.path);
      const value =
        piece.kind === 'rod'
          ? feetToPath(scene.flat(piece.at), path)
          : under(scene.footprint(piece)[0]!, path);
      const least = line.volts == null ? null : tableA(line.volts);
      if (least === null) return tell(...rule, subjects, 'not-known', { value, unit: 'ft' });
      const tie = near(value, 'ft', [least]);
      const status = value >= least ? 'meets' : 'not-met';
      return tell(...rule, subjects, status, { value, unit: 'ft', tie });
    }),
  );
  return [...told, ...undrawn];
}

const under = (print: readonly Flat[], path: readonly Flat[]): number =>
  path.some((at) => inArea(at, [print])) ? 0 : feetBetweenPaths(print, path);
