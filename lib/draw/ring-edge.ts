import { distance, type Vec } from '../geo';
import type { Frame } from './frame';
import { textWidth } from './text-width';
import type { Token } from './themes';
import type { LettersMark } from './types';
import { add, leftOf, subtract, times } from './vectors';
import { walk, type Walk } from './walk';

const TOOTH_EVERY_PX = 13;
const TOOTH_PX = 8;
const MOST_TEETH = 600;
const LETTER_SPACING = 1.2;
/** Words take at most this part of the ring: more would read as a frame, not as a name. */
const MOST_PART = 0.3;

/** Short slanting teeth on the inner side of the outer ring and on the outer side of holes. */
export function hachures(frame: Frame, rings: readonly (readonly Vec[])[]): Vec[][] {
  return rings.flatMap((ring, index) => {
    const way = walk(ring);
    const count = Math.min(MOST_TEETH, Math.floor(way.metres / frame.metres(TOOTH_EVERY_PX)));
    if (count < 6) return [];
    const inward = turnsLeft(ring) === (index === 0) ? 1 : -1;
    return Array.from({ length: count }, (_, i) => {
      const foot = way.at(((i + 0.5) * way.metres) / count);
      if (!foot) return [];
      const tooth = add(times(leftOf(foot.direction), inward), times(foot.direction, 0.45));
      return [foot.at, add(foot.at, times(tooth, frame.metres(TOOTH_PX)))];
    });
  });
}

type RingWords = {
  readonly text: string;
  readonly size: number;
  readonly insetPx: number;
  readonly token: Token;
};

/**
 * Words along the inside of the ring at its southern side, reading from the west. The ring is
 * evened out over the words' length, so that letters don't stagger along a rough outline.
 * Null where the ring is too small for them.
 */
export function ringWords(
  frame: Frame,
  ring: readonly Vec[],
  { text, size, insetPx, token }: RingWords,
): LettersMark | null {
  const eastward = turnsLeft(ring) ? ring : [...ring].reverse();
  const way = walk(eastward);
  const spaced = (piece: string): number =>
    frame.metres(textWidth(piece, size, 600) * LETTER_SPACING);
  const wide = spaced(text);
  if (wide > way.metres * MOST_PART || ring.length < 4) return null;
  const start = southernmost(eastward) - wide / 2;
  const step = wide / 20;
  const letters = [...text].map((letter, i) => {
    const centre = start + spaced(text.slice(0, i)) + spaced(letter) / 2;
    const [before, after] = [evened(way, centre - step, wide), evened(way, centre + step, wide)];
    const direction = times(subtract(after, before), 1 / (distance(before, after) || 1));
    return {
      at: add(evened(way, centre, wide), times(leftOf(direction), frame.metres(insetPx))),
      turnDeg: (Math.atan2(-direction.y, direction.x) * 180) / Math.PI,
    };
  });
  return { type: 'letters', text, letters, size, weight: 600, token, halo: 'paper' };
}

/** The mean of places on the ring over most of a word's width round `metres`. */
function evened(way: Walk, metres: number, wide: number): Vec {
  const steps = 9;
  let sum: Vec = { x: 0, y: 0 };
  for (let i = 0; i < steps; i++) {
    const foot = way.around(metres + (i / (steps - 1) - 0.5) * wide * 0.7);
    if (foot) sum = add(sum, times(foot.at, 1 / steps));
  }
  return sum;
}

/** True where the ring runs counter-clockwise seen from above: its inside lies to the left. */
function turnsLeft(ring: readonly Vec[]): boolean {
  let area = 0;
  for (let i = 1; i < ring.length; i++) {
    area += ring[i - 1]!.x * ring[i]!.y - ring[i]!.x * ring[i - 1]!.y;
  }
  return area > 0;
}

/** Metres along the ring to its southernmost place; to the middle of a level southern edge. */
function southernmost(ring: readonly Vec[]): number {
  const lowest = Math.min(...ring.map((v) => v.y));
  const level = (v: Vec): boolean => v.y - lowest < 1e-6;
  let run = 0;
  let first: number | null = null;
  for (let i = 0; i < ring.length - 1; i++) {
    const step = distance(ring[i]!, ring[i + 1]!);
    if (level(ring[i]!) && level(ring[i + 1]!)) return run + step / 2;
    if (level(ring[i]!)) first ??= run;
    run += step;
  }
  return first ?? 0;
}
