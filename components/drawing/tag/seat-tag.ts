import type { Px } from '@/lib/draw';

export type Box = {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
};

/** Px between a piece and its tag, and between the tag and the frame. */
const GAP_PX = 30;
const EDGE_PX = 8;

/**
 * Where the upper left corner of a tag of `size` goes so that it covers nothing of `piece` and as
 * few as may be of `others`. `room` is the plan, `foot` px at its bottom that stay free.
 */
export function seatTag(piece: Box, size: Px, room: Px, others: readonly Px[], foot: number): Px {
  const most = { x: room.x - size.x - EDGE_PX, y: room.y - foot - size.y - EDGE_PX };
  const clamp = (value: number, high: number): number =>
    Math.max(EDGE_PX, Math.min(value, Math.max(EDGE_PX, high)));
  const middle = { x: (piece.left + piece.right) / 2, y: (piece.top + piece.bottom) / 2 };
  const level = clamp(middle.y - size.y / 2, most.y);
  const under = clamp(middle.x - size.x / 2, most.x);
  const seats: Px[] = [
    { x: piece.right + GAP_PX, y: level },
    { x: piece.left - GAP_PX - size.x, y: level },
    { x: under, y: piece.bottom + GAP_PX },
    { x: under, y: piece.top - GAP_PX - size.y },
    { x: piece.right + GAP_PX, y: piece.bottom + GAP_PX },
    { x: piece.right + GAP_PX, y: piece.top - GAP_PX - size.y },
    { x: piece.left - GAP_PX - size.x, y: piece.bottom + GAP_PX },
    { x: piece.left - GAP_PX - size.x, y: piece.top - GAP_PX - size.y },
    { x: EDGE_PX, y: EDGE_PX },
    { x: most.x, y: EDGE_PX },
    { x: EDGE_PX, y: most.y },
    { x: most.x, y: most.y },
  ];
  const cost = (seat: Px): number => {
    const box = boxAt(seat, size);
    const out =
      Math.max(0, EDGE_PX - box.left, box.right - (room.x - EDGE_PX)) +
      Math.max(0, EDGE_PX - box.top, box.bottom - (room.y - foot - EDGE_PX));
    const covered = others.filter((p) => isIn(p, box)).length;
    return out * 50 + overlap(box, piece) * 10 + covered;
  };
  const best = seats.reduce((a, b) => (cost(b) < cost(a) ? b : a));
  return { x: clamp(best.x, most.x), y: clamp(best.y, most.y) };
}

const boxAt = ({ x, y }: Px, size: Px): Box => ({
  left: x,
  top: y,
  right: x + size.x,
  bottom: y + size.y,
});

const isIn = (p: Px, box: Box): boolean =>
  p.x >= box.left && p.x <= box.right && p.y >= box.top && p.y <= box.bottom;

/** Side of the square as large as what both cover, px. */
function overlap(a: Box, b: Box): number {
  const x = Math.min(a.right, b.right) - Math.max(a.left, b.left);
  const y = Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top);
  return x > 0 && y > 0 ? Math.sqrt(x * y) : 0;
}
