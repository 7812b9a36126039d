import type { KitItem } from '@/lib/layout';

/** One run to be served, with the feet it needs, slack and climbs included. */
export type Need = { readonly feet: number };

/**
 * How many of each item the runs of its kind take: longest run first, each the shortest item left
 * that is long enough. What no item reaches takes none; the checks say so.
 */
export function takenByRuns(items: readonly KitItem[], needs: readonly Need[]): number[] {
  const taken = items.map(() => 0);
  const shortestFirst = items
    .map((item, place) => ({ item, place }))
    .sort((a, b) => (a.item.length_ft ?? Infinity) - (b.item.length_ft ?? Infinity));
  for (const { feet } of [...needs].sort((a, b) => b.feet - a.feet)) {
    const free = shortestFirst.find(
      ({ item, place }) => taken[place]! < item.count && (item.length_ft ?? 0) >= feet,
    );
    if (free) taken[free.place]! += 1;
  }
  return taken;
}
