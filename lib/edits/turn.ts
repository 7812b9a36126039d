import { normaliseDegrees } from '../geo';
import { isUnit, type Sheet } from '../layout';
import { carry } from './carry';
import { KIND_WORDS } from './piece-words';
import { settledPiece } from './settled-piece';
import { requirePiece } from './sheet-pieces';
import { EditError, type EditOf } from './types';

/** Points a unit's front in a true direction; clamps and vents on it turn with it. */
export function turn(sheet: Sheet, { id, heading_deg }: EditOf<'turn'>): Sheet {
  const before = requirePiece(sheet, id);
  if (!isUnit(before))
    throw new EditError(`A ${KIND_WORDS[before.kind]} has no front to turn.`, id);
  const heading = normaliseDegrees(heading_deg);
  if (normaliseDegrees(before.heading_deg ?? 0) === heading) return sheet;
  const after = settledPiece(sheet.layout, { ...before, heading_deg: heading });
  return carry(sheet, [{ before, after }]);
}
