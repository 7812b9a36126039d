import type { Gate, Status } from '@/lib/checks';
import type { LonLat } from '@/lib/geo';
import type { Piece, Unit } from '@/lib/layout';
import {
  areasMeet,
  bearing,
  feetBetween,
  feetBetweenAreas,
  feetToArea,
  feetToEdge,
  inArea,
  turnBetween,
  type FlatRings,
} from './ground';
import { HAIR, near, tell, type Scene, type TwinFinding } from './scene';

/** Is everything in the right place? */

type Standing = Extract<Piece, { at: LonLat }>;

const isUnit = (piece: Standing): piece is Unit =>
  piece.kind === 'pump' || piece.kind === 'receiving-vehicle' || piece.kind === 'casualty-vehicle';
const isProbe = ({ kind }: Standing): boolean => kind === 'z-probe' || kind === 'y-probe';

const judged = (scene: Scene, ...kinds: readonly Standing['kind'][]): Standing[] =>
  scene.pieces.filter((piece): piece is Standing =>
    (kinds as readonly string[]).includes(piece.kind),
  );

/** One answer for each piece of these kinds; n/a for a pump that is not apart. */
function forEach(
  scene: Scene,
  rule: string,
  gate: (kind: Standing['kind']) => Gate,
  kinds: readonly Standing['kind'][],
  answer: (piece: Standing) => [Status, Partial<TwinFinding>?],
  /** Where the rule applies to nothing at all, it does not apply to what is not drawn. */
  appliesToNothing = false,
): TwinFinding[] {
  const told = judged(scene, ...kinds).map((piece) => {
    const outOfUse = piece.kind === 'pump' && !scene.pumpApart;
    const [status, more] = outOfUse ? (['n/a'] as const) : answer(piece);
    return tell(rule, gate(piece.kind), [piece.id], status, more);
  });
  // "A unit not drawn can't meet", and it goes by its letter: it is answered not known.
  const undrawn = scene.undrawn().flatMap(({ system, kind }) => {
    if (!kinds.includes(kind)) return [];
    return [tell(rule, gate(kind), [system], appliesToNothing ? 'n/a' : 'not-known')];
  });
  const all = [...told, ...undrawn];
  return all.length > 0 ? all : [tell(rule, gate('rod'), [], 'n/a')];
}

const EVERYTHING = [
  'rod',
  'z-probe',
  'y-probe',
  'tester',
  'pump',
  'receiving-vehicle',
] as const satisfies readonly Standing['kind'][];
const deviation = (): Gate => 'deviation';

export function outsideHotZone(scene: Scene): TwinFinding[] {
  const zones = scene.all('hot-zone').map((zone) => scene.rings(zone));
  const gate = (kind: Standing['kind']): Gate =>
    kind === 'tester' || kind === 'pump' ? 'stop' : 'deviation';
  /** Feet beyond the zone's edge, negative inside. */
  const beyond = (piece: Standing, zone: FlatRings): number => {
    const point = (at: (typeof zone)[number][number]): number =>
      (inArea(at, zone) ? -1 : 1) * feetToEdge(at, zone);
    if (!isUnit(piece)) return point(scene.flat(piece.at));
    const print = scene.footprint(piece);
    if (!areasMeet(print, zone)) return feetBetweenAreas(print, zone);
    return Math.min(0, ...print[0]!.map(point));
  };
  const isInside = (piece: Standing, zone: FlatRings, wider: number): boolean =>
    isUnit(piece)
      ? areasMeet(scene.footprint(piece, wider), zone)
      : inArea(scene.flat(piece.at), zone);
  return forEach(scene, 'outside-hot-zone', gate, EVERYTHING, (piece) => {
    if (zones.length === 0) return ['not-known'];
    const value = Math.min(...zones.map((zone) => beyond(piece, zone)));
    const inside = zones.some((zone) => isInside(piece, zone, 0));
    const tie =
      near(value, 'ft', [scene.values.zone_setback_ft, ...(isUnit(piece) ? [] : [0])]) ||
      zones.some((zone) => isInside(piece, zone, HAIR.ft) !== isInside(piece, zone, -HAIR.ft));
    const status = inside ? 'not-met' : value < scene.values.zone_setback_ft ? 'caution' : 'meets';
    return [status, { value, unit: 'ft', tie }];
  });
}

