import type { SiteFeature } from '@/lib/layout';

export type Stored = {
  readonly feature_id: string;
  readonly place: number;
  readonly feature: SiteFeature;
};
export type Placed = { readonly feature: SiteFeature; readonly place: number };
export type FeatureChanges = {
  readonly put: readonly Placed[];
  readonly remove: readonly string[];
  readonly added: number;
  readonly changed: number;
};

/**
 * The fewest rows that turn what is stored into what was sent: a save of one moved line among
 * twenty thousand writes one row. Places only order, so kept features keep theirs and new ones go
 * behind; only where that isn't the order sent is everything numbered anew.
 */
export function featureChanges(
  stored: readonly Stored[],
  sent: readonly SiteFeature[],
): FeatureChanges {
  const before = new Map(stored.map((row) => [row.feature_id, row]));
  const places = placesFor(before, sent);
  const put: Placed[] = [];
  let added = 0;
  let changed = 0;
  sent.forEach((feature, index) => {
    const old = before.get(feature.id);
    const place = places[index]!;
    const same = old !== undefined && JSON.stringify(old.feature) === JSON.stringify(feature);
    if (!old) added += 1;
    else if (!same) changed += 1;
    if (!same || old.place !== place) put.push({ feature, place });
  });
  const kept = new Set(sent.map((feature) => feature.id));
  const remove = stored.filter((row) => !kept.has(row.feature_id)).map((row) => row.feature_id);
  return { put, remove, added, changed };
}

function placesFor(before: ReadonlyMap<string, Stored>, sent: readonly SiteFeature[]): number[] {
  let behind = 0;
  for (const row of before.values()) behind = Math.max(behind, row.place + 1);
  let last = -1;
  const places: number[] = [];
  for (const feature of sent) {
    const place = before.get(feature.id)?.place ?? behind++;
    if (place <= last) return sent.map((_, index) => index);
    places.push(place);
    last = place;
  }
  return places;
}
