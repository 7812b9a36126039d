/** A mark, px from the map's upper left corner, and the size of its name. */
export type Named = {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
};
export type Side = 'right' | 'left' | 'right-low' | 'right-high';

type Box = { left: number; right: number; top: number; bottom: number };

/** How far a low or a high name is moved from its mark's level, px; the style sheet moves it. */
const MOVED = 24;
const SIDES: readonly Side[] = ['right', 'left', 'right-low', 'right-high'];

/**
 * On which side of its mark each name stands: the first side on which it neither runs into a name
 * already placed nor off the map. Where no side is free it stays on the right.
 */
export function nameSides(marks: readonly Named[], mapWidth: number): Side[] {
  const placed: Box[] = [];
  return marks.map((mark) => {
    const side =
      SIDES.find((candidate) => {
        const box = boxOf(mark, candidate);
        const inside = box.left >= 0 && box.right <= mapWidth;
        return inside && !placed.some((other) => overlap(box, other));
      }) ?? 'right';
    placed.push(boxOf(mark, side));
    return side;
  });
}

function boxOf({ x, y, width, height }: Named, side: Side): Box {
  const moved = side === 'right-low' ? MOVED : side === 'right-high' ? -MOVED : 0;
  const left = side === 'left' ? x - width : x;
  return {
    left,
    right: left + width,
    top: y + moved - height / 2,
    bottom: y + moved + height / 2,
  };
}

const overlap = (a: Box, b: Box): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
