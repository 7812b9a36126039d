import { distance, meanOf, metresToFeet, threeDigits, type LocalPlane, type Vec } from '../geo';
import type { Kind, Piece, PieceOf, Probe, Rod, Run } from './pieces';
import { placeOf, placesOf, planeOf } from './plan';
import {
  isRun,
  nameOf,
  piecesOf,
  pumpIsSeparate,
  rodsOf,
  servedBy,
  systemsInUse,
  UNIT_WORDS,
  unitOf,
} from './queries';
import type { Layout, Sheet } from './schema';
import type { System } from './values';

/**
 * The layout told in ordered sentences, for who does not see the plan or has only a radio:
 * units, where vapour comes from, zones, the systems rod by rod, the test line, what joins what,
 * conditions, and what lies under and over.
 */
export function describeLayout(sheet: Sheet): string[] {
  const told = new Telling(sheet);
  return [
    told.reference(),
    ...told.units(),
    ...told.sources(),
    ...told.zones(),
    ...told.systems(),
    ...told.testLine(),
    ...told.runs(),
    ...told.conditions(),
    ...told.ground(),
  ];
}

const RUN_WORDS: Record<Run['kind'], string> = {
  jumper: 'Jumpers join',
  'ground-cable': 'Ground cables run from',
  'bond-cable': 'Bond cables run from',
  hose: 'Hoses run from',
  'test-lead': 'Test leads run from',
};

const GROUND_WORDS: Partial<Record<Kind, readonly [string, string]>> = {
  'metal-line': ['metal line', 'metal lines'],
  'overhead-line': ['overhead line', 'overhead lines'],
  'no-drive': ['area of no-drive ground', 'areas of no-drive ground'],
  'low-ground': ['area of low ground', 'areas of low ground'],
  'fixed-point': ['fixed point', 'fixed points'],
};

class Telling {
  private readonly layout: Layout;
  private readonly plane: LocalPlane;
  private readonly from: Vec;
  private readonly fromWords: string;

  constructor(private readonly sheet: Sheet) {
    this.layout = sheet.layout;
    this.plane = planeOf(sheet.layout);
    const casualty = unitOf(this.layout, 'C');
    this.from = casualty ? placeOf(this.plane, casualty) : { x: 0, y: 0 };
    this.fromWords = casualty
      ? 'from the middle of the casualty vehicle'
      : 'from the sheet’s origin';
  }

  reference(): string {
    return `Distances and bearings are ${this.fromWords}.`;
  }

  units(): string[] {
    return (['C', 'R', 'P'] as const).flatMap((system) => {
      const unit = unitOf(this.layout, system);
      const words = capital(`the ${UNIT_WORDS[system]}`);
      if (system === 'P' && !pumpIsSeparate(this.layout)) {
        return this.layout.pump === 'none'
          ? ['There is no pump.']
          : ['The pump is on the receiving vehicle.'];
      }
      if (!unit) return [`${words} is not drawn.`];
      const front = `its front to ${degrees(unit.heading_deg ?? 0)}`;
      return system === 'C'
        ? [`${words} stands with ${front}.`]
        : [`${words} stands ${this.place(placeOf(this.plane, unit))}, ${front}.`];
    });
  }

  sources(): string[] {
    const points = piecesOf(this.layout.pieces, 'release-point').map(
      (point) => `a release point ${this.place(placeOf(this.plane, point))}`,
    );
    const pools = piecesOf(this.layout.pieces, 'pool').map(
      (pool) => `a pool ${this.place(this.middle(pool))}`,
    );
    const vents = piecesOf(this.layout.pieces, 'vent').map(
      (vent) => `a vent ${this.place(placeOf(this.plane, vent))}`,
    );
    const all = [...points, ...pools, ...vents];
    return all.length === 0
      ? ['Where vapour comes from is not drawn.']
      : [`Vapour comes from ${listed(all)}.`];
  }

  zones(): string[] {
    const hot = piecesOf(this.layout.pieces, 'hot-zone').map((zone) => this.edge(zone, 'hot zone'));
    const warm = piecesOf(this.layout.pieces, 'warm-zone').map((zone) =>
      this.edge(zone, 'warm zone'),
    );
    return [...(hot.length === 0 ? ['No hot zone is drawn.'] : hot), ...warm];
  }

  private edge(zone: PieceOf<'hot-zone' | 'warm-zone'>, words: string): string {
    const reach = placesOf(this.plane, zone)[0]!.map((v) => metresToFeet(distance(this.from, v)));
    const [least, most] = [Math.min(...reach), Math.max(...reach)];
    const far = most - least < 1 ? feet(most) : `${least.toFixed(1)} to ${feet(most)}`;
    return `The edge of the ${words} lies ${far} away.`;
  }

  systems(): string[] {
    return systemsInUse(this.layout).flatMap((system) => {
      const rods = rodsOf(this.layout, system);
      if (rods.length === 0) return [`System ${system} has no rods.`];
      const places = rods.map((rod, i) => this.rodPlace(rod, rods[i - 1] ?? null));
      return [`System ${system}: ${listed(places)}.`];
    });
  }

