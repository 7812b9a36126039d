import {
  findPiece,
  isRun,
  isUnit,
  MOST_PIECES,
  planeOf,
  type Piece,
  type Run,
  type Sheet,
} from '../layout';
import { KIND_WORDS } from './piece-words';
import { checkReferences } from './references';
import { settledPiece } from './settled-piece';
import { withAdded, withPieces } from './sheet-pieces';
import { EditError, type EditOf } from './types';
import { ontoUnit } from './unit-frame';

/**
 * Adds pieces. They may name each other in any order. Where a run's end and the piece it names
 * disagree, the piece wins: the end is laid onto it.
 */
export function place(sheet: Sheet, { pieces }: EditOf<'place'>): Sheet {
  if (pieces.length === 0) return sheet;
  const settled = pieces.map((piece) => settledPiece(sheet.layout, piece));
  checkIds(sheet, settled);
  checkOneOfEach(sheet, settled);
  const placed = withAdded(sheet, settled);
  if (placed.layout.pieces.length > MOST_PIECES) {
    throw new EditError(
      `A layout holds at most ${MOST_PIECES} pieces. Remove some first.`,
      settled.at(-1)!.id,
    );
  }
  settled.forEach((piece) => checkReferences(placed, piece));
  const laid = settled.filter(isRun).map((run) => laidOnto(placed, run));
  return withPieces(placed, new Map(laid.map((run) => [run.id, run])));
}

function checkIds(sheet: Sheet, added: readonly Piece[]): void {
  const seen = new Set<string>();
  for (const { id } of added) {
    if (seen.has(id) || findPiece(sheet, id)) {
      throw new EditError(`There is already a piece with the id ${id} on the drawing.`, id);
    }
    seen.add(id);
  }
}

function checkOneOfEach(sheet: Sheet, added: readonly Piece[]): void {
  const drawn = new Set<string>(sheet.layout.pieces.filter(isUnit).map((unit) => unit.kind));
  for (const unit of added.filter(isUnit)) {
    if (drawn.has(unit.kind)) {
      throw new EditError(
        `There is already a ${KIND_WORDS[unit.kind]} on the drawing. Move it, or remove it first.`,
        unit.id,
      );
    }
    drawn.add(unit.kind);
  }
}

/** The run with each end on the piece it names. */
export function laidOnto(sheet: Sheet, run: Run): Run {
  const plane = planeOf(sheet.layout);
  const onto = (id: string, place: Run['path'][number]) => {
    const piece = findPiece(sheet, id);
    if (!piece || !('at' in piece)) return place;
    return isUnit(piece) ? ontoUnit(plane, piece, place) : piece.at;
  };
  const [first, last] = [run.path[0]!, run.path.at(-1)!];
  return { ...run, path: [onto(run.from, first), ...run.path.slice(1, -1), onto(run.to, last)] };
}
