import {
  footprint,
  feetToMetres,
  localPlane,
  type LocalPlane,
  type LonLat,
  type Ring,
  type Vec,
} from '../geo';
import type { Piece, Unit } from './pieces';
import { unitSizeFt } from './queries';
import type { Layout } from './schema';

/**
 * Places of pieces in the local plane. Pieces are immutable, so each is projected once a plane
 * and remembered for as long as it lives: re-checking after one move projects one piece.
 */

const planes = new Map<string, LocalPlane>();
const MOST_PLANES = 64;

export function planeAt(origin: LonLat): LocalPlane {
  const key = `${origin[0]},${origin[1]}`;
  let plane = planes.get(key);
  if (!plane) {
    if (planes.size >= MOST_PLANES) planes.clear();
    plane = localPlane(origin);
    planes.set(key, plane);
  }
  return plane;
}

export const planeOf = (layout: Layout): LocalPlane => planeAt(layout.origin);

const projected = new WeakMap<LocalPlane, WeakMap<object, readonly (readonly Vec[])[]>>();

/** A piece's lines, rings, or its one point, each as a list of places. */
export function placesOf(plane: LocalPlane, piece: Piece): readonly (readonly Vec[])[] {
  let known = projected.get(plane);
  if (!known) projected.set(plane, (known = new WeakMap()));
  let places = known.get(piece);
  if (!places) {
    places = partsOf(piece).map((part) => part.map((position) => plane.toPlane(position)));
    known.set(piece, places);
  }
  return places;
}

function partsOf(piece: Piece): readonly (readonly LonLat[])[] {
  if ('at' in piece) return [[piece.at]];
  if ('path' in piece) return [piece.path];
  return 'paths' in piece ? piece.paths : piece.rings;
}

type PointPiece = Extract<Piece, { at: LonLat }>;

/** The place of a piece drawn as a point. */
export const placeOf = (plane: LocalPlane, piece: PointPiece): Vec =>
  placesOf(plane, piece)[0]![0]!;

const footprints = new WeakMap<LocalPlane, WeakMap<object, Ring>>();

/** The ground a unit covers. */
export function footprintOf(plane: LocalPlane, unit: Unit): Ring {
  let known = footprints.get(plane);
  if (!known) footprints.set(plane, (known = new WeakMap()));
  let ring = known.get(unit);
  if (!ring) {
    const { length, width } = unitSizeFt(unit);
    ring = footprint(
      plane,
      placeOf(plane, unit),
      unit.heading_deg ?? 0,
      feetToMetres(length),
      feetToMetres(width),
    );
    known.set(unit, ring);
  }
  return ring;
}
