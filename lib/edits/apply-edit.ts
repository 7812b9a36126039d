import type { Sheet } from '../layout';
import { join } from './join';
import { move } from './move';
import { place } from './place';
import { remove } from './remove';
import { renumber } from './renumber';
import { replace } from './replace';
import { reshape } from './reshape';
import { setConditions } from './set-conditions';
import { setGround } from './set-ground';
import { setLayout } from './set-layout';
import { setPiece } from './set-piece';
import { together } from './together';
import { turn } from './turn';
import { EditError, type Edit } from './types';

/**
 * The sheet after the edit. The one given is never changed; what didn't change is shared with it,
 * and where nothing did it is returned itself. Throws EditError, and then nothing has happened.
 */
export function applyEdit(sheet: Sheet, edit: Edit): Sheet {
  switch (edit.type) {
    case 'place':
      return place(sheet, edit);
    case 'move':
      return move(sheet, edit);
    case 'reshape':
      return reshape(sheet, edit);
    case 'turn':
      return turn(sheet, edit);
    case 'remove':
      return remove(sheet, edit);
    case 'join':
      return join(sheet, edit);
    case 'set-piece':
      return setPiece(sheet, edit);
    case 'renumber':
      return renumber(sheet);
    case 'set-conditions':
      return setConditions(sheet, edit);
    case 'set-layout':
      return setLayout(sheet, edit);
    case 'set-ground':
      return setGround(sheet, edit);
    case 'together':
      return together(sheet, edit, applyEdit);
    case 'replace':
      return replace(sheet, edit);
    default:
      return unknownEdit(edit);
  }
}

/** Unreachable while the switch is whole; edits that came as JSON may still be of another kind. */
function unknownEdit(edit: never): never {
  throw new EditError(`There is no edit called ${String((edit as { type?: unknown }).type)}.`);
}
