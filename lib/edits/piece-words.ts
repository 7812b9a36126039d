import { KIND_WORDS, type Piece } from '../layout';

export { KIND_WORDS };

/** Its label alone where it has one (R2), else what it is: ids mean nothing to a reader. */
export function pieceWords(piece: Piece): string {
  if (piece.label) return piece.label;
  if (piece.kind === 'fixed-point' && piece.name) return piece.name;
  if (piece.kind === 'y-probe' && piece.serves) return `Y probe for ${piece.serves.join(', ')}`;
  return KIND_WORDS[piece.kind];
}
