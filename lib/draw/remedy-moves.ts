import type { Edit, EditOf } from '../edits';

/** Every piece that the edit moves, and where to. */
export function movesOf(edit: Edit): EditOf<'move'>['moves'] {
  if (edit.type === 'move') return edit.moves;
  return edit.type === 'together' ? edit.edits.flatMap(movesOf) : [];
}
