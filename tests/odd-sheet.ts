import { feetToMetres, localPlane, quantise, type LonLat } from '@/lib/geo';
import {
  isUnit,
  SYSTEMS,
  type LayoutPiece,
  type PieceOf,
  type Rod,
  type SiteFeature,
} from '@/lib/layout';
import { LIMIT_KEYS, LIMIT_TABLE } from '@/lib/limits';
import { randomCase, type RandomCase } from './random-sheet';
import { seededRandom } from './seeded-random';

/** Writable all the way down: a case is ours alone, so it may be spoiled in place. */
type Loose<T> = T extends LonLat
  ? T
  : T extends object
    ? { -readonly [K in keyof T]: Loose<T[K]> }
    : T;

/**
 * The random case with what is rare in the field laid on it: holes, second zones and probes, cables
 * led astray, sizes of its own, half-filled entries, every limit moved. The same seed, the same case.
 */
export function oddCase(seed: number): RandomCase {
  const one = structuredClone(randomCase(seed)) as Loose<RandomCase>;
  const random = seededRandom(seed ^ 0x2f6e2b1);
  const chance = (part: number): boolean => random() < part;
  const between = (least: number, most: number): number => least + random() * (most - least);
  const pick = <T>(items: readonly T[]): T => items[Math.floor(random() * items.length)]!;

  const { layout, site } = one.sheet;
  const plane = localPlane(layout.origin);
  const beside = (at: LonLat, east: number, north: number): LonLat => {
    const { x, y } = plane.toPlane(at);
    return quantise(plane.toLonLat({ x: x + feetToMetres(east), y: y + feetToMetres(north) }));
  };
  const ringAbout = (at: LonLat, east: number, north = east): LonLat[] => {
    const turn = between(0, 6);
    const ring = Array.from({ length: 9 }, (_, i) => {
      const [e, n] = [Math.sin(turn + (i * Math.PI) / 4.5), Math.cos(turn + (i * Math.PI) / 4.5)];
      return beside(at, e * east, n * north);
    });
    return [...ring, ring[0]!];
  };
  const pieces = layout.pieces as LayoutPiece[];
  const features = site.features as SiteFeature[];
  const all = <K extends LayoutPiece['kind']>(kind: K) =>
    pieces.filter((piece) => piece.kind === kind) as Loose<PieceOf<K>>[] as PieceOf<K>[];
  const by = (id: string) => pieces.find((piece) => piece.id === id);
  const placeOf = (id: string): LonLat => {
    const piece = by(id);
    return piece && 'at' in piece ? piece.at : layout.origin;
  };
  const change = <K extends LayoutPiece['kind']>(kind: K, part: number, by: () => object): void => {
    for (const piece of all(kind)) if (chance(part)) Object.assign(piece, by());
  };
  const join = (
    id: string,
    kind: 'jumper' | 'ground-cable' | 'test-lead',
    from: string,
    to: string,
  ) => {
    if (by(from) && by(to) && !by(id))
      pieces.push({ id, kind, from, to, path: [placeOf(from), placeOf(to)] });
  };
  const somewhere = (): LonLat => placeOf(pick(['C1', 'R1', 'te', 'pu', 'rv', 'z', 'yC']));

  // Ground: what vapour comes from and how far it is fenced.
  if (chance(0.15)) {
    const at = beside(somewhere(), between(-6, 6), between(-6, 6));
    const rings = [ringAbout(at, between(20, 45)), ringAbout(at, between(4, 15)).reverse()];
    pieces.push({ id: 'hz2', kind: 'hot-zone', rings });
  }
  if (chance(0.08)) {
    // A strip right across a vehicle: it overlaps the footprint without reaching a corner.
    const [west, east] = [-60, 60].map((east) => beside(placeOf('rv'), east, between(-3, 3)));
    const strip = [west!, east!, beside(east!, 0, 1.5), beside(west!, 0, 1.5), west!];
    pieces.push({ id: 'hz3', kind: 'hot-zone', rings: [strip] });
  }
  if (chance(0.12))
    pieces.push({ id: 'po2', kind: 'pool', rings: [ringAbout(somewhere(), between(3, 15))] });
  if (chance(0.2)) {
    const at = beside(layout.origin, between(-30, 30), between(-30, 30));
    pieces.push({ id: 'rp2', kind: 'release-point', at });
  }
  if (chance(0.12)) change('vent', 1, () => ({ of: pick(['cv', undefined]) }));
  if (chance(0.1))
    pieces.push({ id: 'vt2', kind: 'vent', of: 'rv', at: beside(placeOf('rv'), 9, 3) });
  for (const feature of features) {
    if (feature.kind === 'buried-line') {
      if (chance(0.3)) feature.paths = [feature.paths[0]!.slice(0, 3), feature.paths[0]!.slice(3)];
      if (chance(0.15)) delete feature.quality;
      if (chance(0.15)) delete feature.material;
    }
    if (feature.kind === 'no-drive' || feature.kind === 'low-ground') {
      const at = somewhere();
      if (chance(0.4)) feature.rings = [ringAbout(at, between(15, 30)), ringAbout(at, 6).reverse()];
    }
  }
  if (chance(0.3)) {
    // Metal nearly along the test line, and bent away from it.
    const [a, b] = [
      beside(placeOf('C1'), between(-12, 12), 3),
      beside(placeOf('z'), between(-9, 9), 2),
    ];
    const path = [a, beside(a, between(5, 25), between(5, 25)), beside(b, between(-5, 5), -4), b];
    features.push({ id: 'm1', kind: 'metal-line', path: chance(0.5) ? path : [a, b] });
  }
  if (chance(0.25)) {
    const volts = pick([0, 50_000, 50_001, 200_000, 350_000, 400_000, 750_000, 1_000_000]);
    const [a, b] = [beside(somewhere(), -80, between(-30, 30)), beside(somewhere(), 70, 25)];
    features.push({ id: 'o1', kind: 'overhead-line', volts, path: [a, b] });
  }

  // Units and rods of their own size; rods where they should not be.
  for (const kind of ['casualty-vehicle', 'receiving-vehicle', 'pump'] as const) {
    change(kind, 0.2, () => ({ length_ft: between(5, 70), width_ft: between(3, 11) }));
    change(kind, 0.1, () => ({ heading_deg: undefined }));
  }
  change('rod', 0.1, () => ({ driven_ft: between(0.5, 20) }));
  change('rod', 0.1, () => ({ length_ft: undefined }));
  const extraRod = (id: string, system: Rod['system'], at: LonLat): void => {
    pieces.push({ id, kind: 'rod', system, at });
  };
  for (const system of SYSTEMS)
    if (chance(0.1) && by(`${system}1`))
      extraRod(`${system}8`, system, beside(placeOf(`${system}1`), between(-3, 3), between(-3, 3)));
  if (chance(0.08)) extraRod('C9', 'C', beside(placeOf('R1'), between(-8, 8), between(-8, 8)));
  if (chance(0.06)) extraRod('R9', 'R', beside(placeOf(pick(['pu', 'cv', 'rv'])), 1, 1));
  if (chance(0.12)) join('jx', 'jumper', pick(['C1', 'C2']), pick(['R1', 'P1']));
  if (chance(0.06)) join('jy', 'jumper', 'R1', pick(['C2', 'C3', 'R3']));
  if (chance(0.06)) join('jz', 'jumper', 'C2', 'C1');
  if (chance(0.08)) join('gx', 'ground-cable', pick(['cv', 'rv', 'pu']), pick(['C2', 'R2', 'P1']));

  // The test: second probes, probes for some, Y on the wrong side, leads to everything.
  if (chance(0.15))
    pieces.push({
      id: 'z2',
      kind: 'z-probe',
      serves: pick([['R'], ['C', 'P'], ['P'], []]),
      at: beside(placeOf('z'), between(-30, 30), between(-30, 30)),
    });
  if (chance(0.08)) change('z-probe', 1, () => ({ serves: pick([['C'], ['C', 'R'], undefined]) }));
  if (chance(0.08)) change('y-probe', 0.5, () => ({ serves: pick([['C', 'R'], [], undefined]) }));
  for (const y of all('y-probe')) {
    if (!chance(0.12)) continue;
    const [rod, z] = [plane.toPlane(placeOf('C1')), plane.toPlane(placeOf('z'))];
    const part = pick([-0.3, -0.02, 0.02, 1.02, 1.3]);
    y.at = quantise(
      plane.toLonLat({ x: rod.x + (z.x - rod.x) * part, y: rod.y + (z.y - rod.y) * part }),
    );
  }
  for (const to of ['z', 'yC', 'yR', 'C1', 'R1', 'R2'])
    if (chance(0.2)) join(`le-${to}`, 'test-lead', 'te', to);
  // Runs go round things, clamps sit anywhere on a unit, and an end may miss its rod by a little.
  for (const kind of ['test-lead', 'ground-cable', 'hose', 'bond-cable', 'jumper'] as const)
    for (const run of all(kind)) {
      const ends = [run.from, run.to].map((id): LonLat => {
        const end = by(id);
        const on = 1 + (end && isUnit(end) ? 1 : 0) * 0.5;
        return chance(0.2) ? beside(placeOf(id), between(-0.5, 0.5) * on, 0.5) : placeOf(id);
      });
      const bend = beside(ends[0]!, between(-25, 25), between(-25, 25));
      run.path = kind !== 'jumper' && chance(0.15) ? [ends[0]!, bend, ends[1]!] : ends;
    }
  change('hose', 0.15, () => ({ diameter_in: undefined }));

  // Entries half filled in.
  const { wind, slope } = layout.conditions;
  if (wind && chance(0.2)) wind[pick(['speed_mph', 'from_deg', 'observed_at', 'swing_deg'])] = null;
  if (wind && chance(0.12)) Object.assign(wind, { speed_mph: between(0, 3), swing_deg: null });
  if (wind && chance(0.15)) wind.swing_deg = between(30, 100);
  if (slope && chance(0.15)) slope[pick(['down_deg', 'grade_pct'])] = null;
  if (slope && chance(0.3)) slope.down_deg = between(0, 360);
  if (layout.liquid && chance(0.1)) layout.liquid.name = pick([null, '']);
  if (chance(0.15)) layout.planned_at = pick([null, '2031-05-06T02:00:00+02:00']);
  if (chance(0.1)) one.asOf = pick([null, '2031-05-03T00:30:00Z']);
  for (const ticket of [
    { ticket: 'T-2', lawful_start: '2031-05-06T00:00:00Z', valid_until: '2031-05-20T00:00:00Z' },
    { ticket: 'T-3', valid_until: '2031-05-20T00:00:00Z', emergency: chance(0.5) },
    { ticket: 'T-4', lawful_start: '2031-05-01T00:00:00Z', emergency: null },
    { ticket: 'T-5', lawful_start: '2031-05-06T00:00:00Z', valid_until: '2031-05-03T00:00:00Z' },
  ])
    if (chance(0.12)) site.locates.push(ticket);
  if (chance(0.1)) site.answers.electric = null;
  if (layout.kit && chance(0.5)) {
    const { items } = layout.kit;
    for (const item of items) if (chance(0.1)) delete item[pick(['length_ft', 'diameter_in'])];
    items.push({ kind: pick(['clamp', 'coupler', 'driver']), count: 2 });
    items.push({ kind: pick(['jumper', 'rod', 'tester', 'hose']), count: pick([0, 1]) });
    items.push({ kind: 'hose', length_ft: pick([50, 120]), diameter_in: pick([3, 4]), count: 1 });
    items.push({ kind: pick(['ground-cable', 'test-lead']), length_ft: 200, count: 2 });
    if (chance(0.1)) items.length = 0;
  }
  if (chance(0.15)) layout.pump = pick(['none', 'on-receiving-vehicle', null]);
  if (chance(0.5))
    for (const key of LIMIT_KEYS)
      if (chance(0.4)) one.limits.values[key] = LIMIT_TABLE[key].value * between(0.6, 1.5);

  // Now and then a kind is missing altogether, and what hung on it with it.
  if (chance(0.15)) {
    const gone = pick(['units', 'rod', 'tester', 'jumper', 'z-probe', 'y-probe', 'bare'] as const);
    const units = ['casualty-vehicle', 'receiving-vehicle', 'pump'];
    const left = pieces.filter(
      ({ kind }) => gone !== 'bare' && kind !== gone && !(gone === 'units' && units.includes(kind)),
    );
    const ids = new Set(left.map(({ id }) => id));
    const hangs = (end: string | undefined): boolean => end === undefined || ids.has(end);
    layout.pieces = left.filter((piece) => {
      if (piece.kind === 'vent') return hangs(piece.of);
      return !('from' in piece) || (hangs(piece.from) && hangs(piece.to));
    }) as typeof layout.pieces;
  }
  return one as RandomCase;
}

/** Every other case an odd one. */
export const anyCase = (seed: number): RandomCase =>
  seed % 2 === 1 ? oddCase(seed) : randomCase(seed);
