import { normaliseDegrees, toDegrees, toRadians } from '@/lib/geo';

/** The dial's own space: 0,0 in the middle, y down, a square of 200. */
export const DIAL = {
  half: 100,
  /** Middle of the band that shows which wind the layout stands for. */
  arc: 91,
  arcWidth: 10,
  rim: 81,
  /**
   * The wind keeps to the outer ring and downhill to the inner, so that whatever their directions
   * neither can lie over the other.
   */
  windTip: 37,
  downhillTip: 33,
  hub: 4,
} as const;

export type Spot = { readonly x: number; readonly y: number };

const round = (n: number): number => Math.round(n * 100) / 100 || 0;

export function spot(degrees: number, radius: number): Spot {
  const angle = toRadians(degrees);
  // Rounded, because engines differ in the last digits of a sine and the page is drawn by two.
  return { x: round(Math.sin(angle) * radius), y: round(-Math.cos(angle) * radius) };
}

/** Direction from the dial's middle to a place of the screen, whole degrees. */
export const directionTo = (x: number, y: number): number =>
  Math.round(normaliseDegrees(toDegrees(Math.atan2(x, -y)))) % 360;

/** Clockwise arc as an SVG path. A whole turn is drawn as two halves, which one arc cannot be. */
export function arcPath(fromDeg: number, sweepDeg: number, radius: number): string {
  if (sweepDeg >= 360) {
    return `${arcPath(fromDeg, 180, radius)} ${arcPath(fromDeg + 180, 180, radius)}`;
  }
  const [start, end] = [spot(fromDeg, radius), spot(fromDeg + sweepDeg, radius)];
  const large = sweepDeg > 180 ? 1 : 0;
  return `M${at(start)} A${radius} ${radius} 0 ${large} 1 ${at(end)}`;
}

/** The part of the ring between two radii that the wind swings over. */
export function sectorPath(
  fromDeg: number,
  sweepDeg: number,
  inner: number,
  outer: number,
): string {
  const sweep = Math.min(sweepDeg, 359.9);
  const [a, b] = [spot(fromDeg, outer), spot(fromDeg + sweep, outer)];
  const [c, d] = [spot(fromDeg + sweep, inner), spot(fromDeg, inner)];
  const large = sweep > 180 ? 1 : 0;
  return (
    `M${at(a)} A${outer} ${outer} 0 ${large} 1 ${at(b)} ` +
    `L${at(c)} A${inner} ${inner} 0 ${large} 0 ${at(d)} Z`
  );
}

const at = ({ x, y }: Spot): string => `${x} ${y}`;
