import type { Vec } from '../geo';
import { turnedBoxes, type Clutter } from './clutter';
import { apart, type Ends } from './dimension-ends';
import type { Frame } from './frame';
import { leastCost } from './least-cost';
import { line, stroke, words } from './marks';
import { textWidth } from './text-width';
import type { Token } from './themes';
import type { Mark } from './types';
import { add, between, leftOf, readableTurn, subtract, times, unitVector } from './vectors';

export type Dimension = {
  readonly id: string;
  readonly ends: Ends;
  readonly text: string;
  /** What draws the eye: a limit not met, a caution, or a plain distance. */
  readonly weight: 'not-met' | 'caution' | 'plain';
  /** Fixed distance aside, px to the left of from → to (negative: right); null finds its own. */
  readonly asidePx: number | null;
};

type Look = { token: Token; width: number; size: number; bold: 600 | 700 };

const LOOKS: Readonly<Record<Dimension['weight'], Look>> = {
  'not-met': { token: 'alarm', width: 3, size: 20, bold: 700 },
  caution: { token: 'caution', width: 2, size: 18, bold: 700 },
  plain: { token: 'ink-soft', width: 1.25, size: 18, bold: 600 },
};
/** Paper is read nearer than a screen in the field. */
const PAPER_SIZE = 0.8;

function look(frame: Frame, weight: Dimension['weight']): Look {
  const drawn = LOOKS[weight];
  return frame.inkOnly ? { ...drawn, size: drawn.size * PAPER_SIZE } : drawn;
}

const ASIDES = [30, -30, 44, -44];
const TICK_PX = 6;
/** Symbols at both ends keep this much of a line that runs from one to the other. */
const CLEAR_OF_SYMBOL_PX = 11;

/** A way to draw it: how far aside, where along the value stands, how far out from the line. */
type Way = { readonly asidePx: number; readonly part: number; readonly outPx: number };

/**
 * The distance drawn as engineers draw it: along the line where there is room, else beside it,
 * the way whose value covers least. A plain distance that would only hide other things is left
 * out; the tables have it.
 */
export function dimensionMarks(frame: Frame, dimension: Dimension, clutter: Clutter): Mark[] {
  const { ends, text } = dimension;
  const drawn = look(frame, dimension.weight);
  const direction = unitVector(ends.from, ends.to);
  if (!direction) return [];
  const wide = textWidth(text, drawn.size, drawn.bold) + 10;
  const turnDeg = readableTurn(direction);
  const ways = waysOf(dimension, apart(ends) / frame.view.metresPerPx, wide, drawn.size);
  const mayGo = dimension.weight === 'plain' && dimension.asidePx === null;
  const best = leastCost(ways, RANK_COST, (way) => {
    const at = valuePlace(frame, ends, direction, way);
    const boxes = turnedBoxes(clutter.toPx(at), wide, drawn.size + 4, turnDeg);
    const cost = sum(boxes.map((box) => clutter.cost(box)));
    // Distances that may be left out are also kept from lying along a zone's edge.
    const along = mayGo ? lineCost(frame, ends, direction, way, clutter) : 0;
    return { way, at, cost: cost + along };
  });
  if (dimension.weight === 'plain' && best.cost > HIDES_TOO_MUCH) return [];
  clutter.addTurned(clutter.toPx(best.at), wide, drawn.size, turnDeg);
  return [
    ...lineMarks(frame, ends, direction, best.way, drawn),
    words(best.at, text, drawn.size, { token: drawn.token, weight: drawn.bold, turnDeg }),
  ];
}

/** What the dimension line itself lies along or crosses, where it stands aside. */
function lineCost(frame: Frame, ends: Ends, direction: Vec, way: Way, clutter: Clutter): number {
  if (way.asidePx === 0) return 0;
  const middle = valuePlace(frame, ends, direction, { ...way, part: 0.5, outPx: 0 });
  const longPx = apart(ends) / frame.view.metresPerPx;
  const boxes = turnedBoxes(clutter.toPx(middle), longPx, LINE_BERTH_PX, readableTurn(direction));
  return sum(boxes.map((box) => clutter.cost(box))) / 2;
}

const LINE_BERTH_PX = 10;
const RANK_COST = 5;
/** About a quarter of a symbol, or a line or two, under the value. */
const HIDES_TOO_MUCH = 420;
const ALONG = [0.5, 0.4, 0.6, 0.3, 0.7, 0.2, 0.8];

function waysOf({ asidePx }: Dimension, longPx: number, wide: number, high: number): Way[] {
  const between = longPx - CLEAR_OF_SYMBOL_PX * 2;
  const slides = ALONG.filter((part) => Math.min(part, 1 - part) * longPx > wide / 2 + 12);
  const at = (aside: number): Way[] =>
    slides.length > 0
      ? slides.map((part) => ({ asidePx: aside, part, outPx: 0 }))
      : [{ asidePx: aside, part: 0.5, outPx: Math.sign(aside) * (high / 2 + 5) }];
  if (asidePx !== null) return at(asidePx);
  const inline = between > wide + 20 ? at(0) : [];
  return [...inline, ...ASIDES.flatMap(at)];
}

function valuePlace(frame: Frame, ends: Ends, direction: Vec, way: Way): Vec {
  const aside = times(leftOf(direction), frame.metres(way.asidePx + way.outPx));
  return add(between(ends.from, ends.to, way.part), aside);
}

function lineMarks(frame: Frame, ends: Ends, direction: Vec, way: Way, drawn: Look): Mark[] {
  if (way.asidePx === 0) {
    const clear = times(direction, frame.metres(CLEAR_OF_SYMBOL_PX));
    const line = [add(ends.from, clear), subtract(ends.to, clear)];
    return measured(frame, line, direction, drawn);
  }
  const sign = Math.sign(way.asidePx);
  const out = (place: Vec, px: number): Vec =>
    add(place, times(leftOf(direction), frame.metres(px)));
  const feelers = [ends.from, ends.to].map((end) => [
    out(end, sign * CLEAR_OF_SYMBOL_PX),
    out(end, way.asidePx + sign * 5),
  ]);
  return [
    line(feelers, stroke(drawn.token, Math.min(drawn.width, 1.25))),
    ...measured(
      frame,
      [ends.from, ends.to].map((end) => out(end, way.asidePx)),
      direction,
      drawn,
    ),
  ];
}

/** The dimension line with a slanting tick at each end. */
function measured(frame: Frame, ends: readonly Vec[], direction: Vec, drawn: Look): Mark[] {
  const slant = times(add(direction, leftOf(direction)), frame.metres(TICK_PX) * Math.SQRT1_2);
  return [
    line([ends], stroke(drawn.token, drawn.width)),
    line(
      ends.map((place) => [subtract(place, slant), add(place, slant)]),
      stroke(drawn.token, Math.max(1.75, drawn.width)),
    ),
  ];
}

const sum = (values: readonly number[]): number =>
  values.reduce((total, value) => total + value, 0);
