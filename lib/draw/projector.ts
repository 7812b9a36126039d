import type { Vec } from '../geo';
import type { Bounds, Projector } from './types';

/** The plane laid flat, north up: `originPx` is where the layout's origin falls. */
export function flatProjector(
  originPx: { readonly x: number; readonly y: number },
  pxPerMetre: number,
): Projector {
  return {
    pxPerMetre,
    toPx: (place: Vec) => ({
      x: originPx.x + place.x * pxPerMetre,
      y: originPx.y - place.y * pxPerMetre,
    }),
  };
}

/** A window of the ground of `bounds` with its upper left corner at 0, 0. */
export function windowProjector(bounds: Bounds, pxPerMetre: number): Projector {
  return flatProjector({ x: -bounds.min.x * pxPerMetre, y: bounds.max.y * pxPerMetre }, pxPerMetre);
}
