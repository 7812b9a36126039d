import type { Gate, MeasureUnit, Status } from '@/lib/checks';
import type { LonLat } from '@/lib/geo';
import type { Layout, Piece, PieceOf, SiteGround, System, Unit } from '@/lib/layout';
import type { Kind } from '@/lib/layout';
import type { Limits, LimitValues } from '@/lib/limits';
import { flattenAbout, gone, FOOT, type Flat, type Flatten, type FlatRings } from './ground';

export type TwinFinding = {
  readonly id: string;
  readonly status: Status;
  readonly gate: Gate;
  readonly value: number | null;
  readonly unit: MeasureUnit | null;
  /** A hair's breadth may decide the status, so it is not compared. */
  readonly tie: boolean;
  /** A hair's breadth may decide whether the finding is there at all. */
  readonly maybe: boolean;
};

/** What the value may be off a limit before it can no longer be told apart from it. */
export const HAIR: Record<MeasureUnit, number> = {
  ft: 0.01,
  deg: 0.01,
  ratio: 0.001,
  count: 0,
  min: 0.001,
  ohm: 0,
};

export const near = (value: number, unit: MeasureUnit, edges: readonly number[]): boolean =>
  edges.some((edge) => Math.abs(value - edge) < HAIR[unit]);

type Told = Partial<Pick<TwinFinding, 'value' | 'unit' | 'tie' | 'maybe'>>;

export function tell(
  rule: string,
  gate: Gate,
  subjects: readonly string[],
  status: Status,
  { value = null, unit = null, tie = false, maybe = false }: Told = {},
): TwinFinding {
  return { id: `${rule}|${subjects.join(',')}`, status, gate, value, unit, tie, maybe };
}

/** Spacing limits are met within this much. */
export const DRAWN = 0.05;

export const LETTERS = ['C', 'R', 'P'] as const;
const UNIT_KIND = { C: 'casualty-vehicle', R: 'receiving-vehicle', P: 'pump' } as const;

/** What the rules are asked about, read once out of the documents. */
export class Scene {
  readonly flat: Flatten;
  readonly values: LimitValues;
  readonly pieces: readonly Piece[];
  /** False where the pump rides on the receiver or there is none. */
  readonly pumpApart: boolean;
  readonly inUse: readonly System[];

  constructor(
    readonly layout: Layout,
    readonly site: SiteGround,
    readonly limits: Limits,
    readonly asOf: string | null,
  ) {
    this.flat = flattenAbout(layout.origin);
    this.values = limits.values;
    this.pieces = [...layout.pieces, ...site.features];
    this.pumpApart = layout.pump !== 'none' && layout.pump !== 'on-receiving-vehicle';
    this.inUse = this.pumpApart ? LETTERS : ['C', 'R'];
  }

  all<K extends Kind>(kind: K): PieceOf<K>[] {
    return this.pieces.filter((piece): piece is PieceOf<K> => piece.kind === kind);
  }

  unit(system: System): Unit | null {
    return (this.all(UNIT_KIND[system])[0] as Unit | undefined) ?? null;
  }

  /** The units that the rules judge: a pump that is not apart is not one. */
  units(): Unit[] {
    return this.inUse.flatMap((system) => this.unit(system) ?? []);
  }

  /** Units that should stand somewhere and were not drawn. */
  undrawn() {
    return this.inUse
      .filter((system) => this.unit(system) === null)
      .map((system) => ({ system, kind: UNIT_KIND[system] }));
  }

  rods(system: System) {
    return this.all('rod').filter((rod) => rod.system === system);
  }

  probe(kind: 'z-probe' | 'y-probe', system: System): PieceOf<'z-probe' | 'y-probe'> | null {
    const serving = this.all(kind).filter((probe) => (probe.serves ?? this.inUse).includes(system));
    return serving[serving.length - 1] ?? null;
  }

  /** Mean position of the system's rods, on the map. */
  centre(system: System): Flat | null {
    const rods = this.rods(system).map(({ at }) => this.flat(at));
    if (rods.length === 0) return null;
    const mean = (axis: 0 | 1): number => rods.reduce((sum, at) => sum + at[axis], 0) / rods.length;
    return [mean(0), mean(1)];
  }

  rings(of: { readonly rings: readonly (readonly LonLat[])[] }): FlatRings {
    return of.rings.map((ring) => ring.map(this.flat));
  }

  path(path: readonly LonLat[]): Flat[] {
    return path.map(this.flat);
  }

  /** The ground a unit covers, `wider` feet more on every side. */
  footprint(unit: Unit, wider = 0): FlatRings {
    const [length, width] = unit.kind === 'pump' ? [6, 4] : [65, 8.5];
    const ahead = ((unit.length_ft ?? length) / 2 + wider) * FOOT;
    const aside = ((unit.width_ft ?? width) / 2 + wider) * FOOT;
    const corner = (forward: number, right: number): Flat => {
      const off = (Math.atan2(right, forward) * 180) / Math.PI;
      const heading = unit.heading_deg ?? 0;
      return this.flat(gone(unit.at, heading + off, Math.hypot(forward, right)));
    };
    const first = corner(ahead, aside);
    return [[first, corner(-ahead, aside), corner(-ahead, -aside), corner(ahead, -aside), first]];
  }

  /** Where vapour comes from, as places to take directions from. */
  sourcePlaces(): LonLat[] {
    return [
      ...this.all('release-point').map(({ at }) => at),
      ...this.all('pool').flatMap(({ rings }) => rings.flat()),
    ];
  }

  hasSource(): boolean {
    return this.all('release-point').length + this.all('pool').length > 0;
  }

  /** Openings of the receiving vehicle; one that names no unit is taken for the receiver's. */
  vents() {
    const receiver = this.unit('R');
    return this.all('vent').filter((vent) => vent.of === undefined || vent.of === receiver?.id);
  }
}

/** Feet on the map; as true as GeographicLib within the ground that a layout covers. */
export const apart = (a: Flat, b: Flat): number => Math.hypot(a[0] - b[0], a[1] - b[1]);
