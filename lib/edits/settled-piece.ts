import { quantise } from '../geo';
import {
  FARTHEST_MILES,
  isKind,
  milesAway,
  pieceSchema,
  planeOf,
  type Layout,
  type Piece,
} from '../layout';
import { KIND_WORDS, pieceWords } from './piece-words';
import { EditError } from './types';

/**
 * The piece as the sheet keeps it: positions quantised, members that were not entered left out.
 * Throws where its kind has no such member or a value is not allowed.
 */
export function settledPiece(layout: Layout, piece: Piece): Piece {
  if (!isKind(piece.kind)) {
    throw new EditError(`There is no kind of piece called ${String(piece.kind)}.`, piece.id);
  }
  const schema = pieceSchema(piece.kind);
  const settled: Record<string, unknown> = {};
  for (const [name, value] of Object.entries(piece)) {
    if (value === undefined) continue;
    if (!(name in schema.shape)) {
      throw new EditError(`A ${KIND_WORDS[piece.kind]} has no ${name}.`, piece.id);
    }
    settled[name] = PLACE_KEYS.has(name) ? quantised(value) : value;
  }
  const answer = schema.safeParse(settled);
  if (!answer.success) {
    const faults = new Set(answer.error.issues.map((issue) => issue.message));
    throw new EditError(`${pieceWords(piece)}: ${[...faults].join('; ')}.`, piece.id);
  }
  checkWithinReach(layout, answer.data);
  return answer.data;
}

function checkWithinReach(layout: Layout, piece: Piece): void {
  if (milesAway(planeOf(layout), piece) <= FARTHEST_MILES) return;
  throw new EditError(
    `${pieceWords(piece)} would lie more than ${FARTHEST_MILES} miles from the middle of the drawing.`,
    piece.id,
  );
}

const PLACE_KEYS = new Set(['at', 'path', 'paths', 'rings']);

/** Quantises a position or lists of them; what is neither is left for the schema to refuse. */
function quantised(value: unknown): unknown {
  if (!Array.isArray(value)) return value;
  if (typeof value[0] !== 'number') return value.map(quantised);
  if (typeof value[1] !== 'number') return value;
  const [lon, lat, ...height] = value as [number, number, ...unknown[]];
  return [...quantise([lon, lat]), ...height];
}
