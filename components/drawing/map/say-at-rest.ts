import type { DrawingStore } from '@/lib/client/drawing-store';
import type { Step } from '@/lib/client/tools';
import type { Edit } from '@/lib/edits';
import { findPiece } from '@/lib/layout';
import { pieceSentence, worstFinding } from '../piece-words';

/** A key held down or pressed again within this is not yet at rest. */
const REST_MS = 700;

let waiting: ReturnType<typeof setTimeout> | undefined;

/** Announces what a change came to, once the hand rests: "R2, rod, not met: 7.3 ft from R1". */
export function sayAtRest(store: DrawingStore, step: Step): void {
  clearTimeout(waiting);
  const say = (): void => {
    const { sheet, findings, announce } = store.getState();
    const id = step.edits?.map(changedPiece).find((changed) => changed !== null);
    const piece = id ? findPiece(sheet, id) : null;
    const came = piece && pieceSentence(sheet, piece, worstFinding(findings, piece.id));
    announce([step.announce ?? step.label, came].filter(Boolean).join('. '));
  };
  if (step.gesture === undefined) say();
  else waiting = setTimeout(say, REST_MS);
}

function changedPiece(edit: Edit): string | null {
  switch (edit.type) {
    case 'move':
      return edit.moves[0]?.id ?? null;
    case 'place':
      return edit.pieces[0]?.id ?? null;
    case 'turn':
    case 'reshape':
    case 'join':
    case 'set-piece':
      return edit.id;
    default:
      return null;
  }
}
