import { distance, meanOf, type Vec } from '../geo';
import type { Frame } from './frame';
import { crossingsAt } from './hatch';
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

/** Words that follow the southern inside of a circle, reading from the west. */
export function wordsInCircle(
  frame: Frame,
  ring: readonly Vec[],
  radius: number,
  { text, size, insetPx, token }: ZoneWords,
): LettersMark | null {
  const middle = meanOf(ring.slice(0, -1));
  const inner = radius - frame.metres(insetPx);
  const spaced = (piece: string): number =>
    frame.metres(textWidth(piece, size, 600) * LETTER_SPACING);
  if (!middle || spaced(text) > Math.PI * 2 * inner * MOST_PART) return null;
  const letters = [...text].map((letter, i) => {
    const east = spaced(text.slice(0, i)) + spaced(letter) / 2 - spaced(text) / 2;
    const turn = east / inner;
    return {
      at: { x: middle.x + inner * Math.sin(turn), y: middle.y - inner * Math.cos(turn) },
      turnDeg: (-turn * 180) / Math.PI,
    };
  });
  return { type: 'letters', text, letters, size, weight: 600, token, halo: 'paper' };
}

/** Level words as far south in the zone as they fit with a margin; null where they never do. */
export function wordsInOutline(
  frame: Frame,
  rings: readonly (readonly Vec[])[],
  { text, size, insetPx, token }: ZoneWords,
): TextMark | null {
  const north = (rings[0] ?? []).map((v) => v.y);
  const [low, high] = [Math.min(...north), Math.max(...north)];
  const wide = frame.metres(textWidth(text, size, 600) + insetPx * 2);
  const half = frame.metres(size);
  for (let y = low + frame.metres(insetPx); y < high; y += frame.metres(8)) {
    const room = widestCommon([spans(rings, y - half), spans(rings, y), spans(rings, y + half)]);
    if (room && room[1] - room[0] >= wide) {
      return words({ x: (room[0] + room[1]) / 2, y }, text, size, { token });
    }
  }
  return null;
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
