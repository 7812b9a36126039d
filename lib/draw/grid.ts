import { feetToMetres, type Vec } from '../geo';
import { line, stroke } from './marks';
import type { Bounds, DisplayList, LengthUnit, View } from './types';

/** Labels along an edge need about this much room. */
const TICK_EVERY_PX = 60;
const GRID_EVERY_PX = 38;
const MOST_LINES = 400;

const metresPer = (units: LengthUnit): number => (units === 'ft' ? feetToMetres(1) : 1);

/** The least of 1, 2, 5, 10, 20 … units that is `px` or more apart. */
export function roundStep(metresPerPx: number, units: LengthUnit, px: number): number {
  const least = (px * metresPerPx) / metresPer(units);
  const power = 10 ** Math.floor(Math.log10(least));
  return [1, 2, 5, 10].map((step) => step * power).find((step) => step >= least * (1 - 1e-9))!;
}

type SeenView = View & { readonly bounds: Bounds };

/** The plain grid: thin lines round numbers apart, counted from `from`, every fifth firmer. */
export function drawGrid(
  { bounds, metresPerPx }: SeenView,
  units: LengthUnit,
  from: Vec = { x: 0, y: 0 },
): DisplayList {
  const step = roundStep(metresPerPx, units, GRID_EVERY_PX) * metresPer(units);
  const { min, max } = bounds;
  const [fine, firm]: [Vec[][], Vec[][]] = [[], []];
  for (const n of multiples(min.x - from.x, max.x - from.x, step)) {
    const x = from.x + n * step;
    (n % 5 === 0 ? firm : fine).push([
      { x, y: min.y },
      { x, y: max.y },
    ]);
  }
  for (const n of multiples(min.y - from.y, max.y - from.y, step)) {
    const y = from.y + n * step;
    (n % 5 === 0 ? firm : fine).push([
      { x: min.x, y },
      { x: max.x, y },
    ]);
  }
  return {
    groups: [
      {
        id: '~grid',
        layer: 'ground',
        marks: [
          line(fine, stroke('rule', 1, { opacity: 0.22 })),
          line(firm, stroke('rule', 1, { opacity: 0.5 })),
        ],
      },
    ],
  };
}

export type Tick = {
  readonly edge: 'top' | 'left';
  /** Place along the edge, metres of the plane: x for the top edge, y for the left one. */
  readonly at: number;
  /** "60 W", "0", "100 N". */
  readonly label: string;
};

/** Ticks for the sheet's border: round distances east and north of `from`. */
export function borderTicks(
  { bounds, metresPerPx }: SeenView,
  units: LengthUnit,
  from: Vec = { x: 0, y: 0 },
): Tick[] {
  const unit = metresPer(units);
  const step = roundStep(metresPerPx, units, TICK_EVERY_PX);
  const ticks = (
    edge: Tick['edge'],
    low: number,
    high: number,
    zero: number,
    plus: string,
    minus: string,
  ) =>
    multiples(low - zero, high - zero, step * unit).map((n): Tick => {
      const value = Number((Math.abs(n) * step).toPrecision(12));
      const side = n === 0 ? '' : n > 0 ? ` ${plus}` : ` ${minus}`;
      return { edge, at: zero + n * step * unit, label: `${value}${side}` };
    });
  return [
    ...ticks('top', bounds.min.x, bounds.max.x, from.x, 'E', 'W'),
    ...ticks('left', bounds.min.y, bounds.max.y, from.y, 'N', 'S'),
  ];
}

/** Every whole n with low ≤ n · step ≤ high; none where there would be too many to see. */
function multiples(low: number, high: number, step: number): number[] {
  const [first, last] = [Math.ceil(low / step - 1e-9), Math.floor(high / step + 1e-9)];
  if (!(last - first < MOST_LINES)) return [];
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => first + i || 0);
}
