import { distance, METRES_PER_MILE, quantise, type LonLat, type Vec } from '../geo';
import {
  isKind,
  isSiteKind,
  pieceSchema,
  placesOf,
  planeOf,
  positionsOf,
  type Layout,
  type Piece,
} from '../layout';
import { KIND_WORDS, pieceWords } from './piece-words';
import { EditError } from './types';

/** Farther from the origin a place is a slip, and the exchange file refuses it. */
const FARTHEST_MILES = 5;

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
  const plane = planeOf(layout);
  const positions = positionsOf(piece);
  const away = placesOf(plane, piece)
    .flat()
    .map((place, i) =>
      // Beyond the horizon the plane folds back on itself, and only the way back tells.
      near(plane.toLonLat(place), positions[i]!) ? distance(place, ORIGIN) : Infinity,
    );
  // A line of the site may come from far away; a piece of the layout may not.
  const reach = isSiteKind(piece.kind) ? Math.min(...away) : Math.max(...away);
  if (reach <= FARTHEST_MILES * METRES_PER_MILE) return;
  throw new EditError(
    `${pieceWords(piece)} would lie more than ${FARTHEST_MILES} miles from the middle of the drawing.`,
    piece.id,
  );
}

const ORIGIN: Vec = { x: 0, y: 0 };
const near = (a: LonLat, b: LonLat): boolean =>
  Math.abs(a[1] - b[1]) < 1e-6 && Math.abs(((a[0] - b[0] + 540) % 360) - 180) < 1e-6;

const PLACE_KEYS = new Set(['at', 'path', 'paths', 'rings']);

/** Quantises a position or lists of them; what is neither is left for the schema to refuse. */
function quantised(value: unknown): unknown {
  if (!Array.isArray(value)) return value;
  if (typeof value[0] !== 'number') return value.map(quantised);
  if (typeof value[1] !== 'number') return value;
  const [lon, lat, ...height] = value as [number, number, ...unknown[]];
  return [...quantise([lon, lat]), ...height];
}
