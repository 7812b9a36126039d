import { distance, feetToMetres, footprintToPoint, metresToFeet, type LocalPlane } from '../../geo';
import { isSiteKind, type Kind, type Piece, type Run } from '../pieces';
import { footprintOf, placeOf, placesOf, planeAt } from '../plan';
import { isRun, isUnit, nameOf } from '../queries';
import { FARTHEST_MILES, milesAway } from '../reach';
import { MOST_PIECES } from '../schema';
import type { LonLat } from '../../geo';
import type { Fault } from './faults';

/** Faults that only the whole file shows: counts, ids, references, ends, distance. */

const UNITS: readonly Kind[] = ['casualty-vehicle', 'receiving-vehicle', 'pump'];
const END_WITHIN_FT = 1;

/** What each end of a run may be led to. */
export const ENDS: Record<Run['kind'], { from: readonly Kind[]; to: readonly Kind[] }> = {
  jumper: { from: ['rod'], to: ['rod'] },
  'ground-cable': { from: UNITS, to: ['rod'] },
  'bond-cable': { from: UNITS, to: UNITS },
  hose: { from: UNITS, to: UNITS },
  'test-lead': { from: ['tester'], to: ['z-probe', 'y-probe', 'rod'] },
};

/** A feature that parsed, with its place in the file. */
export type Placed = { readonly piece: Piece; readonly index: number };

export function countFaults(placed: readonly Placed[]): Fault[] {
  const faults: Fault[] = [];
  const pieces = placed.filter(({ piece }) => !isSiteKind(piece.kind));
  if (pieces.length > MOST_PIECES) {
    faults.push({
      path: 'features',
      message: `${pieces.length} pieces are more than the ${MOST_PIECES} a layout may hold`,
    });
  }
  for (const kind of UNITS) {
    for (const extra of placed.filter(({ piece }) => piece.kind === kind).slice(1)) {
      faults.push({
        path: `features[${extra.index}].properties.kind`,
        message: `a layout has one ${kind.replace('-', ' ')}; this is another`,
      });
    }
  }
  return faults;
}

/** Duplicate ids, over every feature that has an id at all, parsed or not. */
export function idFaults(features: readonly unknown[]): Fault[] {
  const first = new Map<string, number>();
  return features.flatMap((feature, index) => {
    const id = (feature as { id?: unknown } | null)?.id;
    if (typeof id !== 'string') return [];
    const earlier = first.get(id);
    if (earlier === undefined) {
      first.set(id, index);
      return [];
    }
    return [
      {
        path: `features[${index}].id`,
        message: `the id ${JSON.stringify(id.slice(0, 80))} is already that of features[${earlier}]`,
      },
    ];
  });
}

/** References to pieces that aren't there or are of the wrong kind. `ids` is every id in the file. */
export function referenceFaults(placed: readonly Placed[], ids: ReadonlySet<string>): Fault[] {
  const byId = new Map(placed.map(({ piece }) => [piece.id, piece]));
  const look = (index: number, member: string, id: string, kinds: readonly Kind[]): Fault[] => {
    const path = `features[${index}].properties.${member}`;
    const target = byId.get(id);
    if (!target) {
      // A target with faults of its own is told there; here only what is nowhere in the file.
      return ids.has(id) ? [] : [{ path, message: `there is no piece ${JSON.stringify(id)}` }];
    }
    if (kinds.includes(target.kind)) return [];
    return [
      { path, message: `${JSON.stringify(id)} is a ${target.kind}, not a ${kinds.join(' or ')}` },
    ];
  };
  return placed.flatMap(({ piece, index }) => {
    if (isRun(piece)) {
      return (['from', 'to'] as const).flatMap((end) =>
        look(index, end, piece[end], ENDS[piece.kind][end]),
      );
    }
    return piece.kind === 'vent' && piece.of ? look(index, 'of', piece.of, UNITS) : [];
  });
}

/** Pieces too far from the origin, and runs whose ends lie away from what they name. */
export function placeFaults(placed: readonly Placed[], origin: LonLat): Fault[] {
  const plane = planeAt(origin);
  const byId = new Map(placed.map(({ piece }) => [piece.id, piece]));
  return placed.flatMap(({ piece, index }) => {
    const far = farFault(plane, piece, index);
    if (far) return [far];
    return isRun(piece) ? endFaults(plane, piece, index, byId) : [];
  });
}

function farFault(plane: LocalPlane, piece: Piece, index: number): Fault | null {
  const miles = milesAway(plane, piece);
  if (miles <= FARTHEST_MILES) return null;
  const far = Number.isFinite(miles) ? `${miles.toFixed(1)} miles` : 'half a world';
  return {
    path: `features[${index}].geometry.coordinates`,
    message: `${nameOf(piece)} lies ${far} from the origin; ${FARTHEST_MILES} miles is the most`,
  };
}

function endFaults(
  plane: LocalPlane,
  run: Run,
  index: number,
  byId: ReadonlyMap<string, Piece>,
): Fault[] {
  const path = placesOf(plane, run)[0]!;
  return (['from', 'to'] as const).flatMap((end) => {
    const target = byId.get(run[end]);
    const vertex = end === 'from' ? 0 : path.length - 1;
    const place = path[vertex]!;
    if (!target || !('at' in target)) return [];
    const away = isUnit(target)
      ? footprintToPoint(footprintOf(plane, target), place)
      : distance(placeOf(plane, target), place);
    if (away <= feetToMetres(END_WITHIN_FT) + 1e-9) return [];
    return [
      {
        path: `features[${index}].geometry.coordinates[${vertex}]`,
        message: `this end lies ${metresToFeet(away).toFixed(1)} ft from ${nameOf(target)}, which it names; ${END_WITHIN_FT} ft is the most`,
      },
    ];
  });
}
