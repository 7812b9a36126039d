import { distance, meanOf, type Vec } from '../geo';
import type { Clutter } from './clutter';
import type { Frame } from './frame';
import { crossingsAt } from './hatch';
import { leastCost } from './least-cost';
import { words } from './marks';
import { textWidth } from './text-width';
import type { Token } from './themes';
import type { LettersMark, TextMark } from './types';

type ZoneWords = {
  readonly text: string;
  readonly size: number;
  readonly insetPx: number;
  readonly token: Token;
};

const LETTER_SPACING = 1.2;
/** Words take at most this part of a circle: more would read as a frame, not as a name. */
const MOST_PART = 0.3;

/** A ring of many vertices, all as far from its middle within 1 %: its radius, else null. */
export function circleRadius(ring: readonly Vec[]): number | null {
  const corners = ring.slice(0, -1);
  const middle = meanOf(corners);
  if (corners.length < 12 || !middle) return null;
  const radii = corners.map((v) => distance(v, middle));
  const mean = radii.reduce((sum, r) => sum + r, 0) / radii.length;
  return radii.every((r) => Math.abs(r - mean) <= mean * 0.01) ? mean : null;
}

/**
 * Where round a circle the words may stand: their middle, degrees from south towards east, and
 * whether their feet point outwards (the southern half) or inwards (the northern).
 */
const SOUTH = [0, 25, -25, 50, -50, 70, -70].map((deg) => ({ deg, feetOut: true }));
const NORTH = [180, 155, 205, 130, 230].map((deg) => ({ deg, feetOut: false }));
/** South unless another place spares this much: words that wander are hard to find. */
const RANK_COST = 60;

/** Words that follow the inside of a circle, upright, where they cover least. */
export function wordsInCircle(
  frame: Frame,
  ring: readonly Vec[],
  radius: number,
  { text, size, insetPx, token }: ZoneWords,
  clutter: Clutter,
): LettersMark | null {
  const middle = meanOf(ring.slice(0, -1));
  const inner = radius - frame.metres(insetPx);
  const spaced = (piece: string): number =>
    frame.metres(textWidth(piece, size, 600) * LETTER_SPACING);
  if (!middle || spaced(text) > Math.PI * 2 * inner * MOST_PART) return null;
  const { letters } = leastCost([...SOUTH, ...NORTH], RANK_COST, ({ deg, feetOut }) => {
    const placed = [...text].map((letter, i) => {
      const along = spaced(text.slice(0, i)) + spaced(letter) / 2 - spaced(text) / 2;
      const turn = (deg * Math.PI) / 180 + ((feetOut ? 1 : -1) * along) / inner;
      const at = {
        x: middle.x + inner * Math.sin(turn),
        y: middle.y - inner * Math.cos(turn),
      };
      const tilt = (-turn * 180) / Math.PI;
      return { at, turnDeg: feetOut ? tilt : tilt + 180 };
    });
    const cost = placed.reduce((sum, { at }) => sum + clutter.cost(clutter.boxAt(at, size)), 0);
    return { letters: placed, cost };
  });
  return { type: 'letters', text, letters, size, weight: 600, token, halo: 'paper' };
}

/** Level words in the zone where they fit with a margin, south first; null where they never do. */
export function wordsInOutline(
  frame: Frame,
  rings: readonly (readonly Vec[])[],
  { text, size, insetPx, token }: ZoneWords,
  clutter: Clutter,
): TextMark | null {
  const north = (rings[0] ?? []).map((v) => v.y);
  const [low, high] = [Math.min(...north), Math.max(...north)];
  const width = textWidth(text, size, 600);
  const wide = frame.metres(width + insetPx * 2);
  const half = frame.metres(size);
  const step = Math.max(frame.metres(10), (high - low) / 60);
  const places: Vec[] = [];
  for (let y = low + frame.metres(insetPx); y < high; y += step) {
    const room = widestCommon([spans(rings, y - half), spans(rings, y), spans(rings, y + half)]);
    if (room && room[1] - room[0] >= wide) places.push({ x: (room[0] + room[1]) / 2, y });
  }
  if (places.length === 0) return null;
  const { at } = leastCost(places, RANK_COST, (place) => {
    const { x, y } = clutter.toPx(place);
    const box = { x: x - width / 2, y: y - size / 2, w: width, h: size };
    return { at: place, cost: clutter.cost(box) };
  });
  return words(at, text, size, { token });
}

type Span = readonly [number, number];

/** West to east, the stretches of the level `y` that lie inside. */
function spans(rings: readonly (readonly Vec[])[], y: number): Span[] {
  const cuts = rings.flatMap((ring) => crossingsAt(ring, y)).sort((a, b) => a - b);
  return cuts.flatMap((cut, i) =>
    i % 2 === 0 && i + 1 < cuts.length ? [[cut, cuts[i + 1]!]] : [],
  );
}

function widestCommon([first = [], ...others]: readonly (readonly Span[])[]): Span | null {
  const common = others.reduce<readonly Span[]>(
    (kept, level) =>
      kept.flatMap(([a, b]) =>
        level.flatMap(([c, d]): Span[] =>
          Math.min(b, d) > Math.max(a, c) ? [[Math.max(a, c), Math.min(b, d)]] : [],
        ),
      ),
    first,
  );
  return common.reduce<Span | null>(
    (best, span) => (best && best[1] - best[0] >= span[1] - span[0] ? best : span),
    null,
  );
}
