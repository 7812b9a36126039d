import type { Sheet } from '../layout';
import type { Edit, EditOf } from './types';

/** Applies edits one after another; an EditError in any of them leaves the sheet as it was. */
export const together = (
  sheet: Sheet,
  { edits }: EditOf<'together'>,
  apply: (sheet: Sheet, edit: Edit) => Sheet,
): Sheet => edits.reduce(apply, sheet);
