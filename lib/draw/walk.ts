import { distance, type Vec } from '../geo';
import { between, times, subtract } from './vectors';

export type Footing = { readonly at: Vec; readonly direction: Vec };

/** A path measured once, to be asked often for the place so many metres along it. */
export type Walk = {
  readonly metres: number;
  /** Null before the start and past the end. */
  at(metres: number): Footing | null;
  /** The same on a closed ring, round and round. */
  around(metres: number): Footing | null;
};

export function walk(path: readonly Vec[]): Walk {
  const reached = new Float64Array(path.length);
  for (let i = 1; i < path.length; i++) {
    reached[i] = reached[i - 1]! + distance(path[i - 1]!, path[i]!);
  }
  const metres = reached[path.length - 1] ?? 0;

  function at(along: number): Footing | null {
    if (along < 0 || along > metres || metres === 0) return null;
    let low = 1;
    let high = path.length - 1;
    while (low < high) {
      const middle = (low + high) >> 1;
      if (reached[middle]! < along) low = middle + 1;
      else high = middle;
    }
    const [a, b] = [path[low - 1]!, path[low]!];
    const length = reached[low]! - reached[low - 1]!;
    if (length === 0) return { at: a, direction: { x: 1, y: 0 } };
    return {
      at: between(a, b, (along - reached[low - 1]!) / length),
      direction: times(subtract(b, a), 1 / length),
    };
  }

  const around = (along: number): Footing | null => at(((along % metres) + metres) % metres || 0);

  return { metres, at, around };
}
