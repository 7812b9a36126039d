/**
 * The candidate that costs least, each one later in the list costing `rankCost` more. Stops as
 * soon as no later one can be better. Throws on an empty list.
 */
export function leastCost<C, R extends { readonly cost: number }>(
  candidates: readonly C[],
  rankCost: number,
  weigh: (candidate: C) => R,
): R {
  let best: R | null = null;
  let least = Infinity;
  for (const [rank, candidate] of candidates.entries()) {
    if (rank * rankCost >= least) break;
    const weighed = weigh(candidate);
    const cost = weighed.cost + rank * rankCost;
    if (cost < least) [best, least] = [weighed, cost];
  }
  if (!best) throw new RangeError('there is nothing to choose from');
  return best;
}
