import * as turf from '@turf/turf';
import geodesic from 'geographiclib-geodesic';
import type { LonLat } from '@/lib/geo';

/**
 * Measuring on the ground the slow way: lengths and directions straight from GeographicLib, areas
 * by Turf. Shares nothing with lib/geo, so that a fault there cannot hide here.
 */
const { WGS84 } = geodesic.Geodesic;

/** The international foot. */
export const FOOT = 0.3048;

export const feetBetween = (a: LonLat, b: LonLat): number =>
  WGS84.Inverse(a[1], a[0], b[1], b[0]).s12! / FOOT;

/** Direction of `b` seen from `a`, degrees clockwise from true north. */
export const bearing = (a: LonLat, b: LonLat): number =>
  (WGS84.Inverse(a[1], a[0], b[1], b[0]).azi1! + 360) % 360;

/** The lesser angle between two directions, 0 … 180. */
export function turnBetween(one: number, other: number): number {
  const turn = (((one - other) % 360) + 360) % 360;
  return Math.min(turn, 360 - turn);
}

/** Feet east and north on a map that keeps every length and direction from the origin true. */
export type Flat = readonly [east: number, north: number];
export type FlatRings = readonly (readonly Flat[])[];
export type Flatten = (place: LonLat) => Flat;

export function flattenAbout(origin: LonLat): Flatten {
  const known = new Map<LonLat, Flat>();
  return (place) => {
    const before = known.get(place);
    if (before) return before;
    const line = WGS84.Inverse(origin[1], origin[0], place[1], place[0]);
    const towards = (line.azi1! * Math.PI) / 180;
    const feet = line.s12! / FOOT;
    const flat: Flat = [feet * Math.sin(towards), feet * Math.cos(towards)];
    known.set(place, flat);
    return flat;
  };
}

/** Where one stands after going `metres` along `azimuth` from `place`. */
export function gone(place: LonLat, azimuth: number, metres: number): LonLat {
  const end = WGS84.Direct(place[1], place[0], azimuth, metres);
  return [end.lon2!, end.lat2!];
}

/**
 * Turf wants degrees on a sphere. This close to 0, 0 its sphere is as good as flat, so a foot of
 * the map becomes the degrees that a foot takes there.
 */
const DEGREES_A_FOOT = FOOT / ((turf.earthRadius * Math.PI) / 180);
const degrees = ([east, north]: Flat): [number, number] => [
  east * DEGREES_A_FOOT,
  north * DEGREES_A_FOOT,
];
const line = (path: readonly Flat[]) => turf.lineString(path.map(degrees));
const area = (rings: FlatRings) => turf.polygon(rings.map((ring) => ring.map(degrees)));

export function feetToPath(at: Flat, path: readonly Flat[]): number {
  const options = { units: 'meters', method: 'planar' } as const;
  return turf.pointToLineDistance(degrees(at), line(path), options) / FOOT;
}

/** Inside the outer ring and in none of the holes. */
export const inArea = (at: Flat, rings: FlatRings): boolean =>
  turf.booleanPointInPolygon(degrees(at), area(rings));

/** Feet from a point to the nearest edge, a hole's included, wherever the point lies. */
export const feetToEdge = (at: Flat, rings: FlatRings): number =>
  Math.min(...rings.map((ring) => feetToPath(at, ring)));

export const feetToArea = (at: Flat, rings: FlatRings): number =>
  inArea(at, rings) ? 0 : feetToEdge(at, rings);

export const areasMeet = (one: FlatRings, other: FlatRings): boolean =>
  turf.booleanIntersects(area(one), area(other));

export const pathMeetsArea = (path: readonly Flat[], rings: FlatRings): boolean =>
  turf.booleanIntersects(line(path), area(rings));

/** Two lines are nearest each other at an end or a corner of one of them, or they cross. */
export function feetBetweenPaths(one: readonly Flat[], other: readonly Flat[]): number {
  if (turf.lineIntersect(line(one), line(other)).features.length > 0) return 0;
  return Math.min(
    ...one.map((at) => feetToPath(at, other)),
    ...other.map((at) => feetToPath(at, one)),
  );
}

export function feetBetweenAreas(one: FlatRings, other: FlatRings): number {
  if (areasMeet(one, other)) return 0;
  return Math.min(...one.flatMap((a) => other.map((b) => feetBetweenPaths(a, b))));
}
