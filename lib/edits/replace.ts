import { isUnit, layoutSchema, siteGroundSchema, type Piece, type Sheet } from '../layout';
import { KIND_WORDS } from './piece-words';
import { checkReferences } from './references';
import { same } from './same';
import { EditError, type EditOf } from './types';

/**
 * Puts another sheet in place of this one. Positions stay as they came: an import or an older
 * version must read back as it was. A half that says the same keeps its identity.
 */
export function replace(sheet: Sheet, edit: EditOf<'replace'>): Sheet {
  const layout = same(edit.sheet.layout, sheet.layout)
    ? sheet.layout
    : parsed(layoutSchema.safeParse(edit.sheet.layout), 'layout');
  const site = same(edit.sheet.site, sheet.site)
    ? sheet.site
    : parsed(siteGroundSchema.safeParse(edit.sheet.site), 'site');
  if (layout === sheet.layout && site === sheet.site) return sheet;
  const next: Sheet = { layout, site };
  checkWhole(next);
  return next;
}

type Answer<T> =
  | { success: true; data: T }
  | { success: false; error: { issues: { path: PropertyKey[]; message: string }[] } };

function parsed<T>(answer: Answer<T>, what: string): T {
  if (answer.success) return answer.data;
  const faults = answer.error.issues.map((i) => `${[what, ...i.path].join('.')}: ${i.message}`);
  throw new EditError(faults.join('; '));
}

function checkWhole(sheet: Sheet): void {
  const ids = new Set<string>();
  const units = new Set<string>();
  const all: readonly Piece[] = [...sheet.layout.pieces, ...sheet.site.features];
  for (const piece of all) {
    if (ids.has(piece.id)) throw new EditError(`The id ${piece.id} is used twice.`, piece.id);
    ids.add(piece.id);
    if (!isUnit(piece)) continue;
    if (units.has(piece.kind)) {
      throw new EditError(
        `A layout has one ${KIND_WORDS[piece.kind]}; ${piece.id} is another.`,
        piece.id,
      );
    }
    units.add(piece.kind);
  }
  sheet.layout.pieces.forEach((piece) => checkReferences(sheet, piece));
}
