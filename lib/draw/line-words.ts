import { distance, type Vec } from '../geo';
import type { Frame } from './frame';
import { words } from './marks';
import { textWidth } from './text-width';
import type { Token } from './themes';
import type { TextMark } from './types';
import { readableTurn } from './vectors';
import { walk, type Footing, type Walk } from './walk';

const SIZE_PX = 14;
const PAPER_SIZE_PX = 12.5;
/** One word about every so many px, the first where a short line still carries one. */
const EVERY_PX = 320;
const MOST_WORDS = 40;

/**
 * The word repeated along the line, counted from its first vertex, so that words stay where they
 * are while the sheet is moved. A word never bends: it is left out where the line turns under it.
 */
export function wordsAlong(
  frame: Frame,
  path: readonly Vec[],
  text: string,
  token: Token,
): TextMark[] {
  const way = walk(path);
  const size = frame.inkOnly ? PAPER_SIZE_PX : SIZE_PX;
  const wide = frame.metres(textWidth(text, size, 600) + 12);
  if (way.metres < wide * 1.4) return [];
  const count = Math.min(MOST_WORDS, Math.max(1, Math.round(way.metres / frame.metres(EVERY_PX))));
  return Array.from({ length: count }, (_, i) =>
    straightPlace(way, ((i + 0.5) * way.metres) / count, wide, way.metres / count / 2),
  ).flatMap((place) =>
    place ? [words(place.at, text, size, { token, turnDeg: readableTurn(place.direction) })] : [],
  );
}

/** The nearest place to `middle` within `reach` where the path runs straight for `wide` metres. */
function straightPlace(way: Walk, middle: number, wide: number, reach: number): Footing | null {
  for (let step = 0; step <= 6; step++) {
    for (const side of step === 0 ? [0] : [1, -1]) {
      const centre = middle + (side * step * reach) / 7;
      const [from, to] = [way.at(centre - wide / 2), way.at(centre + wide / 2)];
      const at = way.at(centre);
      if (from && to && at && distance(from.at, to.at) > wide * 0.985) return at;
    }
  }
  return null;
}
