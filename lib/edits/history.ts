import type { Sheet } from '../layout';
import { applyEdit } from './apply-edit';
import type { Edit } from './types';

/** One gesture: what it is called, and the sheet on its far side. */
export type Entry = {
  readonly label: string;
  readonly sheet: Sheet;
  /** Set while a gesture may go on, as an arrow key held down: its steps share one entry. */
  readonly gesture?: string;
};

/**
 * `past` holds the sheets before each gesture, oldest first; `future` those after each undone
 * one, next first. Sheets share what didn't change, so depth costs little and has no limit.
 */
export type History = {
  readonly past: readonly Entry[];
  readonly present: Sheet;
  readonly future: readonly Entry[];
};

export const newHistory = (present: Sheet): History => ({ past: [], present, future: [] });

/**
 * Applies one edit or several as one gesture. Where nothing changes the same history comes back
 * and what was undone can still be redone. Throws EditError and changes nothing at bad edits.
 */
export function commit(
  history: History,
  edits: Edit | readonly Edit[],
  label: string,
  gesture?: string,
): History {
  const list: readonly Edit[] = 'type' in edits ? [edits] : edits;
  const present = list.reduce(applyEdit, history.present);
  if (present === history.present) return history;
  const last = history.past.at(-1);
  if (gesture !== undefined && last?.gesture === gesture && history.future.length === 0) {
    return { past: history.past, present, future: [] };
  }
  const entry: Entry = {
    label,
    sheet: history.present,
    ...(gesture !== undefined && { gesture }),
  };
  return { past: [...history.past, entry], present, future: [] };
}

export function undo(history: History): History {
  const last = history.past.at(-1);
  if (!last) return history;
  return {
    past: history.past.slice(0, -1),
    present: last.sheet,
    future: [{ label: last.label, sheet: history.present }, ...history.future],
  };
}

export function redo(history: History): History {
  const next = history.future[0];
  if (!next) return history;
  return {
    past: [...history.past, { label: next.label, sheet: history.present }],
    present: next.sheet,
    future: history.future.slice(1),
  };
}

/** What undo would take back ("Move R2"); null when there is nothing. */
export const undoLabel = (history: History): string | null => history.past.at(-1)?.label ?? null;

/** What redo would do again; null when there is nothing. */
export const redoLabel = (history: History): string | null => history.future[0]?.label ?? null;
