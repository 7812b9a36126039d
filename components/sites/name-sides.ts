type Spot = { readonly x: number; readonly y: number };
export type Side = 'left' | 'right';

/** Height of a name and the length that most stay within, px. */
const NAME = { height: 24, length: 200 } as const;

/**
 * On which side of its mark each name stands: right, unless it would run into the name of a mark
 * that lies above it or level with it.
 */
export function nameSides(spots: readonly Spot[]): Side[] {
  const sides = spots.map((): Side => 'right');
  const order = spots.map((_, i) => i).sort((a, b) => spots[a]!.y - spots[b]!.y || a - b);
  order.forEach((i, place) => {
    const clash = order.slice(0, place).some((j) => {
      const [mine, other] = [spots[i]!, spots[j]!];
      const near = Math.abs(mine.y - other.y) < NAME.height;
      return near && sides[j] === 'right' && Math.abs(mine.x - other.x) < NAME.length;
    });
    if (clash) sides[i] = 'left';
  });
  return sides;
}
