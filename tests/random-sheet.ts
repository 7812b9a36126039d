import { feetToMetres, localPlane, quantise, type LonLat } from '@/lib/geo';
import {
  emptyLayout,
  SYSTEMS,
  UTILITIES,
  type LayoutPiece,
  type Sheet,
  type SiteFeature,
  type System,
} from '@/lib/layout';
import {
  LIMIT_KEYS,
  LIMIT_TABLE,
  limitsFrom,
  type LimitOverrides,
  type Limits,
} from '@/lib/limits';
import { seededRandom } from './seeded-random';

export type RandomCase = { sheet: Sheet; limits: Limits; asOf: string | null };

/** Places in feet east and north of the origin, before they are put on the ground. */
type Feet = readonly [east: number, north: number];

/**
 * A layout as a hurried planner might leave it: roughly sensible, with anything missing, moved or
 * turned, limits varied. The same seed gives the same case.
 */
export function randomCase(seed: number): RandomCase {
  const random = seededRandom(seed);
  const chance = (part: number): boolean => random() < part;
  const between = (least: number, most: number): number => least + random() * (most - least);
  const pick = <T>(items: readonly T[]): T => items[Math.floor(random() * items.length)]!;

  const origin = quantise([between(-179, 179), between(-65, 65)]);
  const plane = localPlane(origin);
  const put = ([east, north]: Feet): LonLat =>
    quantise(plane.toLonLat({ x: feetToMetres(east), y: feetToMetres(north) }));
  const windFrom = between(0, 360);
  const layoutTurn = chance(0.8) ? windFrom : between(0, 360);
  /** Along the layout's own upwind axis and across it. */
  const out = (along: number, across: number): Feet => {
    const turn = (layoutTurn * Math.PI) / 180;
    return [
      along * Math.sin(turn) + across * Math.cos(turn),
      along * Math.cos(turn) - across * Math.sin(turn),
    ];
  };
  const shake = ([e, n]: Feet, by: number): Feet => [e + between(-by, by), n + between(-by, by)];

  const pieces: LayoutPiece[] = [];
  const spots = new Map<string, Feet>();
  const add = (piece: LayoutPiece, spot?: Feet): void => {
    pieces.push(piece);
    if (spot) spots.set(piece.id, spot);
  };
  const heading = () => between(0, 360);

  if (chance(0.95)) {
    add({ id: 'cv', kind: 'casualty-vehicle', at: put([0, 0]), heading_deg: heading() }, [0, 0]);
  }
  if (chance(0.95)) {
    const spot = shake(out(70, 40), 25);
    add({ id: 'rv', kind: 'receiving-vehicle', at: put(spot), heading_deg: heading() }, spot);
  }
  if (chance(0.9)) {
    const spot = shake(out(45, 30), 20);
    add({ id: 'pu', kind: 'pump', at: put(spot), heading_deg: heading() }, spot);
  }
  if (chance(0.9)) add({ id: 'rp', kind: 'release-point', at: put(shake([3, 2], 6)) });
  if (chance(0.2)) {
    const [e, n] = shake([0, -10], 10);
    const corners: Feet[] = [
      [e, n],
      [e + 8, n + 1],
      [e + 6, n + 9],
      [e - 2, n + 5],
      [e, n],
    ];
    add({ id: 'po', kind: 'pool', rings: [corners.map(put)] });
  }
  if (chance(0.9)) {
    const radius = between(20, 55);
    const ring = Array.from({ length: 24 }, (_, i): Feet => {
      const r = radius * between(0.85, 1.15);
      const turn = (-i * 2 * Math.PI) / 24;
      return [r * Math.sin(turn), r * Math.cos(turn)];
    });
    add({ id: 'hz', kind: 'hot-zone', rings: [[...ring, ring[0]!].map(put)] });
  }
  if (spots.has('rv') && chance(0.8)) {
    add({ id: 'vt', kind: 'vent', of: 'rv', at: put(shake(spots.get('rv')!, 8)) });
  }

  const across: Record<System, number> = { C: -18, R: 16, P: 0 };
  for (const system of SYSTEMS) {
    if (chance(0.06)) continue;
    const rods = 1 + Math.floor(random() * 3);
    let spot = shake(out(between(45, 70), across[system]), 4);
    for (let i = 1; i <= rods; i++) {
      const id = `${system}${i}`;
      add(
        { id, kind: 'rod', system, at: put(spot), length_ft: pick([4, 6, 8]), diameter_in: 0.625 },
        spot,
      );
      if (i > 1 && chance(0.9)) {
        const from = `${system}${i - 1}`;
        const path = [put(spots.get(from)!), put(spot)];
        add({ id: `j${id}`, kind: 'jumper', from, to: id, path });
      }
      spot = shake([spot[0] + out(between(2, 8), 0)[0], spot[1] + out(5, 0)[1]], 1.5);
    }
  }
  const z = shake(out(between(95, 150), 0), 8);
  if (chance(0.9)) add({ id: 'z', kind: 'z-probe', at: put(z) });
  for (const system of SYSTEMS) {
    const rod = spots.get(`${system}1`);
    if (!rod || chance(0.12)) continue;
    const part = between(0.4, 0.8);
    const y = shake([rod[0] + (z[0] - rod[0]) * part, rod[1] + (z[1] - rod[1]) * part], 4);
    add({ id: `y${system}`, kind: 'y-probe', serves: [system], at: put(y) });
  }
  if (chance(0.85)) {
    const spot = shake(out(55, -8), 14);
    add({ id: 'te', kind: 'tester', at: put(spot) }, spot);
    if (chance(0.3) && pieces.some((piece) => piece.id === 'z')) {
      add({ id: 'le', kind: 'test-lead', from: 'te', to: 'z', path: [put(spot), put(z)] });
    }
  }
  const unitIds = ['cv', 'rv', 'pu'].filter((id) => spots.has(id));
  for (const [unit, system] of [
    ['cv', 'C'],
    ['rv', 'R'],
    ['pu', 'P'],
  ] as const) {
    const to = chance(0.9) ? `${system}1` : 'C1';
    if (!spots.has(unit) || !spots.has(to) || chance(0.12)) continue;
    const path = [put(spots.get(unit)!), put(spots.get(to)!)];
    add({ id: `g${system}`, kind: 'ground-cable', from: unit, to, path });
  }
  unitIds.forEach((from, i) => {
    for (const to of unitIds.slice(i + 1)) {
      const path = [put(spots.get(from)!), put(spots.get(to)!)];
      if (chance(0.7)) add({ id: `b-${from}-${to}`, kind: 'bond-cable', from, to, path });
      if (chance(0.4)) {
        add({ id: `h-${from}-${to}`, kind: 'hose', from, to, path, diameter_in: pick([3, 4]) });
      }
    }
  });

  const features: SiteFeature[] = [];
  const lines = Math.floor(random() * 5);
  for (let i = 0; i < lines; i++) {
    const middle = shake(out(60, 0), 70);
    const turn = between(0, Math.PI);
    const path = [-2, -1, 0, 1, 2].map((step): Feet => [
      middle[0] + step * 60 * Math.sin(turn) + between(-8, 8),
      middle[1] + step * 60 * Math.cos(turn) + between(-8, 8),
    ]);
    features.push({
      id: `l${i}`,
      kind: 'buried-line',
      utility: pick(UTILITIES),
      quality: pick(['A', 'B', 'C', 'D']),
      material: pick(['metal', 'nonmetal', 'unknown']),
      private: chance(0.2),
      ...(chance(0.7) && { diameter_in: pick([2, 6, 12]) }),
      paths: [path.map(put)],
    });
  }
  if (chance(0.3)) {
    const path = [put(out(30, -60)), put(out(90, -50)), put(out(150, -20))];
    features.push({ id: 'm0', kind: 'metal-line', what: pick(['rail', 'fence']), path });
  }
  if (chance(0.4)) {
    const volts = chance(0.8) ? { volts: pick([7200, 69_000, 230_000, 1_200_000]) } : {};
    features.push({
      id: 'o0',
      kind: 'overhead-line',
      ...volts,
      path: [put(out(20, -70)), put(out(80, 70))],
    });
  }
  for (const kind of ['no-drive', 'low-ground'] as const) {
    if (!chance(0.4)) continue;
    const [e, n] = shake(out(60, 10), 30);
    const ring: Feet[] = [
      [e, n],
      [e + 25, n],
      [e + 25, n + 18],
      [e, n + 18],
      [e, n],
    ];
    features.push({ id: kind, kind, rings: [ring.map(put)] });
  }

  const observed = Date.parse('2031-05-04T14:00:00Z') - between(-10, 60) * 60_000;
  const overrides: LimitOverrides = Object.fromEntries(
    LIMIT_KEYS.filter(() => chance(0.15)).map((key) => [
      key,
      LIMIT_TABLE[key].value * between(0.85, 1.15),
    ]),
  );
  const answers = Object.fromEntries(
    [...UTILITIES, 'private']
      .filter(() => chance(0.85))
      .map((name) => [name, { answer: pick(['marked', 'clear', 'waiting'] as const) }]),
  );
  const sheet: Sheet = {
    layout: {
      ...emptyLayout(origin, `case ${seed}`),
      planned_at: '2031-05-04T14:00:00Z',
      pump: chance(0.8) ? 'separate' : pick(['on-receiving-vehicle', 'none', null]),
      conditions: {
        wind: chance(0.9)
          ? {
              from_deg: windFrom,
              speed_mph: chance(0.1) ? between(0, 3) : between(3, 20),
              ...(chance(0.9) && { swing_deg: pick([0, 10, 20, 30]) }),
              observed_at: new Date(observed).toISOString(),
            }
          : null,
        slope: chance(0.85)
          ? {
              down_deg: chance(0.7)
                ? windFrom + 180 > 360
                  ? windFrom - 180
                  : windFrom + 180
                : between(0, 360),
              grade_pct: chance(0.15) ? between(0, 1) : between(1, 8),
            }
          : null,
      },
      liquid: chance(0.8) ? { name: 'n-Hexane', ...(chance(0.9) && { flash_point_c: -23 }) } : null,
      kit: chance(0.7)
        ? {
            items: [
              { kind: 'rod', length_ft: 8, diameter_in: 0.625, count: pick([3, 6, 9]) },
              { kind: 'jumper', length_ft: 10, count: pick([1, 3, 6]) },
              { kind: 'ground-cable', length_ft: pick([50, 75]), count: 2 },
              { kind: 'ground-cable', length_ft: 100, count: 1 },
              { kind: 'bond-cable', length_ft: pick([75, 125]), count: 2 },
              { kind: 'hose', length_ft: 100, diameter_in: 4, count: 2 },
              { kind: 'probe', count: pick([1, 2]) },
              { kind: 'test-lead', length_ft: 150, count: 2 },
              { kind: 'tester', count: 1 },
            ],
          }
        : null,
      pieces,
    },
    site: {
      features,
      answers,
      overhead_none_known_as_of: chance(0.5) ? '2031-05-03T15:00:00Z' : null,
      locates: chance(0.8)
        ? [
            {
              ticket: 'T-1',
              lawful_start: '2031-05-02T00:00:00Z',
              valid_until: pick(['2031-05-03T00:00:00Z', '2031-05-12T00:00:00Z']),
              emergency: chance(0.2),
            },
          ]
        : [],
    },
  };
  const acceptance = chance(0.8) ? { max_ohm: 25, authority: 'invented' } : null;
  return { sheet, limits: limitsFrom(overrides, acceptance), asOf: '2031-05-04T14:00:00Z' };
}

/** How many cases a property takes here; the whole count is for the soak. */
export const cases = (whole: number): number =>
  process.env.SOAK ? whole : Math.max(200, Math.ceil(whole / 10));
