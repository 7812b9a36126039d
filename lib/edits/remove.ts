import { isRun, type Sheet } from '../layout';
import { requirePiece, withoutPieces } from './sheet-pieces';
import type { EditOf } from './types';

/** Takes pieces away, with the runs joined to them and the vents that were theirs. */
export function remove(sheet: Sheet, { ids }: EditOf<'remove'>): Sheet {
  ids.forEach((id) => requirePiece(sheet, id));
  const gone = new Set(ids);
  for (const piece of sheet.layout.pieces) {
    const orphaned = isRun(piece)
      ? gone.has(piece.from) || gone.has(piece.to)
      : piece.kind === 'vent' && piece.of !== undefined && gone.has(piece.of);
    // Nothing is joined to a run or a vent, so one pass finds all.
    if (orphaned) gone.add(piece.id);
  }
  return withoutPieces(sheet, gone);
}
