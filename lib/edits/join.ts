import { quantise, type LonLat } from '../geo';
import { isRun, isUnit, planeOf, type Piece, type Run, type Sheet } from '../layout';
import { KIND_WORDS } from './piece-words';
import { checkReferences, type End } from './references';
import { requirePiece, withPieces } from './sheet-pieces';
import { EditError, type EditOf } from './types';
import { edgeOfUnit } from './unit-frame';

/** Leads one end of a run to another piece; on a unit it lands on the edge nearest the run. */
export function join(sheet: Sheet, { id, end, piece }: EditOf<'join'>): Sheet {
  const run = requirePiece(sheet, id);
  if (!isRun(run))
    throw new EditError(`A ${KIND_WORDS[run.kind]} joins nothing, so it has no ends to lead.`, id);
  const target = requirePiece(sheet, piece);
  if (run[end] === piece) return sheet;
  const joined: Run = { ...run, [end]: piece, path: ledTo(sheet, run, end, target) };
  checkReferences(sheet, joined);
  return withPieces(sheet, new Map([[id, joined]]));
}

function ledTo(sheet: Sheet, run: Run, end: End, target: Piece): LonLat[] {
  if (!('at' in target)) return run.path;
  const neighbour = end === 'from' ? run.path[1]! : run.path.at(-2)!;
  const place = isUnit(target)
    ? edgeOfUnit(planeOf(sheet.layout), target, neighbour)
    : quantise(target.at);
  return end === 'from' ? [place, ...run.path.slice(1)] : [...run.path.slice(0, -1), place];
}
