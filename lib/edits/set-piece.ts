import { isUnit, pieceSchema, unitSizeFt, type Piece, type Sheet, type Unit } from '../layout';
import { carry } from './carry';
import { nextRodLabel, isSystemLabel } from './labels';
import { KIND_WORDS } from './piece-words';
import { checkReferences } from './references';
import { same } from './same';
import { settledPiece } from './settled-piece';
import { requirePiece, withPieces } from './sheet-pieces';
import { EditError, type EditOf } from './types';
import type { Standing } from './unit-frame';

/** What a piece is and where it lies have edits of their own. */
const NOT_HERE = new Set(['id', 'kind', 'at', 'path', 'paths', 'rings', 'from', 'to', 'more']);

/**
 * Sets members of a piece; null makes one "not entered". A unit that changes size keeps its
 * clamps in proportion. A rod led to another system under its old system's label gets a new one,
 * so that no sheet shows a C2 among the R rods.
 */
export function setPiece(sheet: Sheet, { id, members }: EditOf<'set-piece'>): Sheet {
  const before = requirePiece(sheet, id);
  const draft: Record<string, unknown> = { ...before };
  for (const [name, value] of Object.entries(members)) {
    if (NOT_HERE.has(name) || !(name in pieceSchema(before.kind).shape)) {
      throw new EditError(`The ${name} of a ${KIND_WORDS[before.kind]} can't be set.`, id);
    }
    if (value === null || value === undefined) delete draft[name];
    else draft[name] = value;
  }
  if (same(draft, before)) return sheet;
  const after = relabelled(sheet, before, settledPiece(sheet.layout, draft as Piece), members);
  checkReferences(sheet, after);
  if (isUnit(before) && isUnit(after)) {
    return carry(sheet, [{ before, after, stretch: stretchBetween(before, after) }]);
  }
  return withPieces(sheet, new Map([[id, after]]));
}

function stretchBetween(before: Unit, after: Unit): (standing: Standing) => Standing {
  const [old, now] = [unitSizeFt(before), unitSizeFt(after)];
  return ({ ahead, right }) => ({
    ahead: (ahead * now.length) / old.length,
    right: (right * now.width) / old.width,
  });
}

function relabelled(
  sheet: Sheet,
  before: Piece,
  after: Piece,
  members: EditOf<'set-piece'>['members'],
): Piece {
  if (before.kind !== 'rod' || after.kind !== 'rod' || before.system === after.system) return after;
  if ('label' in members || !isSystemLabel(before.label, before.system)) return after;
  return { ...after, label: nextRodLabel(sheet.layout, after.system) };
}
