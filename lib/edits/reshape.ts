import { quantise, samePosition, type LonLat } from '../geo';
import { isRun, isUnit, planeOf, type Piece, type Sheet } from '../layout';
import { pieceWords } from './piece-words';
import { settledPiece } from './settled-piece';
import { requirePiece, withPieces } from './sheet-pieces';
import { EditError, type EditOf } from './types';
import { ontoUnit } from './unit-frame';

type Reshape = EditOf<'reshape'>;

/**
 * Moves, adds (before the vertex of that number) or takes out one vertex. A ring's closing vertex
 * is its first one and follows it. A run's ends stay on the pieces they are joined to: one on a
 * unit slides over its footprint, one on a rod, probe or tester can't be moved.
 */
export function reshape(sheet: Sheet, edit: Reshape): Sheet {
  const piece = requirePiece(sheet, edit.id);
  const closed = 'rings' in piece;
  const parts = partsOf(piece);
  const part = parts?.[edit.part];
  if (!parts || !part) {
    throw new EditError(
      `${pieceWords(piece)} has no ${closed ? 'ring' : 'line'} of that number.`,
      edit.id,
    );
  }
  const vertices = closed ? part.slice(0, -1) : part;
  const to = settledPlace(sheet, piece, edit, vertices.length);
  const reshaped = reshapedPart(edit, vertices, to);
  if (reshaped === vertices) return sheet;
  if (reshaped.length < (closed ? 3 : 2)) {
    throw new EditError(
      `${pieceWords(piece)} would have too few corners left. Remove it whole instead.`,
      edit.id,
    );
  }
  const whole = parts.map((p, i) =>
    i !== edit.part ? p : closed ? [...reshaped, reshaped[0]!] : reshaped,
  );
  const after = settledPiece(sheet.layout, withParts(piece, whole));
  return withPieces(sheet, new Map([[piece.id, after]]));
}

function reshapedPart(edit: Reshape, vertices: LonLat[], to: LonLat | null): LonLat[] {
  const { vertex, insert, id } = edit;
  const last = insert ? vertices.length : vertices.length - 1;
  if (!Number.isInteger(vertex) || vertex < 0 || vertex > last) {
    throw new EditError(`There is no corner ${vertex} to change.`, id);
  }
  if (to === null) return vertices.toSpliced(vertex, 1);
  if (insert) return vertices.toSpliced(vertex, 0, to);
  return samePosition(vertices[vertex]!, to) ? vertices : vertices.with(vertex, to);
}

/** Where the vertex may go, given what holds it; null takes it out. */
function settledPlace(sheet: Sheet, piece: Piece, edit: Reshape, count: number): LonLat | null {
  const to = edit.to && quantise(edit.to);
  if (!isRun(piece)) return to;
  const last = edit.insert ? count : count - 1;
  const end = edit.vertex === 0 ? 'from' : edit.vertex === last ? 'to' : null;
  if (!end) return to;
  const holder = requirePiece(sheet, piece[end]);
  if (to && !edit.insert && isUnit(holder)) return ontoUnit(planeOf(sheet.layout), holder, to);
  throw new EditError(
    `That end is on ${pieceWords(holder)}. Lead it to another piece instead.`,
    piece.id,
  );
}

function partsOf(piece: Piece): LonLat[][] | null {
  if ('path' in piece) return [piece.path];
  if ('paths' in piece) return piece.paths;
  return 'rings' in piece ? piece.rings : null;
}

function withParts(piece: Piece, parts: LonLat[][]): Piece {
  if ('path' in piece) return { ...piece, path: parts[0]! };
  if ('paths' in piece) return { ...piece, paths: parts };
  return 'rings' in piece ? { ...piece, rings: parts } : piece;
}
