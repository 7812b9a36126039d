import type { InHand } from '@/lib/client/in-hand';
import { isSiteKind, type Kind, type Layout } from '@/lib/layout';

/** What stands or lies on the ground and comes from no kit, short enough for the margin. */
const WORDS: readonly (readonly [Kind, string])[] = [
  ['casualty-vehicle', 'Casualty'],
  ['receiving-vehicle', 'Receiver'],
  ['pump', 'Pump'],
  ['release-point', 'Leak'],
  ['pool', 'Pool'],
  ['vent', 'Vent'],
  ['hot-zone', 'Hot zone'],
  ['warm-zone', 'Warm zone'],
  ['note', 'Note'],
  ['buried-line', 'Buried line'],
  ['overhead-line', 'Overhead line'],
  ['metal-line', 'Rail or fence'],
  ['no-drive', 'No-drive'],
  ['low-ground', 'Low ground'],
  ['fixed-point', 'Fixed point'],
];

const ONE_EACH: ReadonlySet<Kind> = new Set(['casualty-vehicle', 'receiving-vehicle', 'pump']);

export type GroundItem = {
  readonly key: Kind;
  readonly words: string;
  /** A unit that is drawn already: there is one of each. */
  readonly drawn: boolean;
  readonly inHand: InHand;
};

export function groundItems(layout: Layout, canChangeSite: boolean): GroundItem[] {
  const drawn = new Set(layout.pieces.map((piece) => piece.kind));
  return WORDS.filter(([kind]) => canChangeSite || !isSiteKind(kind)).map(([kind, words]) => ({
    key: kind,
    words,
    drawn: ONE_EACH.has(kind) && drawn.has(kind as Layout['pieces'][number]['kind']),
    inHand: { kind, words, members: {} },
  }));
}
