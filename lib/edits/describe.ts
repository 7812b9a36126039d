import { findPiece, isRun, type Sheet } from '../layout';
import { KIND_WORDS, pieceWords } from './piece-words';
import type { Edit, EditOf } from './types';

/**
 * What a gesture is called in the history: "Move R2", "Place rod C2", "Set wind". `sheet` is the
 * sheet before the edit, where what is to be removed still has a name.
 */
export function describe(sheet: Sheet, edit: Edit): string {
  switch (edit.type) {
    case 'place':
      return describePlace(edit);
    case 'move':
      return `Move ${several(
        sheet,
        edit.moves.map((m) => m.id),
      )}`;
    case 'reshape':
      return describeReshape(sheet, edit);
    case 'turn':
      return `Turn ${called(sheet, edit.id)}`;
    case 'remove':
      return `Remove ${several(sheet, edit.ids)}`;
    case 'join':
      return `Join ${called(sheet, edit.id)} to ${called(sheet, edit.piece)}`;
    case 'set-piece':
      return `Change ${called(sheet, edit.id)}`;
    case 'renumber':
      return 'Renumber rods';
    case 'set-conditions':
      return `Set ${listed(Object.keys(edit.conditions))}`;
    case 'set-layout':
      return `Set ${listed(Object.keys(edit.members).map((name) => MEMBER_WORDS[name] ?? name))}`;
    case 'set-ground':
      return describeGround(edit);
    case 'together':
      return describeTogether(sheet, edit);
    case 'replace':
      return 'Put another layout in its place';
  }
}

const MEMBER_WORDS: Record<string, string> = { planned_at: 'planned time' };

function describePlace({ pieces }: EditOf<'place'>): string {
  const main = pieces.find((piece) => !isRun(piece)) ?? pieces[0];
  if (!main) return 'Place nothing';
  return main.label ? `Place ${KIND_WORDS[main.kind]} ${main.label}` : `Place ${pieceWords(main)}`;
}

function describeReshape(sheet: Sheet, { id, to, insert }: EditOf<'reshape'>): string {
  const name = called(sheet, id);
  if (to === null) return `Take a corner out of ${name}`;
  return insert ? `Add a corner to ${name}` : `Reshape ${name}`;
}

function describeGround(edit: EditOf<'set-ground'>): string {
  const parts = [
    edit.answers && `owner's answer for ${listed(Object.keys(edit.answers))}`,
    edit.locates && 'locate tickets',
    edit.overhead_none_known_as_of !== undefined && 'overhead lines',
  ].filter((part) => typeof part === 'string');
  return `Record ${listed(parts)}`;
}

function describeTogether(sheet: Sheet, { edits }: EditOf<'together'>): string {
  const labels = [...new Set(edits.map((edit) => describe(sheet, edit)))];
  const [first = 'Change nothing', ...more] = labels;
  return more.length === 0 ? first : `${first} and ${more.length} more`;
}

const called = (sheet: Sheet, id: string): string => {
  const piece = findPiece(sheet, id);
  return piece ? pieceWords(piece) : id;
};

const several = (sheet: Sheet, ids: readonly string[]): string =>
  ids.length === 1 ? called(sheet, ids[0]!) : `${ids.length} pieces`;

const listed = (words: readonly string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;
