import { findPiece, isRun, isUnit, type Layout, type Piece, type Run, type Sheet } from '../layout';
import { ENDS } from '../layout/exchange/references';
import { KIND_WORDS, pieceWords } from './piece-words';
import { EditError } from './types';

export type End = 'from' | 'to';

/** True where that end of such a run may be joined to the piece. */
export const mayJoin = (run: Run['kind'], end: End, piece: Piece): boolean =>
  ENDS[run][end].includes(piece.kind);

/** The runs with an end at the piece. */
export const runsAt = (layout: Layout, id: string): Run[] =>
  layout.pieces.filter(isRun).filter((run) => run.from === id || run.to === id);

/** Throws where the piece names something that isn't there or can't be what it is named as. */
export function checkReferences(sheet: Sheet, piece: Piece): void {
  if (isRun(piece)) {
    for (const end of ['from', 'to'] as const) {
      const other = named(sheet, piece, end, piece[end]);
      if (!mayJoin(piece.kind, end, other)) throw wrongKind(piece, end, other);
    }
    if (piece.from === piece.to) {
      throw new EditError(
        `A ${KIND_WORDS[piece.kind]} can't run from a piece to itself. Choose another piece for one end.`,
        piece.id,
      );
    }
  } else if (piece.kind === 'vent' && piece.of !== undefined) {
    const unit = named(sheet, piece, 'of', piece.of);
    if (!isUnit(unit)) throw wrongKind(piece, 'of', unit);
  }
}

function named(sheet: Sheet, piece: Piece, member: string, id: string): Piece {
  const other = findPiece(sheet, id);
  if (other) return other;
  throw new EditError(
    `What ${pieceWords(piece)} is joined to (${member}: ${id}) is not on the drawing.`,
    piece.id,
  );
}

const wrongKind = (piece: Piece, member: string, other: Piece): EditError =>
  new EditError(
    `${pieceWords(other)} can't be the ${member} of a ${KIND_WORDS[piece.kind]}. Choose another piece.`,
    piece.id,
  );
