'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Problems } from '@/components/ui/problems';
import { createLayout, Problem } from '@/lib/client/api';
import type { DrawingState } from '@/lib/client/drawing-store';
import type { Stale } from '@/lib/client/saving/sending';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { ChoiceDialog } from '../choice-dialog';
import { downloadSheet } from '../files/download';
import { momentWords } from '../moment-words';

/** Somebody saved in between: both versions are kept, and a person says which goes on. */
export function StaleDialog({
  stale,
  onKeepMine,
  onTakeTheirs,
  onLater,
}: {
  stale: Stale;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
  onLater: () => void;
}) {
  const store = useDrawingStore();
  const me = useDrawing((state) => state.meta.me);
  const [problem, setProblem] = useState<Problem | null>(null);
  const [busy, setBusy] = useState(false);
  const { what, theirs } = stale;
  const thing = what === 'layout' ? 'layout' : 'site’s ground';
  const by =
    theirs.saved_by === null
      ? 'Someone'
      : theirs.saved_by.id === me.id
        ? 'You, in another window,'
        : theirs.saved_by.name;

  const download = (): void => {
    const { history, limits } = store.getState();
    void downloadSheet(history.present, limits);
  };

  const takeTheirs = async (): Promise<void> => {
    setBusy(true);
    setProblem(null);
    try {
      if (what === 'layout') await keepAsLayout(store.getState());
      else download();
      onTakeTheirs();
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      setProblem(error);
    } finally {
      setBusy(false);
    }
  };

  return (
    <ChoiceDialog
      title={`${by} saved this ${thing} while you were drawing`}
      choices={
        <>
          <Button look="action" disabled={busy} onClick={onKeepMine}>
            Keep mine, theirs stays in the history
          </Button>
          <Button disabled={busy} onClick={() => void takeTheirs()}>
            {what === 'layout'
              ? 'Take theirs, keep mine as a layout beside it'
              : 'Take theirs, save mine as a file'}
          </Button>
          <Button look="quiet" onClick={download}>
            Save mine as a file
          </Button>
          <Button look="quiet" onClick={onLater}>
            Decide later
          </Button>
        </>
      }
    >
      <p>
        Theirs is version {theirs.version}, saved {momentWords(theirs.saved_at)}. Yours is kept in
        this browser and not saved until you choose. Neither is lost either way.
      </p>
      {problem && <Problems problem={problem} title="Yours could not be kept beside it" />}
    </ChoiceDialog>
  );
}

/** Mine becomes a layout of its own at the same site, before theirs takes its place here. */
async function keepAsLayout({ history, limits, meta }: DrawingState): Promise<void> {
  const { writeExchange } = await import('@/lib/layout/exchange');
  const { present } = history;
  const name = `${present.layout.name ?? 'Layout'}, kept copy of ${meta.me.name}`.slice(0, 200);
  const sheet = { ...present, layout: { ...present.layout, name } };
  await createLayout(meta.siteId, { name, from: { file: writeExchange({ sheet, limits }) } });
}
