import type { Vec } from '../geo';

export const add = (a: Vec, b: Vec): Vec => ({ x: a.x + b.x, y: a.y + b.y });
export const subtract = (a: Vec, b: Vec): Vec => ({ x: a.x - b.x, y: a.y - b.y });
export const times = (a: Vec, factor: number): Vec => ({ x: a.x * factor, y: a.y * factor });
export const between = (a: Vec, b: Vec, part: number): Vec => ({
  x: a.x + (b.x - a.x) * part,
  y: a.y + (b.y - a.y) * part,
});
/** Turned a quarter to the left as seen from above. */
export const leftOf = (a: Vec): Vec => ({ x: -a.y, y: a.x });

/** Length one in the direction from a to b; null where they are one place. */
export function unitVector(a: Vec, b: Vec): Vec | null {
  const length = Math.hypot(b.x - a.x, b.y - a.y);
  return length === 0 ? null : { x: (b.x - a.x) / length, y: (b.y - a.y) / length };
}

/** Degrees clockwise on the sheet by which words along `direction` lie, never upside down. */
export function readableTurn(direction: Vec): number {
  const degrees = (Math.atan2(-direction.y, direction.x) * 180) / Math.PI;
  if (degrees > 90) return degrees - 180;
  return degrees <= -90 ? degrees + 180 : degrees;
}
