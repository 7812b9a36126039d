import { normaliseDegrees, toDegrees, toRadians } from './angles';
import type { LonLat, Vec } from './position';

/** WGS 84 (NIMA TR8350.2): semi-major axis in metres and flattening. */
const A = 6_378_137;
const F = 1 / 298.257_223_563;
const E2 = F * (2 - F);
const ONE_MINUS_E2 = 1 - E2;

type Ecef = readonly [number, number, number];

/**
 * The plane that touches the ellipsoid at `origin`, with x to its east and y to its north.
 * Within 1,000 ft of the origin, lengths in it are within 0.0001 ft of the geodesic's.
 */
export type LocalPlane = {
  readonly origin: LonLat;
  toPlane(place: LonLat): Vec;
  /** The inverse of `toPlane`, exact: the point of the ellipsoid straight above or below `vec`. */
  toLonLat(vec: Vec): LonLat;
  /** Geodetic azimuth at `from` of the straight line to `to`, degrees from true north. */
  bearing(from: Vec, to: Vec): number;
  /** Degrees to add to a direction in the plane at `at` to have it from true north there. */
  convergence(at: Vec): number;
  /** The place `metres` from `from` in true direction `bearingDeg`. */
  offset(from: Vec, bearingDeg: number, metres: number): Vec;
};

export function localPlane(origin: LonLat): LocalPlane {
  const [lon0, lat0] = origin;
  const sinLon = Math.sin(toRadians(lon0));
  const cosLon = Math.cos(toRadians(lon0));
  const sinLat = Math.sin(toRadians(lat0));
  const cosLat = Math.cos(toRadians(lat0));
  const centre = toEcef(origin);
  const east: Ecef = [-sinLon, cosLon, 0];
  const north: Ecef = [-sinLat * cosLon, -sinLat * sinLon, cosLat];
  const up: Ecef = [cosLat * cosLon, cosLat * sinLon, sinLat];

  function toPlane(place: LonLat): Vec {
    const p = toEcef(place);
    const d: Ecef = [p[0] - centre[0], p[1] - centre[1], p[2] - centre[2]];
    return { x: dot(d, east), y: dot(d, north) };
  }

  function toLonLat(vec: Vec): LonLat {
    const foot: Ecef = [
      centre[0] + vec.x * east[0] + vec.y * north[0],
      centre[1] + vec.x * east[1] + vec.y * north[1],
      centre[2] + vec.x * east[2] + vec.y * north[2],
    ];
    // The vertical through `foot` meets the ellipsoid where x² + y² + z²/(1−e²) = a²: a quadratic
    // in the height, whose root nearest zero is the side of the ellipsoid that we stand on.
    const qa = up[0] ** 2 + up[1] ** 2 + up[2] ** 2 / ONE_MINUS_E2;
    const qb = foot[0] * up[0] + foot[1] * up[1] + (foot[2] * up[2]) / ONE_MINUS_E2;
    const qc = foot[0] ** 2 + foot[1] ** 2 + foot[2] ** 2 / ONE_MINUS_E2 - A * A;
    const root = Math.sqrt(Math.max(0, qb * qb - qa * qc));
    const height = -qc / (qb + root);
    return fromEcefOnEllipsoid([
      foot[0] + height * up[0],
      foot[1] + height * up[1],
      foot[2] + height * up[2],
    ]);
  }

  function convergence(at: Vec): number {
    if (at.x === 0 && at.y === 0) return 0;
    const [lon, lat] = toLonLat(at);
    const sl = Math.sin(toRadians(lat));
    const localNorth: Ecef = [
      -sl * Math.cos(toRadians(lon)),
      -sl * Math.sin(toRadians(lon)),
      Math.cos(toRadians(lat)),
    ];
    return -toDegrees(Math.atan2(dot(localNorth, east), dot(localNorth, north)));
  }

  return {
    origin,
    toPlane,
    toLonLat,
    convergence,
    bearing: (from, to) => normaliseDegrees(planeDirection(from, to) + convergence(from)),
    offset(from, bearingDeg, metres) {
      const direction = toRadians(bearingDeg - convergence(from));
      return {
        x: from.x + metres * Math.sin(direction),
        y: from.y + metres * Math.cos(direction),
      };
    },
  };
}

/** Direction in the plane, degrees clockwise from its y axis. Zero length reads 0. */
export const planeDirection = (from: Vec, to: Vec): number =>
  normaliseDegrees(toDegrees(Math.atan2(to.x - from.x, to.y - from.y)));

export const distance = (a: Vec, b: Vec): number => Math.hypot(b.x - a.x, b.y - a.y);

function toEcef([lon, lat]: LonLat): Ecef {
  const sinLat = Math.sin(toRadians(lat));
  const cosLat = Math.cos(toRadians(lat));
  const n = A / Math.sqrt(1 - E2 * sinLat * sinLat);
  return [
    n * cosLat * Math.cos(toRadians(lon)),
    n * cosLat * Math.sin(toRadians(lon)),
    n * ONE_MINUS_E2 * sinLat,
  ];
}

function fromEcefOnEllipsoid([x, y, z]: Ecef): LonLat {
  return [toDegrees(Math.atan2(y, x)), toDegrees(Math.atan2(z, Math.hypot(x, y) * ONE_MINUS_E2))];
}

const dot = (a: Ecef, b: Ecef): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
