import { anchorOf, type Edit } from '../edits';
import { feetToMetres, normaliseDegrees } from '../geo';
import { findPiece, isRun, isUnit, planeOf, type Sheet } from '../layout';

/** Feet that an arrow key moves a piece, and with Shift held. */
const STEP_FT = { coarse: 1, fine: 0.1 } as const;
/** Degrees that a bracket key turns a unit, and with Shift held. */
const TURN_DEG = { coarse: 5, fine: 1 } as const;

const ARROW_BEARING_DEG: Readonly<Record<string, number>> = {
  ArrowUp: 0,
  ArrowRight: 90,
  ArrowDown: 180,
  ArrowLeft: 270,
};

export type Pace = keyof typeof STEP_FT;

/** One step of a piece in a true direction; null for what lies between other pieces. */
export function stepEdit(sheet: Sheet, id: string, bearingDeg: number, pace: Pace): Edit | null {
  const piece = findPiece(sheet, id);
  if (!piece || isRun(piece)) return null;
  const plane = planeOf(sheet.layout);
  const from = plane.toPlane(anchorOf(piece));
  const to = plane.toLonLat(plane.offset(from, bearingDeg, feetToMetres(STEP_FT[pace])));
  return { type: 'move', moves: [{ id, to }] };
}

/** One turn of a unit, clockwise for `sense` 1; null for what has no front. */
export function turnEdit(sheet: Sheet, id: string, sense: 1 | -1, pace: Pace): Edit | null {
  const piece = findPiece(sheet, id);
  if (!piece || !isUnit(piece)) return null;
  const heading = (piece.heading_deg ?? 0) + sense * TURN_DEG[pace];
  return { type: 'turn', id, heading_deg: normaliseDegrees(heading) };
}

/** What a key does to the piece that has the focus; null for a key that is none of ours. */
export function editForKey(sheet: Sheet, id: string, key: string, fine: boolean): Edit | null {
  const pace: Pace = fine ? 'fine' : 'coarse';
  const bearing = ARROW_BEARING_DEG[key];
  if (bearing !== undefined) return stepEdit(sheet, id, bearing, pace);
  if (key === ']' || key === '}') return turnEdit(sheet, id, 1, pace);
  if (key === '[' || key === '{') return turnEdit(sheet, id, -1, pace);
  if (key === 'Delete' || key === 'Backspace') return { type: 'remove', ids: [id] };
  return null;
}
