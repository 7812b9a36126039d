import geodesic from 'geographiclib-geodesic';
import { expect, test } from 'vitest';
import {
  angleBetween,
  localPlane,
  distance,
  feetToMetres,
  metresToFeet,
  type LonLat,
} from '@/lib/geo';
import { seededRandom } from '../seeded-random';

/**
 * Source: GeographicLib (C. F. F. Karney, Algorithms for geodesics, J. Geodesy 87, 2013), through
 * the npm package geographiclib-geodesic, a general-purpose library on WGS 84.
 */
const { WGS84 } = geodesic.Geodesic;

test('the reference library itself answers its own published line', () => {
  const line = WGS84.Inverse(35.60777, -139.44815, -11.17491, -69.95921);
  expect(line.s12).toBeCloseTo(8_935_244.5604818305, 3);
});

const PAIRS = 1000;

test(`${PAIRS} random pairs within 1,000 ft of an origin, latitude up to 80°`, () => {
  const random = seededRandom(20310504);
  let [worstFeet, worstDegrees] = [0, 0];
  for (let i = 0; i < PAIRS; i++) {
    const origin: LonLat = [random() * 360 - 180, random() * 160 - 80];
    const plane = localPlane(origin);
    const [a, b] = [near(origin), near(origin)];
    const truth = WGS84.Inverse(a[1], a[0], b[1], b[0]);
    const [pa, pb] = [plane.toPlane(a), plane.toPlane(b)];
    worstFeet = Math.max(worstFeet, Math.abs(metresToFeet(distance(pa, pb) - truth.s12!)));
    // Under a foot a hundredth of a degree is less than the drawing's own grain.
    if (truth.s12! > feetToMetres(1)) {
      worstDegrees = Math.max(worstDegrees, angleBetween(plane.bearing(pa, pb), truth.azi1!));
    }
    const back = plane.toLonLat(pa);
    expect(Math.abs(back[0] - a[0])).toBeLessThan(1e-10);
    expect(Math.abs(back[1] - a[1])).toBeLessThan(1e-10);
  }
  expect(worstFeet).toBeLessThan(0.01);
  expect(worstDegrees).toBeLessThan(0.01);

  function near(origin: LonLat): LonLat {
    const to = WGS84.Direct(origin[1], origin[0], random() * 360, feetToMetres(1000) * random());
    return [to.lon2!, to.lat2!];
  }
});

test('a spherical distance would not do: 0.4 ft off in 80 ft', () => {
  // The reason for the plane: haversine on the mean radius against the ellipsoid, north–south.
  const metres = feetToMetres(80);
  const to = WGS84.Direct(0, 0, 0, metres);
  const spherical = ((to.lat2! * Math.PI) / 180) * 6_371_008.8;
  expect(Math.abs(metresToFeet(spherical - metres))).toBeGreaterThan(0.4);
});

test('offset and bearing answer the direct problem', () => {
  const plane = localPlane([-98.3, 41.2]);
  const from = plane.toPlane([-98.299, 41.2004]);
  const to = plane.offset(from, 237, 24.384);
  const truth = WGS84.Direct(41.2004, -98.299, 237, 24.384);
  const [lon, lat] = plane.toLonLat(to);
  expect(lon).toBeCloseTo(truth.lon2!, 8);
  expect(lat).toBeCloseTo(truth.lat2!, 8);
});
