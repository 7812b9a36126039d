import {
  footprintToPoint,
  nearestEdge,
  quantise,
  toRadians,
  type LocalPlane,
  type LonLat,
  type Vec,
} from '../geo';
import { footprintOf, placeOf, type Unit } from '../layout';

/** Metres ahead of a unit's centre and to its right. */
export type Standing = { readonly ahead: number; readonly right: number };

/** Nearer than this to the footprint is on it: quantising takes a place up to 0.8 mm off an edge. */
const ON_FOOTPRINT_METRES = 0.003;

type Frame = { readonly centre: Vec; readonly ahead: Vec; readonly right: Vec };

function frameOf(plane: LocalPlane, unit: Unit): Frame {
  const centre = placeOf(plane, unit);
  const along = toRadians((unit.heading_deg ?? 0) - plane.convergence(centre));
  const ahead = { x: Math.sin(along), y: Math.cos(along) };
  return { centre, ahead, right: { x: ahead.y, y: -ahead.x } };
}

/** Where a place is as seen from the unit: the same after the unit has moved or turned. */
export function standingOn(plane: LocalPlane, unit: Unit, place: LonLat): Standing {
  const { centre, ahead, right } = frameOf(plane, unit);
  const p = plane.toPlane(place);
  const [dx, dy] = [p.x - centre.x, p.y - centre.y];
  return { ahead: dx * ahead.x + dy * ahead.y, right: dx * right.x + dy * right.y };
}

export function placeOn(plane: LocalPlane, unit: Unit, standing: Standing): LonLat {
  const { centre, ahead, right } = frameOf(plane, unit);
  return quantise(
    plane.toLonLat({
      x: centre.x + ahead.x * standing.ahead + right.x * standing.right,
      y: centre.y + ahead.y * standing.ahead + right.y * standing.right,
    }),
  );
}

export const standsOn = (plane: LocalPlane, unit: Unit, place: LonLat): boolean =>
  footprintToPoint(footprintOf(plane, unit), plane.toPlane(place)) <= ON_FOOTPRINT_METRES;

/** The place itself where it lies on the unit, else the nearest on the unit's edge. */
export const ontoUnit = (plane: LocalPlane, unit: Unit, place: LonLat): LonLat =>
  standsOn(plane, unit, place) ? quantise(place) : edgeOfUnit(plane, unit, place);

/** The place on the unit's edge nearest to `place`. */
export function edgeOfUnit(plane: LocalPlane, unit: Unit, place: LonLat): LonLat {
  const { at } = nearestEdge(plane.toPlane(place), [footprintOf(plane, unit)]);
  return quantise(plane.toLonLat(at));
}
