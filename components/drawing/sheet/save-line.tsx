'use client';

import { redoLabel, undoLabel } from '@/lib/edits';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { useKeepSaved } from '../saving/keep-saved';
import type { SaveStatus } from '@/lib/client/saving/save-state';

const QUIET =
  'min-h-11 min-w-0 max-w-[16rem] shrink cursor-pointer truncate underline decoration-1 underline-offset-4 disabled:cursor-default disabled:no-underline disabled:text-ink-soft';

const LOUD: readonly SaveStatus[] = ['offline', 'failed', 'stale', 'signed-out'];

/** What undo would take back, and where the drawing is kept: the right of the top margin. */
export function SaveLine() {
  const store = useDrawingStore();
  const back = useDrawing((state) => undoLabel(state.history));
  const forth = useDrawing((state) => redoLabel(state.history));
  return (
    <div className="flex min-w-0 items-center gap-2.5">
      <button
        type="button"
        className={QUIET}
        disabled={back === null}
        onClick={() => store.getState().undo()}
      >
        {back === null ? 'Undo' : `Undo “${back}”`}
      </button>
      {forth !== null && (
        <button
          type="button"
          className={QUIET}
          title={`Redo “${forth}”`}
          aria-label={`Redo ${forth}`}
          onClick={() => store.getState().redo()}
        >
          Redo
        </button>
      )}
      <SaveWords />
    </div>
  );
}

/** Where the drawing is kept at this moment; loud where the server does not have it. */
export function SaveWords() {
  const save = useDrawing((state) => state.save);
  const { decide } = useKeepSaved();
  const loud = LOUD.includes(save.status);
  if (save.status === 'stale') {
    return (
      <button
        type="button"
        data-save="stale"
        className="min-h-9 cursor-pointer bg-ink px-2 text-left font-semibold leading-tight text-paper underline"
        onClick={decide}
      >
        {save.words}
      </button>
    );
  }
  return (
    <p
      role="status"
      data-save={save.status}
      title={save.words}
      className={`shrink-0 leading-tight ${loud ? 'max-w-[16rem] bg-ink px-2 py-0.5 font-semibold text-paper' : 'text-ink-soft'}`}
    >
      {save.words}
    </p>
  );
}
