import type { Conditions, Kit, Layout, LayoutPiece, Liquid, Unit } from '../lib/layout';
import type { LonLat } from '../lib/geo';
import { step } from '../tiles/curves';
import type { Ft } from '../tiles/scene';
import { circle, fromFeet, type FromFeet } from './feet';

/** Where something is made fast on a unit: feet ahead of and right of its middle. */
type On = { readonly ahead: number; readonly right: number };

export type UnitAt = {
  readonly at: Ft;
  readonly heading_deg: number;
  readonly length_ft?: number;
  readonly width_ft?: number;
};

export type SystemAt = {
  readonly rods: readonly Ft[];
  readonly driven_ft: number;
  /** Where the ground cable's clamp sits on the system's unit. */
  readonly clamp: On;
  /** Points the cable is laid round by on its way to the first rod. */
  readonly round?: readonly Ft[];
  readonly y?: Ft;
};

/** An arrangement as the demo's authors wrote it down: feet, in the order a crew would say it. */
export type Arrangement = {
  readonly name: string;
  readonly planned_at: string;
  readonly conditions: Conditions;
  readonly liquid: Liquid | null;
  readonly kit: Kit | null;
  readonly casualty: UnitAt;
  readonly receiving?: UnitAt & { readonly vent: On };
  readonly pump?: UnitAt;
  readonly leak: Ft;
  readonly pool?: readonly Ft[];
  readonly zone?: { readonly centre: Ft; readonly hot_ft: number; readonly warm_ft: number };
  readonly systems?: { readonly C: SystemAt; readonly R: SystemAt; readonly P: SystemAt };
  readonly z?: Ft;
  readonly tester?: Ft;
  /** The system whose test leads are laid out first. */
  readonly leads_for?: 'C' | 'R' | 'P';
  readonly bonds?: { readonly toReceiving: readonly [On, On]; readonly toPump: readonly [On, On] };
  readonly hoses?: {
    readonly suction: readonly [On, On];
    readonly delivery: readonly [On, On];
    readonly diameter_in: number;
  };
  readonly note?: { readonly at: Ft; readonly text: string };
};

type Units = {
  readonly casualty: Unit;
  readonly receiving: Unit | null;
  readonly pump: Unit | null;
};

export function arrange(origin: LonLat, plan: Arrangement): Layout {
  const feet = fromFeet(origin);
  const units = unitsOf(plan, feet);
  return {
    version: 1,
    name: plan.name,
    origin,
    planned_at: plan.planned_at,
    pump: plan.pump ? 'separate' : null,
    conditions: plan.conditions,
    liquid: plan.liquid,
    kit: plan.kit,
    pieces: [
      units.casualty,
      ...(units.receiving ? [units.receiving] : []),
      ...(units.pump ? [units.pump] : []),
      ...hazards(plan, feet),
      ...grounding(plan, units, feet),
      ...betweenUnits(plan, feet),
      ...testing(plan, feet),
      ...(plan.note
        ? [{ id: 'note-1', kind: 'note' as const, at: feet.at(plan.note.at), text: plan.note.text }]
        : []),
    ],
  };
}

function unitsOf(plan: Arrangement, feet: FromFeet): Units {
  const unit = <K extends Unit['kind']>(id: string, kind: K, place: UnitAt) => {
    const { at, heading_deg, length_ft, width_ft } = place;
    return { id, kind, at: feet.at(at), heading_deg, ...sized(length_ft, width_ft) } as Unit;
  };
  return {
    casualty: unit('casualty', 'casualty-vehicle', plan.casualty),
    receiving: plan.receiving ? unit('receiving', 'receiving-vehicle', plan.receiving) : null,
    pump: plan.pump ? unit('pump', 'pump', plan.pump) : null,
  };
}

const sized = (length_ft?: number, width_ft?: number) => ({
  ...(length_ft === undefined ? {} : { length_ft }),
  ...(width_ft === undefined ? {} : { width_ft }),
});

const onUnit = (unit: UnitAt, { ahead, right }: On): Ft =>
  step(unit.at, unit.heading_deg, ahead, right);

function hazards(plan: Arrangement, feet: FromFeet): LayoutPiece[] {
  const pieces: LayoutPiece[] = [{ id: 'leak', kind: 'release-point', at: feet.at(plan.leak) }];
  if (plan.pool) pieces.push({ id: 'pool', kind: 'pool', rings: [feet.ring(plan.pool)] });
  if (plan.receiving) {
    const at = feet.at(onUnit(plan.receiving, plan.receiving.vent));
    pieces.push({ id: 'vent', kind: 'vent', at, of: 'receiving' });
  }
  if (plan.zone) {
    const { centre, hot_ft, warm_ft } = plan.zone;
    pieces.push(
      { id: 'hot', kind: 'hot-zone', rings: [feet.ring(circle(centre, hot_ft))] },
      { id: 'warm', kind: 'warm-zone', rings: [feet.ring(circle(centre, warm_ft))] },
    );
  }
  return pieces;
}

