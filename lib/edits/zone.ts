import { distance, feetToMetres, metresToFeet, meanOf, quantise, type LonLat } from '../geo';
import { placesOf, planeOf, type Layout, type PieceOf } from '../layout';
import type { Edit } from './types';

/** Enough corners that a ring of 45 ft strays less than 3 in from its circle. */
const CORNERS = 36;

/** A closed ring of corners `radiusFt` round a place, the first to the north, clockwise. */
export function circleRing(
  layout: Layout,
  centre: LonLat,
  radiusFt: number,
  corners: number = CORNERS,
): LonLat[] {
  const plane = planeOf(layout);
  const middle = plane.toPlane(centre);
  const ring = Array.from({ length: corners }, (_, i) =>
    quantise(plane.toLonLat(plane.offset(middle, (360 * i) / corners, feetToMetres(radiusFt)))),
  );
  return [...ring, ring[0]!];
}

type Zone = PieceOf<'hot-zone' | 'warm-zone' | 'pool' | 'no-drive' | 'low-ground'>;

/** Corners this near to the mean radius still make a circle: what quantising leaves, and more. */
const ROUND_WITHIN = 0.005;
const FEWEST_ROUND_CORNERS = 8;

/** Centre and radius of an area drawn as a circle; null for any other shape. */
export function circleOf(
  layout: Layout,
  zone: Zone,
): { readonly centre: LonLat; readonly radiusFt: number } | null {
  if (zone.rings.length !== 1) return null;
  const plane = planeOf(layout);
  const corners = placesOf(plane, zone)[0]!.slice(0, -1);
  const middle = meanOf(corners);
  if (!middle || corners.length < FEWEST_ROUND_CORNERS) return null;
  const radii = corners.map((corner) => distance(middle, corner));
  const radius = radii.reduce((sum, r) => sum + r, 0) / radii.length;
  if (radii.some((r) => Math.abs(r - radius) > radius * ROUND_WITHIN)) return null;
  return { centre: plane.toLonLat(middle), radiusFt: metresToFeet(radius) };
}

/** Spreads or draws in a circle about its centre; null where the area isn't a circle. */
export function resizeCircle(layout: Layout, zone: Zone, radiusFt: number): Edit | null {
  const circle = circleOf(layout, zone);
  if (!circle) return null;
  const ring = circleRing(layout, circle.centre, radiusFt, zone.rings[0]!.length - 1);
  return {
    type: 'together',
    edits: ring.slice(0, -1).map((to, vertex) => ({
      type: 'reshape',
      id: zone.id,
      part: 0,
      vertex,
      to,
    })),
  };
}
