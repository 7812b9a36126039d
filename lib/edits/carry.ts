import { distance, feetToMetres, samePosition, type LocalPlane, type LonLat } from '../geo';
import {
  isRun,
  isUnit,
  planeOf,
  type Piece,
  type PieceOf,
  type Run,
  type Sheet,
  type Unit,
} from '../layout';
import { shiftBetween, shifted } from './shifted';
import { withPieces } from './sheet-pieces';
import { placeOn, standingOn, standsOn, type Standing } from './unit-frame';

/** Ends that moved alike within this much moved as one, and the run's bends go along. */
const ALIKE_METRES = feetToMetres(0.01);

export type Shift = {
  readonly before: Piece;
  readonly after: Piece;
  /** How places on a unit spread when it changes size; not given: they stay where they stood. */
  readonly stretch?: (standing: Standing) => Standing;
};

type Shifts = ReadonlyMap<string, Shift>;

/**
 * Puts the shifted pieces on the sheet and brings along what belongs to them: run ends joined to
 * them, and with a unit its vents and any release point or vent that stands on its footprint.
 * Pools and zones are ground, not cargo: they stay where they were drawn.
 */
export function carry(sheet: Sheet, shifts: readonly Shift[]): Sheet {
  const plane = planeOf(sheet.layout);
  const byId: Shifts = new Map(shifts.map((shift) => [shift.before.id, shift]));
  const changed = new Map<string, Piece>(shifts.map(({ after }) => [after.id, after]));
  for (const piece of sheet.layout.pieces) {
    if (byId.has(piece.id)) continue;
    if (piece.kind === 'release-point' || piece.kind === 'vent') {
      const unit = carrierOf(sheet, plane, piece);
      const shift = unit && byId.get(unit.id);
      if (shift) changed.set(piece.id, { ...piece, at: along(plane, shift, piece.at) });
    } else if (isRun(piece)) {
      const run = followed(plane, piece, byId);
      if (run !== piece) changed.set(piece.id, run);
    }
  }
  return withPieces(sheet, changed);
}

/** The unit that has it: the one it names, else the first drawn of those it stands on. */
function carrierOf(
  sheet: Sheet,
  plane: LocalPlane,
  piece: PieceOf<'release-point' | 'vent'>,
): Unit | null {
  const units = sheet.layout.pieces.filter(isUnit);
  const found =
    piece.kind === 'vent' && piece.of !== undefined
      ? units.find((unit) => unit.id === piece.of)
      : units.find((unit) => standsOn(plane, unit, piece.at));
  return found ?? null;
}

/** Where a place at the shifted piece goes. */
function along(plane: LocalPlane, { before, after, stretch }: Shift, place: LonLat): LonLat {
  if (isUnit(before) && isUnit(after)) {
    const standing = standingOn(plane, before, place);
    return placeOn(plane, after, stretch ? stretch(standing) : standing);
  }
  return 'at' in after ? after.at : place;
}

function followed(plane: LocalPlane, run: Run, shifts: Shifts): Run {
  const [from, to] = [shifts.get(run.from), shifts.get(run.to)];
  const [first, last] = [run.path[0]!, run.path.at(-1)!];
  const start = from ? along(plane, from, first) : first;
  const end = to ? along(plane, to, last) : last;
  if (samePosition(start, first) && samePosition(end, last)) return run;
  const [startShift, endShift] = [
    shiftBetween(plane, first, start),
    shiftBetween(plane, last, end),
  ];
  const asOne = distance(startShift, endShift) <= ALIKE_METRES;
  const bends = run.path.slice(1, -1);
  return {
    ...run,
    path: [start, ...(asOne ? bends.map((p) => shifted(plane, p, startShift)) : bends), end],
  };
}