const SYSTEM_UNITS = { C: 'casualty', R: 'receiving', P: 'pump' } as const;
const LETTERS = ['C', 'R', 'P'] as const;

/** Rods with their jumpers, and the cable from each unit to the first rod of its system. */
function grounding(plan: Arrangement, units: Units, feet: FromFeet): LayoutPiece[] {
  const { systems } = plan;
  if (!systems) return [];
  return LETTERS.flatMap((letter) => {
    const { rods, driven_ft, clamp, round = [] } = systems[letter];
    const name = SYSTEM_UNITS[letter];
    const unit = plan[name];
    const id = (index: number): string => `rod-${letter.toLowerCase()}${index + 1}`;
    const drawn = rods.map((at, index): LayoutPiece => ({
      id: id(index),
      kind: 'rod',
      label: `${letter}${index + 1}`,
      at: feet.at(at),
      system: letter,
      length_ft: 6,
      driven_ft,
      diameter_in: 0.625,
    }));
    const jumpers = rods.slice(1).map((at, index): LayoutPiece => ({
      id: `jumper-${letter.toLowerCase()}${index + 1}`,
      kind: 'jumper',
      path: feet.path([rods[index]!, at]),
      from: id(index),
      to: id(index + 1),
    }));
    if (!unit || !units[name] || !rods[0]) return [...drawn, ...jumpers];
    const path = feet.path([onUnit(unit, clamp), ...round, rods[0]]);
    const cable: LayoutPiece = {
      id: `ground-${letter.toLowerCase()}`,
      kind: 'ground-cable',
      path,
      from: name,
      to: id(0),
    };
    return [...drawn, ...jumpers, cable];
  });
}

/** Bond cables and hoses. */
function betweenUnits(plan: Arrangement, feet: FromFeet): LayoutPiece[] {
  const { casualty, receiving, pump, bonds, hoses } = plan;
  if (!receiving || !pump) return [];
  const run = (from: UnitAt, to: UnitAt, [start, end]: readonly [On, On]): LonLat[] =>
    feet.path([onUnit(from, start), onUnit(to, end)]);
  const pieces: LayoutPiece[] = [];
  if (bonds) {
    pieces.push(
      {
        id: 'bond-r',
        kind: 'bond-cable',
        path: run(casualty, receiving, bonds.toReceiving),
        from: 'casualty',
        to: 'receiving',
      },
      {
        id: 'bond-p',
        kind: 'bond-cable',
        path: run(casualty, pump, bonds.toPump),
        from: 'casualty',
        to: 'pump',
      },
    );
  }
  if (hoses) {
    const { diameter_in } = hoses;
    pieces.push(
      {
        id: 'hose-suction',
        kind: 'hose',
        path: run(casualty, pump, hoses.suction),
        from: 'casualty',
        to: 'pump',
        diameter_in,
      },
      {
        id: 'hose-delivery',
        kind: 'hose',
        path: run(pump, receiving, hoses.delivery),
        from: 'pump',
        to: 'receiving',
        diameter_in,
      },
    );
  }
  return pieces;
}

/** Probes, tester, and the three leads of the system that is read first. */
function testing(plan: Arrangement, feet: FromFeet): LayoutPiece[] {
  const { z, tester, systems, leads_for } = plan;
  const pieces: LayoutPiece[] = [];
  if (z) pieces.push({ id: 'z', kind: 'z-probe', label: 'Z', at: feet.at(z) });
  for (const letter of LETTERS) {
    const y = systems?.[letter].y;
    if (!y) continue;
    const id = `y-${letter.toLowerCase()}`;
    pieces.push({ id, kind: 'y-probe', label: `Y-${letter}`, at: feet.at(y), serves: [letter] });
  }
  if (!tester) return pieces;
  pieces.push({ id: 'tester', kind: 'tester', at: feet.at(tester) });
  const first = leads_for ? systems?.[leads_for] : undefined;
  if (!z || !first?.y || !leads_for || !first.rods[0]) return pieces;
  const letter = leads_for.toLowerCase();
  const lead = (id: string, end: Ft, to: string): LayoutPiece => ({
    id,
    kind: 'test-lead',
    path: feet.path([tester, end]),
    from: 'tester',
    to,
  });
  return [
    ...pieces,
    lead('lead-z', z, 'z'),
    lead('lead-y', first.y, `y-${letter}`),
    lead('lead-x', first.rods[0], `rod-${letter}1`),
  ];
}