/** What the rules of wind and slope need to know of today's air, null where it was not entered. */
export function air({ layout: { conditions }, values }: Scene) {
  const { wind, slope } = conditions;
  const speed = wind?.speed_mph ?? null;
  const swing = wind?.swing_deg ?? null;
  const grade = slope?.grade_pct ?? null;
  return {
    from: wind?.from_deg ?? null,
    speed,
    calm: speed !== null && speed < values.calm_below_mph,
    /** The swing counted with: never less than the floor. */
    w: swing === null ? null : Math.max(swing, values.swing_floor_deg),
    uphill: slope?.down_deg == null ? null : (slope.down_deg + 180) % 360,
    grade,
    level: grade !== null && grade < values.level_below_pct,
  };
}

/** Degrees of ground both upwind and uphill; null where there is no such thing. */
export function wedge(scene: Scene): number | null {
  const { from, speed, calm, w, uphill, grade, level } = air(scene);
  if (from === null || speed === null || w === null || uphill === null || grade === null)
    return null;
  if (calm || level) return null;
  return Math.max(0, Math.min(2 * (90 - w), 180 - w - turnBetween(from, uphill)));
}

/** The greatest angle over all sources between source → piece and a direction. */
const worstTurn = (scene: Scene, piece: Standing, towards: number): number =>
  Math.max(
    ...scene.sourcePlaces().map((source) => turnBetween(bearing(source, piece.at), towards)),
  );

/** From less than a foot a millimetre turns the direction by more than a hair. */
const onSource = (scene: Scene, piece: Standing): boolean =>
  scene.sourcePlaces().some((source) => feetBetween(source, piece.at) < 1);

export function upwind(scene: Scene): TwinFinding[] {
  const { from, speed, calm, w } = air(scene);
  const most = scene.values.upwind_max_deg;
  return forEach(scene, 'upwind', deviation, EVERYTHING, (piece) => {
    if (from === null || speed === null || w === null || !scene.hasSource()) return ['not-known'];
    if (calm) return ['caution'];
    const value = worstTurn(scene, piece, from);
    const tie = near(value, 'deg', [most - w, most]) || onSource(scene, piece);
    const bad = isProbe(piece) ? 'caution' : 'not-met';
    const status = value + w <= most ? 'meets' : value <= most ? 'caution' : bad;
    return [status, { value, unit: 'deg', tie }];
  });
}

export function uphill(scene: Scene): TwinFinding[] {
  const { uphill: up, grade, level } = air(scene);
  const most = scene.values.uphill_max_deg;
  const common = wedge(scene);
  const windGoverns = common !== null && common < scene.values.wedge_min_deg;
  return forEach(
    scene,
    'uphill',
    deviation,
    EVERYTHING,
    (piece) => {
      if (level) return ['n/a'];
      if (up === null || grade === null || !scene.hasSource()) return ['not-known'];
      const value = worstTurn(scene, piece, up);
      const tie =
        near(value, 'deg', [most]) ||
        onSource(scene, piece) ||
        (common !== null && near(common, 'deg', [scene.values.wedge_min_deg]));
      const bad = isProbe(piece) || windGoverns ? 'caution' : 'not-met';
      return [value <= most ? 'meets' : bad, { value, unit: 'deg', tie }];
    },
    level,
  );
}

export function windAndSlopeAgree(scene: Scene): TwinFinding[] {
  const { calm, level } = air(scene);
  const rule = ['wind-and-slope-agree', 'ack', []] as const;
  if (calm || level) return [tell(...rule, 'n/a')];
  const value = wedge(scene);
  if (value === null) return [tell(...rule, 'not-known')];
  const least = scene.values.wedge_min_deg;
  const tie = near(value, 'deg', [least]);
  return [tell(...rule, value >= least ? 'meets' : 'caution', { value, unit: 'deg', tie })];
}

