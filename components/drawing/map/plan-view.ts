import type { Map as LeafletMap } from 'leaflet';
import type { LocalPlane, Vec } from '@/lib/geo';
import type { Bounds, Projector, Px } from '@/lib/draw';

/** How the ground lies on the screen at this moment, both ways. */
export type PlanView = Projector & {
  /** The place under a point of the plan, counted in px from its upper left corner. */
  toPlane(px: Px): Vec;
  readonly metresPerPx: number;
  readonly size: Px;
  /** Ground that is seen. */
  readonly bounds: Bounds;
};

/** Far enough apart for the slopes to be sharp, near enough for the map to be flat. */
const BASE_METRES = 100;

/**
 * Leaflet projects by Web Mercator on a sphere, whose scale east differs from its scale north by
 * up to 0.7 % of the ellipsoid's. The plan must lie on the tiles, so the view takes Leaflet's own
 * answer at the origin and beside it, and is affine between: within a centimetre at 1,000 ft.
 */
export function planView(map: LeafletMap, plane: LocalPlane): PlanView {
  const corner = map.getPixelOrigin().add(map.containerPointToLayerPoint([0, 0]));
  const zoom = map.getZoom();
  const at = (place: Vec): Px => {
    const [lon, lat] = plane.toLonLat(place);
    const p = map.project([lat, lon], zoom).subtract(corner);
    return { x: p.x, y: p.y };
  };
  const origin = at({ x: 0, y: 0 });
  const east = at({ x: BASE_METRES, y: 0 });
  const north = at({ x: 0, y: BASE_METRES });
  const [a, b] = [(east.x - origin.x) / BASE_METRES, (north.x - origin.x) / BASE_METRES];
  const [c, d] = [(east.y - origin.y) / BASE_METRES, (north.y - origin.y) / BASE_METRES];
  const det = a * d - b * c;
  const pxPerMetre = Math.sqrt(Math.abs(det));
  const size = map.getSize();

  const toPx = (v: Vec): Px => ({
    x: origin.x + a * v.x + b * v.y,
    y: origin.y + c * v.x + d * v.y,
  });
  const toPlane = ({ x, y }: Px): Vec => ({
    x: (d * (x - origin.x) - b * (y - origin.y)) / det,
    y: (a * (y - origin.y) - c * (x - origin.x)) / det,
  });
  return {
    toPx,
    toPlane,
    pxPerMetre,
    metresPerPx: 1 / pxPerMetre,
    size: { x: size.x, y: size.y },
    bounds: boundsOf([toPlane({ x: 0, y: size.y }), toPlane({ x: size.x, y: 0 })]),
  };
}

function boundsOf([low, high]: [Vec, Vec]): Bounds {
  return {
    min: { x: Math.min(low.x, high.x), y: Math.min(low.y, high.y) },
    max: { x: Math.max(low.x, high.x), y: Math.max(low.y, high.y) },
  };
}
