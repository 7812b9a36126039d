import { quantise, samePosition, type LonLat } from '../geo';
import { isRun, planeOf, positionsOf, type Layout, type Piece, type Sheet } from '../layout';
import { carry, type Shift } from './carry';
import { KIND_WORDS, pieceWords } from './piece-words';
import { settledPiece } from './settled-piece';
import { shiftBetween, shifted } from './shifted';
import { requirePiece } from './sheet-pieces';
import { EditError, type EditOf } from './types';

/** The position that `move` takes to its `to`: a point's own, else the first of a line or area. */
export const anchorOf = (piece: Piece): LonLat => positionsOf(piece)[0]!;

/** Moves pieces, with what belongs to them (carry.ts). A run can't be moved: it lies between. */
export function move(sheet: Sheet, { moves }: EditOf<'move'>): Sheet {
  const seen = new Set<string>();
  const shifts: Shift[] = [];
  for (const { id, to } of moves) {
    const before = requirePiece(sheet, id);
    if (seen.has(id))
      throw new EditError(`${pieceWords(before)} can't go to two places at once.`, id);
    seen.add(id);
    if (isRun(before)) {
      throw new EditError(
        `A ${KIND_WORDS[before.kind]} lies between two pieces. Move those, or its corners.`,
        id,
      );
    }
    const place = quantise(to);
    if (samePosition(place, anchorOf(before))) continue;
    shifts.push({
      before,
      after: settledPiece(sheet.layout, movedTo(sheet.layout, before, place)),
    });
  }
  return shifts.length === 0 ? sheet : carry(sheet, shifts);
}

function movedTo(layout: Layout, piece: Piece, to: LonLat): Piece {
  if ('at' in piece) return { ...piece, at: to };
  const plane = planeOf(layout);
  const anchor = anchorOf(piece);
  const by = shiftBetween(plane, anchor, to);
  // The anchor lands exactly on `to`, and with it the position that closes its ring.
  const go = (place: LonLat): LonLat =>
    samePosition(place, anchor) ? to : shifted(plane, place, by);
  if ('path' in piece) return { ...piece, path: piece.path.map(go) };
  if ('paths' in piece) return { ...piece, paths: piece.paths.map((path) => path.map(go)) };
  return { ...piece, rings: piece.rings.map((ring) => ring.map(go)) };
}
