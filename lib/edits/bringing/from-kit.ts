import { rodLengthFt, piecesOf, type KitItem, type KitKind, type Layout } from '../../layout';

/** What the kit that was chosen says a piece measures; nothing where no kit was. */

const itemsOf = (layout: Layout, kind: KitKind): KitItem[] =>
  layout.kit?.items.filter((item) => item.kind === kind && item.count > 0) ?? [];

/** Length and diameter of the next rod out of the case: the first kind with any left. */
export function rodFromKit(layout: Layout): { length_ft?: number; diameter_in?: number } {
  const items = itemsOf(layout, 'rod');
  const drawn = piecesOf(layout.pieces, 'rod');
  const left = items.find(
    (item) => drawn.filter((rod) => rodLengthFt(rod) === item.length_ft).length < item.count,
  );
  const item = left ?? items[0];
  return {
    ...(item?.length_ft && { length_ft: item.length_ft }),
    ...(item?.diameter_in && { diameter_in: item.diameter_in }),
  };
}

export function hoseFromKit(layout: Layout): { diameter_in?: number } {
  const diameter = itemsOf(layout, 'hose')[0]?.diameter_in;
  return diameter ? { diameter_in: diameter } : {};
}

/** Feet on the ground that the longest jumper spans with its slack; null where no kit lists one. */
export function jumperReachFt(layout: Layout, slackPct: number): number | null {
  const lengths = itemsOf(layout, 'jumper').flatMap((item) => item.length_ft ?? []);
  return lengths.length === 0 ? null : Math.max(...lengths) / (1 + slackPct / 100);
}
