import { distance, pathLength, type Vec } from '../geo';
import { along } from './curves';
import type { Frame } from './frame';
import { textWidth } from './text-width';
import type { Token } from './themes';
import type { LettersMark } from './types';
import { add, leftOf, subtract, times } from './vectors';

const TOOTH_EVERY_PX = 13;
const TOOTH_PX = 8;
const MOST_TEETH = 600;
const LETTER_SPACING = 1.12;

/** Short slanting teeth on the inner side of the outer ring and on the outer side of holes. */
export function hachures(frame: Frame, rings: readonly (readonly Vec[])[]): Vec[][] {
  return rings.flatMap((ring, index) => {
    const length = pathLength(ring);
    const count = Math.min(MOST_TEETH, Math.floor(length / frame.metres(TOOTH_EVERY_PX)));
    if (count < 6) return [];
    const inward = turnsLeft(ring) === (index === 0) ? 1 : -1;
    return Array.from({ length: count }, (_, i) => {
      const foot = along(ring, ((i + 0.5) * length) / count);
      if (!foot) return [];
      const tooth = add(times(leftOf(foot.direction), inward), times(foot.direction, 0.45));
      return [foot.at, add(foot.at, times(tooth, frame.metres(TOOTH_PX)))];
    });
  });
}

/**
 * `text` along the inside of the ring at its southern side, reading from the west. The ring is
 * evened out over the words' length, so that letters don't stagger along a rough outline.
 * Null where the ring is too small for it.
 */
export function ringWords(
  frame: Frame,
  ring: readonly Vec[],
  text: string,
  size: number,
  insetPx: number,
  token: Token,
): LettersMark | null {
  const length = pathLength(ring);
  const spaced = (piece: string): number =>
    frame.metres(textWidth(piece, size, 600) * LETTER_SPACING);
  const wide = spaced(text);
  if (wide > length * 0.3 || ring.length < 4) return null;
  const eastward = turnsLeft(ring) ? ring : [...ring].reverse();
  const start = southernmost(eastward) - wide / 2;
  const evened = (metres: number): Vec => {
    const steps = 9;
    let sum: Vec = { x: 0, y: 0 };
    for (let i = 0; i < steps; i++) {
      const place = onLoop(eastward, length, metres + (i / (steps - 1) - 0.5) * wide * 0.7);
      sum = add(sum, times(place, 1 / steps));
    }
    return sum;
  };
  const step = wide / 20;
  const letters = [...text].map((letter, i) => {
    const centre = start + spaced(text.slice(0, i)) + spaced(letter) / 2;
    const [before, after] = [evened(centre - step), evened(centre + step)];
    const span = distance(before, after) || 1;
    const direction = times(subtract(after, before), 1 / span);
    return {
      at: add(evened(centre), times(leftOf(direction), frame.metres(insetPx))),
      turnDeg: (Math.atan2(-direction.y, direction.x) * 180) / Math.PI,
    };
  });
  return { type: 'letters', text, letters, size, weight: 600, token, halo: 'paper' };
}

/** True where the ring runs counter-clockwise seen from above: its inside lies to the left. */
function turnsLeft(ring: readonly Vec[]): boolean {
  let area = 0;
  for (let i = 1; i < ring.length; i++) {
    area += ring[i - 1]!.x * ring[i]!.y - ring[i]!.x * ring[i - 1]!.y;
  }
  return area > 0;
}

/** Metres along the ring to its southernmost place; the middle one of a level southern edge. */
function southernmost(ring: readonly Vec[]): number {
  const lowest = Math.min(...ring.map((v) => v.y));
  const level = (v: Vec): boolean => v.y - lowest < 1e-6;
  let run = 0;
  const found: number[] = [];
  for (let i = 0; i < ring.length - 1; i++) {
    if (level(ring[i]!)) found.push(run);
    const step = distance(ring[i]!, ring[i + 1]!);
    if (level(ring[i]!) && level(ring[i + 1]!)) return run + step / 2;
    run += step;
  }
  return found[0] ?? 0;
}

function onLoop(ring: readonly Vec[], length: number, metres: number): Vec {
  const wrapped = ((metres % length) + length) % length;
  return along(ring, wrapped)?.at ?? ring[0]!;
}
