import type { PointerEvent, Px } from './types';

/** Pixels a press may wander and still be a click: fingers roll, mice hardly do. */
const WANDER_PX = { mouse: 3, pen: 5, touch: 8 } as const;

/** Pixels within which a finger or mouse is on a thing: half of the 44 px a target must measure. */
export const NEAR_PX = 22;

export const pxBetween = (a: Px, b: Px): number => Math.hypot(a.x - b.x, a.y - b.y);

export const hasWandered = (from: Px, event: PointerEvent): boolean =>
  pxBetween(from, event.px) > WANDER_PX[event.pointer];
