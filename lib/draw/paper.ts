import type { Vec } from '../geo';
import { feetToMetres, METRES_PER_INCH } from '../geo/units';
import type { Bounds, LengthUnit } from './types';

/** Papers as they lie for a plan: the long side across. */
export const PAPERS = {
  letter: { name: 'Letter', widthMm: 279.4, heightMm: 215.9 },
  a4: { name: 'A4', widthMm: 297, heightMm: 210 },
} as const;
export type PaperName = keyof typeof PAPERS;

/** CSS counts 96 px to the inch on paper; strokes and letters of the plan are in these. */
export const PX_PER_MM = 96 / 25.4;

export type Scale = {
  /** As it stands in an address: "20" is 1 in = 20 ft, "1:200" is itself. */
  readonly id: string;
  /** Ground metres to a metre of paper. */
  readonly ratio: number;
  readonly words: string;
};

const FEET_TO_AN_INCH = [10, 20, 30, 40, 50, 60, 100, 200, 400];
const RATIOS = [100, 200, 250, 300, 400, 500, 750, 1000, 2000, 5000];

/** The engineer's scales of each measure, the largest drawing first. */
export const SCALES: Readonly<Record<LengthUnit, readonly Scale[]>> = {
  ft: FEET_TO_AN_INCH.map((feet) => ({
    id: String(feet),
    ratio: Math.round(feetToMetres(feet) / METRES_PER_INCH),
    words: `1 in = ${feet} ft`,
  })),
  m: RATIOS.map((ratio) => ({ id: `1:${ratio}`, ratio, words: `1:${ratio}` })),
};

export const scaleById = (id: string): { scale: Scale; units: LengthUnit } | null => {
  for (const units of ['ft', 'm'] as const) {
    const scale = SCALES[units].find((one) => one.id === id);
    if (scale) return { scale, units };
  }
  return null;
};

export type SizeMm = { readonly widthMm: number; readonly heightMm: number };

/** The largest scale at which `ground` with a margin fits the window; the smallest if none does. */
export function scaleThatFits(
  ground: Bounds,
  window: SizeMm,
  scales: readonly Scale[],
  marginMm: number,
): Scale {
  const fits = ({ ratio }: Scale): boolean =>
    ((ground.max.x - ground.min.x) * 1000) / ratio <= window.widthMm - marginMm * 2 &&
    ((ground.max.y - ground.min.y) * 1000) / ratio <= window.heightMm - marginMm * 2;
  return scales.find(fits) ?? scales.at(-1)!;
}

/** Ground that a window shows at that scale round `centre`. */
export function groundSeen(centre: Vec, { widthMm, heightMm }: SizeMm, { ratio }: Scale): Bounds {
  const [x, y] = [(widthMm * ratio) / 2000, (heightMm * ratio) / 2000];
  return {
    min: { x: centre.x - x, y: centre.y - y },
    max: { x: centre.x + x, y: centre.y + y },
  };
}

export const pxPerMetreAt = ({ ratio }: Scale): number => (1000 * PX_PER_MM) / ratio;

export function boundsOf(places: readonly Vec[]): Bounds | null {
  const first = places[0];
  if (!first) return null;
  let [left, right, low, high] = [first.x, first.x, first.y, first.y];
  for (const { x, y } of places) {
    [left, right] = [Math.min(left, x), Math.max(right, x)];
    [low, high] = [Math.min(low, y), Math.max(high, y)];
  }
  return { min: { x: left, y: low }, max: { x: right, y: high } };
}
