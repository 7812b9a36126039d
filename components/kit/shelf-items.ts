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
} from '@/lib/layout';
import { takenByRuns } from './taken-by-runs';

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

const ALONG_WORDS: Partial<Record<KitKind, string>> = {
  coupler: 'couplers',
  clamp: 'clamps',
  driver: 'drivers',
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
    return words ? [{ words, count }] : [];
  });

function itemFor(kind: Kind, item: KitItem | null, key: string, left: number | null): ShelfItem {
  const words = [WORDS[kind], sizeWords(kind, item)].filter(Boolean).join(' ');
  return { key, words, left, inHand: { kind, words, members: membersFor(kind, item) } };
}

function sizeWords(kind: Kind, item: KitItem | null): string | null {
  if (kind === 'hose') return item?.diameter_in ? `${item.diameter_in} in` : null;
  return item?.length_ft ? `${item.length_ft} ft` : null;
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
  const taken = items.map((item) => (item.kind === 'rod' ? rodsTaken(layout, item) : 0));
  const kinds = [...new Set(items.map((item) => item.kind))];
  for (const kind of kinds) {
    const places = items.flatMap((item, place) => (item.kind === kind ? [place] : []));
    const counted = countedNeed(findings, kind);
    if (kind === 'rod') continue;
    if (kind === 'probe' || kind === 'tester' || kind === 'test-lead') {
      spread(places, counted, items, taken);
      continue;
    }
    const ofKind = places.map((place) => items[place]!);
    takenByRuns(ofKind, runNeeds(layout, findings, kind)).forEach((count, i) => {
      taken[places[i]!] = count;
    });
  }
  return items.map((item, place) => item.count - taken[place]!);
}

const rodsTaken = (layout: Layout, item: KitItem): number =>
  piecesOf(layout.pieces, 'rod').filter(
    (rod) =>
      (item.length_ft == null || rodLengthFt(rod) === item.length_ft) &&
      (item.diameter_in == null || rodDiameterIn(rod) === item.diameter_in),
  ).length;

/** Probes, leads and the tester serve one system at a time: the check counts what that takes. */
const countedNeed = (findings: readonly Finding[], kind: KitKind): number =>
  findings.find(({ rule, subjects }) => rule === 'kit-covers' && subjects[0] === kind)?.measured
    ?.value ?? 0;

/** From the items in order; what none of them has left is owed by the last. */
function spread(places: number[], count: number, items: readonly KitItem[], taken: number[]): void {
  let open = count;
  places.forEach((place, i) => {
    const most = i === places.length - 1 ? open : Math.min(open, items[place]!.count);
    taken[place] = most;
    open -= most;
  });
}

function runNeeds(layout: Layout, findings: readonly Finding[], kind: KitKind) {
  const ids = new Set(layout.pieces.flatMap((piece) => (piece.kind === kind ? [piece.id] : [])));
  return findings.flatMap(({ rule, subjects, measured }) =>
    rule === 'cables-reach' && measured && ids.has(subjects[0] ?? '')
      ? [{ feet: measured.value }]
      : [],
  );
}