  private rodPlace(rod: Rod, before: Rod | null): string {
    const at = placeOf(this.plane, rod);
    const apart = before ? `, ${this.apart(before, at)} from ${nameOf(before)}` : '';
    return `${nameOf(rod)} ${this.place(at)}${apart}`;
  }

  private apart(other: Rod, at: Vec): string {
    return feet(metresToFeet(distance(placeOf(this.plane, other), at)));
  }

  testLine(): string[] {
    const probes = piecesOf(this.layout.pieces, 'z-probe', 'y-probe');
    const testers = piecesOf(this.layout.pieces, 'tester');
    return [
      ...(probes.length === 0 ? ['No probes are drawn.'] : probes.map((p) => this.probe(p))),
      ...testers.map((tester) => `The tester stands ${this.place(placeOf(this.plane, tester))}.`),
    ];
  }

  private probe(probe: Probe): string {
    const letter = probe.kind === 'z-probe' ? 'Z' : 'Y';
    const serves = systemsWords(servedBy(this.layout, probe));
    return `${letter} probe for ${serves}: ${this.place(placeOf(this.plane, probe))}.`;
  }

  runs(): string[] {
    const runs = this.layout.pieces.filter(isRun);
    return (Object.keys(RUN_WORDS) as Run['kind'][]).flatMap((kind) => {
      const pairs = runs
        .filter((run) => run.kind === kind)
        .map((run) => `${this.called(run.from)} to ${this.called(run.to)}`);
      return pairs.length === 0 ? [] : [`${RUN_WORDS[kind]} ${listed(pairs)}.`];
    });
  }

  conditions(): string[] {
    const { wind, slope } = this.layout.conditions;
    const from = wind?.from_deg == null ? null : `from ${degrees(wind.from_deg)}`;
    const speed = wind?.speed_mph == null ? null : `at ${round(wind.speed_mph)} mph`;
    const swing = wind?.swing_deg == null ? null : `swinging ${round(wind.swing_deg)}° either way`;
    const steep = slope?.grade_pct == null ? '' : `, ${round(slope.grade_pct)} %`;
    return [
      from ? `Wind ${[from, speed, swing].filter(Boolean).join(', ')}.` : 'The wind is not known.',
      slope?.down_deg == null
        ? 'The slope is not known.'
        : `Downhill is to ${degrees(slope.down_deg)}${steep}.`,
    ];
  }

  ground(): string[] {
    const { features } = this.sheet.site;
    const byUtility = new Map<string, number>();
    for (const line of piecesOf(features, 'buried-line')) {
      const words = line.utility.replaceAll('-', ' ');
      byUtility.set(words, (byUtility.get(words) ?? 0) + 1);
    }
    const buried = [...byUtility].map(
      ([words, count]) => `${count} buried ${words} ${count === 1 ? 'line' : 'lines'}`,
    );
    const others = (Object.keys(GROUND_WORDS) as Kind[]).flatMap((kind) => {
      const count = features.filter((feature) => feature.kind === kind).length;
      const words = GROUND_WORDS[kind]!;
      return count === 0 ? [] : [`${count} ${count === 1 ? words[0] : words[1]}`];
    });
    const all = [...buried, ...others];
    return all.length === 0 ? [] : [`Drawn on the site: ${listed(all)}.`];
  }

  private place(at: Vec): string {
    const apart = metresToFeet(distance(this.from, at));
    if (apart < 0.05) return `at its middle`;
    return `${feet(apart)} at ${degrees(this.plane.bearing(this.from, at))}`;
  }

  private middle(piece: Piece): Vec {
    return meanOf(placesOf(this.plane, piece)[0]!.slice(0, -1)) ?? this.from;
  }

  private called(id: string): string {
    const piece = this.layout.pieces.find((candidate) => candidate.id === id);
    if (!piece) return 'nothing';
    if (piece.kind === 'rod') return nameOf(piece);
    if (piece.kind === 'z-probe' || piece.kind === 'y-probe') {
      const letter = piece.kind === 'z-probe' ? 'Z' : 'Y';
      return `${letter} for ${systemsWords(servedBy(this.layout, piece))}`;
    }
    return piece.kind === 'tester' ? 'the tester' : `the ${piece.kind.replaceAll('-', ' ')}`;
  }
}

const feet = (value: number): string => `${value.toFixed(1)} ft`;
const degrees = (value: number): string => `${threeDigits(value)}°`;
const round = (value: number): string => String(Number(value.toFixed(1)));
const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
const systemsWords = (systems: readonly System[]): string => listed(systems);

function listed(words: readonly string[]): string {
  if (words.length < 2) return words.join('');
  const comma = words.some((word) => word.includes(',')) ? '; ' : ', ';
  return `${words.slice(0, -1).join(comma)} and ${words.at(-1)}`;
}
