import type { Sheet } from '../../layout';
import { withAdded } from '../sheet-pieces';
import type { EditOf } from '../types';
import { companions } from './companions';
import type { Means, Wanted } from './wanted';
import { wantedPiece } from './wanted-piece';

/**
 * The edit that puts a piece on the plan with what belongs to it. The piece itself comes first.
 * All that is brought can be moved, changed or removed afterwards like anything else. Throws
 * EditError where a run names no two pieces that it can join.
 */
export function bring(sheet: Sheet, wanted: Wanted, means: Means): EditOf<'place'> {
  const piece = wantedPiece(sheet, wanted, means);
  const drawn = withAdded(sheet, [piece]);
  return { type: 'place', pieces: [piece, ...companions(drawn, piece, means)] };
}
