import { expect } from 'vitest';
import { applyEdit, EditError, type Edit } from '@/lib/edits';
import { findPiece, type Kind, type PieceOf, type Sheet } from '@/lib/layout';

/** What is wrong, the edit, the piece that the error names, and words of its message. */
export type Refusal = readonly [what: string, edit: Edit, pieceId: string | null, words: RegExp];

export function expectRefused(sheet: Sheet, [, edit, pieceId, words]: Refusal): void {
  const error = refusalOf(sheet, edit);
  expect(error).toBeInstanceOf(EditError);
  expect(error).toMatchObject({ pieceId, message: expect.stringMatching(words) as unknown });
}

function refusalOf(sheet: Sheet, edit: Edit): unknown {
  try {
    applyEdit(sheet, edit);
  } catch (error) {
    return error;
  }
  return null;
}

/** The piece, known to be of the kind. */
export function pieceOf<K extends Kind>(sheet: Sheet, id: string, kind: K): PieceOf<K> {
  const piece = findPiece(sheet, id);
  if (piece?.kind !== kind) throw new Error(`${id} is not a ${kind}`);
  return piece as PieceOf<K>;
}
