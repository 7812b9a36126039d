import {
  beyondArea,
  feetToMetres,
  insideArea,
  meanOf,
  planeDirection,
  quantise,
  type LocalPlane,
  type LonLat,
  type Vec,
} from '../../geo';
import {
  footprintOf,
  isUnit,
  piecesOf,
  placeOf,
  placesOf,
  planeOf,
  probeFor,
  rodsOf,
  type Layout,
  type Sheet,
  type System,
} from '../../layout';
import { limitsOf, type Means } from './wanted';

/** Near enough to read and clamp from, far enough not to be stood on. */
const BESIDE_FT = 5;
/** Tried in turn, clockwise from the test line: beside it first, then behind, then on it. */
const OFF_THE_LINE_DEG = [90, -90, 60, -60, 120, -120, 150, -150, 180, 30, -30, 0];

/** A place for the tester beside the system's rods, clear of units and, if any is, of the zone. */
export function testerBeside(sheet: Sheet, system: System, means: Means): LonLat {
  const { layout } = sheet;
  const plane = planeOf(layout);
  const rods = rodsOf(layout, system).map((rod) => placeOf(plane, rod));
  const centre = meanOf(rods) ?? { x: 0, y: 0 };
  const probe = probeFor(layout, 'z-probe', system);
  const line = probe ? planeDirection(centre, placeOf(plane, probe)) : 0;
  const reach = Math.max(0, ...rods.map((rod) => Math.hypot(rod.x - centre.x, rod.y - centre.y)));
  const places = OFF_THE_LINE_DEG.map((off) =>
    plane.offset(centre, line + plane.convergence(centre) + off, reach + feetToMetres(BESIDE_FT)),
  );
  const setback = feetToMetres(limitsOf(means).zone_setback_ft);
  const clear = clearance(layout, plane);
  const best =
    places.find((place) => clear(place) >= setback) ??
    places.reduce((a, b) => (clear(b) > clear(a) ? b : a));
  return quantise(plane.toLonLat(best));
}

/** Metres beyond every hot zone, negative inside one; on a unit as bad as can be. */
function clearance(layout: Layout, plane: LocalPlane): (place: Vec) => number {
  const zones = piecesOf(layout.pieces, 'hot-zone').map((zone) => placesOf(plane, zone));
  const units = layout.pieces.filter(isUnit).map((unit) => footprintOf(plane, unit));
  return (place) =>
    units.some((ring) => insideArea(place, [ring]))
      ? -Infinity
      : Math.min(Infinity, ...zones.map((zone) => beyondArea(place, zone)));
}
