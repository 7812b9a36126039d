import {
  beyondArea,
  distance,
  feetToMetres,
  footprintBeyondArea,
  footprintMeetsArea,
  insideArea,
  type Area,
  type LocalPlane,
  type Vec,
} from '../../geo';
import {
  piecesOf,
  placeOf,
  placesOf,
  planeOf,
  systemsInUse,
  type Layout,
  type SiteGround,
} from '../../layout';
import type { CheckInput } from '../types';
import type { Remedy } from '../types';
import { clearOfLines } from './ground-lines';
import { asStored, moveRemedy, nearestPlace } from './move';
import { metresToSource, noSources, sourcesOf, ventsOf, worstAngleTo } from './sources';
import { shapeAt, type DrawnSubject } from './subjects';
import { readSlope, readWind, wedge } from './wind';

/**
 * A remedy must not trade one danger for another. The place it offers is the nearest where
 * everything known of place is met at once: zone, wind, slope, sources, vents, no-drive and low
 * ground, buried lines, the other systems. Worked out once a piece and shared by its findings.
 */

type Condition = (at: Vec) => boolean;
type Input = Pick<CheckInput, 'layout' | 'site' | 'limits'>;

/** Moves the subject to its better place if that clears `ok` too; null where there is none. */
export function betterPlaceRemedy(
  input: Input,
  subject: DrawnSubject,
  ok: Condition,
): Remedy | null {
  const plane = planeOf(input.layout);
  const to = betterPlace(input, plane, subject);
  if (!to || !ok(asStored(plane, to))) return null;
  return moveRemedy(plane, subject, subject.at, to);
}

type Memo = Map<string, Vec | null>;
const memos = new WeakMap<Layout, { site: SiteGround; limits: Input['limits']; places: Memo }>();

function betterPlace(input: Input, plane: LocalPlane, subject: DrawnSubject): Vec | null {
  let memo = memos.get(input.layout);
  if (!memo || memo.site !== input.site || memo.limits !== input.limits) {
    memo = { site: input.site, limits: input.limits, places: new Map() };
    memos.set(input.layout, memo);
  }
  const known = memo.places.get(subject.id);
  if (known !== undefined) return known;
  const conditions = conditionsFor(input, plane, subject);
  const place = nearestPlace(plane, subject.at, (at) => conditions.every((holds) => holds(at)));
  memo.places.set(subject.id, place);
  return place;
}

/** Cheap ones first: most places fail early. */
function conditionsFor(input: Input, plane: LocalPlane, subject: DrawnSubject): Condition[] {
  return [
    ...onTheRightSide(input, plane, subject),
    ...awayFromOthers(input, plane, subject),
    ...clearOfSources(input, subject),
    ...outsideAreas(input, plane, subject),
    ...clearUnderground(input, plane, subject),
  ];
}

function onTheRightSide({ layout, limits }: Input, plane: LocalPlane, subject: DrawnSubject) {
  const sources = sourcesOf(layout);
  const conditions: Condition[] = [];
  // Y and Z go where the test line needs them; wind and slope are cautions there.
  if (noSources(sources) || subject.role === 'probe') return conditions;
  const wind = readWind(layout, limits);
  if (wind.kind === 'blowing') {
    const angle = worstAngleTo(plane, sources, wind.fromDeg);
    const most = limits.values.upwind_max_deg - wind.swingDeg;
    conditions.push((at) => angle(at) <= most);
  }
  const slope = readSlope(layout, limits);
  const width = wedge(layout, limits);
  const windGoverns = width !== null && width < limits.values.wedge_min_deg;
  if (slope.kind === 'sloping' && !windGoverns) {
    const angle = worstAngleTo(plane, sources, slope.uphillDeg);
    conditions.push((at) => angle(at) <= limits.values.uphill_max_deg);
  }
  return conditions;
}

function awayFromOthers({ layout, limits }: Input, plane: LocalPlane, subject: DrawnSubject) {
  const rods = piecesOf(layout.pieces, 'rod');
  const own = rods.find((rod) => rod.id === subject.id)?.system;
  if (!own) return [];
  const inUse = systemsInUse(layout);
  const others = rods
    .filter((rod) => rod.system !== own && inUse.includes(rod.system))
    .map((rod) => placeOf(plane, rod));
  const least = feetToMetres(limits.values.systems_apart_min_ft);
  return [(at: Vec) => others.every((other) => distance(at, other) >= least)];
}

function clearOfSources({ layout, limits }: Input, subject: DrawnSubject): Condition[] {
  const conditions: Condition[] = [];
  const sources = sourcesOf(layout);
  const isPump =
    subject.role === 'unit' && subject.id === layout.pieces.find((p) => p.kind === 'pump')?.id;
  if ((subject.role === 'tester' || subject.role === 'unit') && !noSources(sources)) {
    const least = feetToMetres(limits.values.ignition_clear_ft);
    conditions.push((at) => metresToSource(sources, shapeAt(subject, at)) >= least);
  }
  const vents = ventsOf(layout);
  if ((subject.role === 'tester' || isPump) && vents.length > 0) {
    const least = feetToMetres(limits.values.vent_clear_ft);
    const openings = { points: vents, pools: [], outlets: vents };
    conditions.push((at) => metresToSource(openings, shapeAt(subject, at)) >= least);
  }
  return conditions;
}

function outsideAreas({ layout, site, limits }: Input, plane: LocalPlane, subject: DrawnSubject) {
  const setback = feetToMetres(limits.values.zone_setback_ft);
  const zones = piecesOf(layout.pieces, 'hot-zone').map((zone) => placesOf(plane, zone));
  const driven = subject.role === 'rod' || subject.role === 'probe';
  const shut: Area[] = [
    ...(driven ? piecesOf(site.features, 'no-drive') : []),
    ...(subject.role === 'probe' ? [] : piecesOf(site.features, 'low-ground')),
  ].map((area) => placesOf(plane, area));
  return [
    (at: Vec) => {
      const shape = shapeAt(subject, at);
      return 'x' in shape
        ? !shut.some((area) => insideArea(shape, area)) &&
            zones.every((zone) => beyondArea(shape, zone) >= setback)
        : !shut.some((area) => footprintMeetsArea(shape, area)) &&
            zones.every((zone) => footprintBeyondArea(shape, zone) >= setback);
    },
  ];
}

function clearUnderground({ site, limits }: Input, plane: LocalPlane, subject: DrawnSubject) {
  if (subject.role !== 'rod' && subject.role !== 'probe') return [];
  return [(at: Vec) => clearOfLines(plane, site, limits.values, at)];
}
