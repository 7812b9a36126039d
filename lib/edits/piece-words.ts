import type { Kind, Piece } from '../layout';

/** What each kind is called in a sentence. */
export const KIND_WORDS: Record<Kind, string> = {
  'casualty-vehicle': 'casualty vehicle',
  'receiving-vehicle': 'receiving vehicle',
  pump: 'pump',
  'release-point': 'release point',
  vent: 'vent',
  pool: 'pool',
  rod: 'rod',
  jumper: 'jumper',
  'ground-cable': 'ground cable',
  'bond-cable': 'bond cable',
  hose: 'hose',
  'z-probe': 'Z probe',
  'y-probe': 'Y probe',
  tester: 'tester',
  'test-lead': 'test lead',
  'hot-zone': 'hot zone',
  'warm-zone': 'warm zone',
  note: 'note',
  'no-drive': 'no-drive ground',
  'low-ground': 'low ground',
  'buried-line': 'buried line',
  'metal-line': 'metal line',
  'overhead-line': 'overhead line',
  'fixed-point': 'fixed point',
};

/** Its label alone where it has one (R2), else what it is: ids mean nothing to a reader. */
export function pieceWords(piece: Piece): string {
  if (piece.label) return piece.label;
  if (piece.kind === 'fixed-point' && piece.name) return piece.name;
  if (piece.kind === 'y-probe' && piece.serves) return `Y probe for ${piece.serves.join(', ')}`;
  return KIND_WORDS[piece.kind];
}