export function windFresh({ layout, asOf, values }: Scene): TwinFinding[] {
  const observed = layout.conditions.wind?.observed_at ?? null;
  if (observed === null || asOf === null) return [tell('wind-fresh', 'ack', [], 'not-known')];
  const value = (Date.parse(asOf) - Date.parse(observed)) / 60_000;
  const tie = near(value, 'min', [0, values.wind_fresh_min]);
  if (value < 0) return [tell('wind-fresh', 'ack', [], 'not-known', { tie })];
  const status = value <= values.wind_fresh_min ? 'meets' : 'caution';
  return [tell('wind-fresh', 'ack', [], status, { value, unit: 'min', tie })];
}

export function ignitionClear(scene: Scene): TwinFinding[] {
  const points = scene.all('release-point').map(({ at }) => at);
  const pools = scene.all('pool').map((pool) => scene.rings(pool));
  return forEach(
    scene,
    'ignition-clear',
    deviation,
    ['tester', 'pump', 'receiving-vehicle'],
    (piece) => {
      if (!scene.hasSource()) return ['not-known'];
      const feet = [
        ...points.map((at) => feetFrom(scene, piece, at)),
        ...pools.map((pool) =>
          isUnit(piece)
            ? feetBetweenAreas(scene.footprint(piece), pool)
            : feetToArea(scene.flat(piece.at), pool),
        ),
      ];
      const value = Math.min(...feet);
      const least = scene.values.ignition_clear_ft;
      const tie = near(value, 'ft', [least]);
      return [value >= least ? 'meets' : 'not-met', { value, unit: 'ft', tie }];
    },
  );
}

/** Feet from a piece, a unit by its footprint, to a place. */
function feetFrom(scene: Scene, piece: Standing, place: LonLat): number {
  if (!isUnit(piece)) return feetBetween(piece.at, place);
  return feetToArea(scene.flat(place), scene.footprint(piece));
}

export function ventClear(scene: Scene): TwinFinding[] {
  const vents = scene.vents();
  return forEach(scene, 'vent-clear', deviation, ['tester', 'pump'], (piece) => {
    if (vents.length === 0) return ['not-known'];
    const value = Math.min(...vents.map(({ at }) => feetFrom(scene, piece, at)));
    const least = scene.values.vent_clear_ft;
    const tie = near(value, 'ft', [least]);
    return [value >= least ? 'meets' : 'not-met', { value, unit: 'ft', tie }];
  });
}

/** The answer where a piece must not stand in ground of a kind: nothing is measured. */
function clearOf(
  scene: Scene,
  piece: Standing,
  kind: 'no-drive' | 'low-ground',
  bad: Status,
): [Status, Partial<TwinFinding>?] {
  const areas = scene.all(kind).map((area) => scene.rings(area));
  if (areas.length === 0) return ['n/a'];
  const within = (wider: number): boolean =>
    areas.some((area) =>
      isUnit(piece)
        ? areasMeet(scene.footprint(piece, wider), area)
        : inArea(scene.flat(piece.at), area),
    );
  const tie = isUnit(piece)
    ? within(HAIR.ft) !== within(-HAIR.ft)
    : areas.some((area) => feetToEdge(scene.flat(piece.at), area) < HAIR.ft);
  return [within(0) ? bad : 'meets', { tie }];
}

export function drivableGround(scene: Scene): TwinFinding[] {
  const kinds = ['rod', 'z-probe', 'y-probe'] as const;
  return forEach(scene, 'drivable-ground', deviation, kinds, (piece) =>
    clearOf(scene, piece, 'no-drive', isProbe(piece) ? 'caution' : 'not-met'),
  );
}

export function lowGround(scene: Scene): TwinFinding[] {
  const kinds = ['rod', 'tester', 'pump', 'receiving-vehicle'] as const;
  return forEach(
    scene,
    'low-ground',
    () => 'ack',
    kinds,
    (piece) => clearOf(scene, piece, 'low-ground', 'caution'),
    scene.all('low-ground').length === 0,
  );
}
