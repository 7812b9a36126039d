import { nearestOnPath, type Vec } from '../geo';

/** The places of two shapes, each one vertex or more, that are nearest to each other. */
export function nearestPlaces(
  one: readonly Vec[],
  other: readonly Vec[],
): { readonly from: Vec; readonly to: Vec } | null {
  let best: { from: Vec; to: Vec; metres: number } | null = null;
  // Where two shapes don't cross, one of the two nearest places is a vertex.
  for (const v of one) {
    const { at, metres } = nearestOnPath(v, other);
    if (!best || metres < best.metres) best = { from: v, to: at, metres };
  }
  for (const v of other) {
    const { at, metres } = nearestOnPath(v, one);
    if (!best || metres < best.metres) best = { from: at, to: v, metres };
  }
  return best;
}

/** The nearest of several shapes. */
export function nearestOf(
  one: readonly Vec[],
  others: readonly (readonly Vec[])[],
): { readonly from: Vec; readonly to: Vec } | null {
  let best: { from: Vec; to: Vec } | null = null;
  for (const other of others) {
    const found = nearestPlaces(one, other);
    if (found && (!best || length(found) < length(best))) best = found;
  }
  return best;
}

const length = ({ from, to }: { from: Vec; to: Vec }): number =>
  Math.hypot(to.x - from.x, to.y - from.y);
