import { expect, test } from 'vitest';
import { seatTag, type Box } from '@/components/drawing/tag/seat-tag';

const ROOM = { x: 800, y: 500 };
const TAG = { x: 240, y: 200 };
const boxRound = (x: number, y: number, half = 16): Box => ({
  left: x - half,
  top: y - half,
  right: x + half,
  bottom: y + half,
});
const covers = (at: { x: number; y: number }, piece: Box): boolean =>
  at.x < piece.right &&
  at.x + TAG.x > piece.left &&
  at.y < piece.bottom &&
  at.y + TAG.y > piece.top;

test('the tag never covers what it speaks of, wherever that stands', () => {
  for (let x = 0; x <= ROOM.x; x += 40) {
    for (let y = 0; y <= ROOM.y; y += 25) {
      const piece = boxRound(x, y);
      const at = seatTag(piece, TAG, ROOM, [], 0);
      expect(covers(at, piece), `piece at ${x}, ${y}`).toBe(false);
      expect(at.x).toBeGreaterThanOrEqual(8);
      expect(at.y).toBeGreaterThanOrEqual(8);
      expect(at.x + TAG.x).toBeLessThanOrEqual(ROOM.x - 8);
      expect(at.y + TAG.y).toBeLessThanOrEqual(ROOM.y - 8);
    }
  }
});

test('of two free sides it takes the one with fewer pieces', () => {
  const right = Array.from({ length: 5 }, (_, i) => ({ x: 500 + i * 10, y: 250 }));
  expect(seatTag(boxRound(400, 250), TAG, ROOM, right, 0).x).toBeLessThan(400);
  const left = right.map(({ x, y }) => ({ x: 800 - x, y }));
  expect(seatTag(boxRound(400, 250), TAG, ROOM, left, 0).x).toBeGreaterThan(400);
});

test('a tag larger than the plan begins at its corner, so that its head is seen', () => {
  const at = seatTag(boxRound(100, 100), { x: 900, y: 600 }, ROOM, [], 0);
  expect(at).toEqual({ x: 8, y: 8 });
});
