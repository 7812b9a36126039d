import type { Finding } from '@/lib/checks';
import type { InHand } from '@/lib/client/in-hand';
import {
  piecesOf,
  rodDiameterIn,
  rodLengthFt,
  type Kind,
  type KitItem,
  type KitKind,
  type Layout,
  type Rod,
} from '@/lib/layout';

/** What lies on the shelf: what is picked with it, and how many are left; null is without end. */
export type ShelfItem = {
  readonly key: string;
  readonly words: string;
  readonly left: number | null;
  readonly inHand: InHand;
};

/** What a kit also holds, that is counted back but never drawn. */
export type AlongItem = { readonly words: string; readonly count: number };

const DRAWN_AS: Partial<Record<KitKind, readonly Kind[]>> = {
  rod: ['rod'],
  jumper: ['jumper'],
  'ground-cable': ['ground-cable'],
  'bond-cable': ['bond-cable'],
  probe: ['z-probe', 'y-probe'],
  tester: ['tester'],
  'test-lead': ['test-lead'],
  hose: ['hose'],
};

const WORDS: Partial<Record<Kind, string>> = {
  rod: 'Rod',
  jumper: 'Jumper',
  'ground-cable': 'Ground',
  'bond-cable': 'Bond',
  'z-probe': 'Z probe',
  'y-probe': 'Y probe',
  tester: 'Tester',
  'test-lead': 'Lead',
  hose: 'Hose',
};

const ALONG_WORDS: Partial<Record<KitKind, readonly [string, string]>> = {
  coupler: ['coupler', 'couplers'],
  clamp: ['clamp', 'clamps'],
  driver: ['driver', 'drivers'],
};

const WITHOUT_A_KIT: readonly Kind[] = [
  'rod',
  'jumper',
  'ground-cable',
  'bond-cable',
  'z-probe',
  'y-probe',
  'test-lead',
  'tester',
  'hose',
];

/** The shelf in the order in which the kit lists its items. Without a kit everything is endless. */
export function shelfItems(layout: Layout, findings: readonly Finding[]): ShelfItem[] {
  if (!layout.kit) {
    return WITHOUT_A_KIT.map((kind) => itemFor(kind, null, kind, null));
  }
  const { items } = layout.kit;
  const left = leftOf(layout, findings);
  return items.flatMap((item, place) =>
    (DRAWN_AS[item.kind] ?? []).map((kind) =>
      itemFor(kind, item, `${place}-${kind}`, left[place] ?? 0),
    ),
  );
}

export const alongItems = (layout: Layout): AlongItem[] =>
  (layout.kit?.items ?? []).flatMap(({ kind, count }) => {
    const words = ALONG_WORDS[kind];
    return words ? [{ words: count === 1 ? words[0] : words[1], count }] : [];
  });

function itemFor(kind: Kind, item: KitItem | null, key: string, left: number | null): ShelfItem {
  const words = [WORDS[kind], sizeWords(kind, item)].filter(Boolean).join(' ');
  return { key, words, left, inHand: { kind, words, members: membersFor(kind, item) } };
}

function sizeWords(kind: Kind, item: KitItem | null): string | null {
  if (kind === 'hose') return item?.diameter_in ? `${item.diameter_in} in` : null;
  return item?.length_ft ? `${item.length_ft}${kind === 'rod' ? ' ft' : ''}` : null;
}

function membersFor(kind: Kind, item: KitItem | null): Record<string, unknown> {
  if (kind === 'rod') {
    return {
      ...(item?.length_ft && { length_ft: item.length_ft }),
      ...(item?.diameter_in && { diameter_in: item.diameter_in }),
    };
  }
  return kind === 'hose' && item?.diameter_in ? { diameter_in: item.diameter_in } : {};
}

/** What is left of each item of the kit; below zero where more are drawn than there are. */
function leftOf(layout: Layout, findings: readonly Finding[]): number[] {
  const items = layout.kit?.items ?? [];
  const left = items.map((item) => item.count);
  const take = (count: number, fits: (item: KitItem) => boolean): void => {
    for (let one = 0; one < count; one++) {
      const free = items.findIndex((item, i) => fits(item) && left[i]! > 0);
      const place = free >= 0 ? free : items.findIndex(fits);
      if (place >= 0) left[place]! -= 1;
    }
  };
  for (const rod of piecesOf(layout.pieces, 'rod')) take(1, (item) => isSuchARod(item, rod));
  for (const kind of ONE_SYSTEM_AT_A_TIME) {
    take(countedNeed(findings, kind), (item) => item.kind === kind);
  }
  for (const given of itemsGiven(layout, findings)) {
    take(1, (item) => item.kind === given.kind && item.length_ft === given.lengthFt);
  }
  return left;
}

/** Probes and the tester are moved on from system to system: the check counts what one takes. */
const ONE_SYSTEM_AT_A_TIME = ['probe', 'tester'] as const;

const isSuchARod = (item: KitItem, rod: Rod): boolean =>
  item.kind === 'rod' &&
  (item.length_ft == null || rodLengthFt(rod) === item.length_ft) &&
  (item.diameter_in == null || rodDiameterIn(rod) === item.diameter_in);

const countedNeed = (findings: readonly Finding[], kind: KitKind): number =>
  findings.find(({ rule, subjects }) => rule === 'kit-covers' && subjects[0] === kind)?.measured
    ?.value ?? 0;

/** Which item the check gave to each run that is reached: its length is the run's limit. */
function itemsGiven(
  layout: Layout,
  findings: readonly Finding[],
): { kind: Kind; lengthFt: number }[] {
  const kinds = new Map(layout.pieces.map((piece) => [piece.id, piece.kind]));
  return findings.flatMap(({ rule, status, subjects, allowed }) => {
    const kind = kinds.get(subjects[0] ?? '');
    if (rule !== 'cables-reach' || status !== 'meets' || !kind || allowed?.max == null) return [];
    return [{ kind, lengthFt: allowed.max }];
  });
}
