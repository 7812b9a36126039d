import type { LonLat } from '../../geo';
import { isUnit, planeOf, type Piece, type PieceOf, type Run, type Sheet } from '../../layout';
import { KIND_WORDS, pieceWords } from '../piece-words';
import { mayJoin } from '../references';
import { EditError } from '../types';
import { edgeOfUnit } from '../unit-frame';

type Between<K extends Run['kind']> = {
  readonly id: string;
  readonly kind: K;
  /** Either order; the run is laid the way its kind runs. */
  readonly ends: readonly [Piece, Piece];
  /** Where the ends were put or what they look towards, in the order of `ends`. */
  readonly towards?: readonly [LonLat, LonLat];
  readonly via?: readonly LonLat[];
};

/** A run from one piece to another. Throws where its kind can't join them. */
export function runBetween<K extends Run['kind']>(sheet: Sheet, wanted: Between<K>): PieceOf<K> {
  const { id, kind, ends, towards, via = [] } = wanted;
  const [one, other] = ends;
  const straight = mayJoin(kind, 'from', one) && mayJoin(kind, 'to', other);
  if (!straight && !(mayJoin(kind, 'from', other) && mayJoin(kind, 'to', one))) {
    throw new EditError(
      `A ${KIND_WORDS[kind]} can't join ${pieceWords(one)} to ${pieceWords(other)}. Choose other ends.`,
      one.id,
    );
  }
  const path = [
    facing(sheet, one, towards?.[0] ?? via[0] ?? placeOfEnd(other)),
    ...via,
    facing(sheet, other, towards?.[1] ?? via.at(-1) ?? placeOfEnd(one)),
  ];
  const run = straight
    ? { id, kind, from: one.id, to: other.id, path }
    : { id, kind, from: other.id, to: one.id, path: path.toReversed() };
  return run as unknown as PieceOf<K>;
}

/** The place on a piece that looks towards another: a unit's nearest edge, else the piece itself. */
const facing = (sheet: Sheet, piece: Piece, towards: LonLat): LonLat =>
  isUnit(piece) ? edgeOfUnit(planeOf(sheet.layout), piece, towards) : placeOfEnd(piece);

function placeOfEnd(piece: Piece): LonLat {
  if ('at' in piece) return piece.at;
  throw new EditError(`Nothing can be joined to ${pieceWords(piece)}.`, piece.id);
}
