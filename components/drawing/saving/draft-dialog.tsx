'use client';

import { Button } from '@/components/ui/button';
import type { Draft } from '@/lib/client/saving/draft-shelf';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { ChoiceDialog } from '../choice-dialog';
import { downloadSheet } from '../files/download';
import { momentWords } from '../moment-words';

/** An earlier visit ended before everything was saved: what becomes of those changes. */
export function DraftDialog({
  draft,
  onTakeUp,
  onLeave,
}: {
  draft: Draft;
  onTakeUp: () => void;
  onLeave: () => void;
}) {
  const store = useDrawingStore();
  const base = useDrawing((state) => state.base);
  const moved =
    (draft.changed.layout && draft.layoutVersion < base.layoutVersion) ||
    (draft.changed.site && draft.groundVersion < base.groundVersion);
  return (
    <ChoiceDialog
      title="This browser kept changes that were not saved"
      choices={
        <>
          <Button look="action" onClick={onTakeUp}>
            Go on with the kept changes
          </Button>
          <Button onClick={() => void downloadSheet(draft.sheet, store.getState().limits)}>
            Save them as a file
          </Button>
          <Button look="alarm" onClick={onLeave}>
            Discard them
          </Button>
        </>
      }
    >
      <p>
        They were drawn {momentWords(draft.at)} and did not reach the server. Going on with them can
        be undone.
      </p>
      {moved && (
        <p>
          Someone saved a newer version since. You will be asked which to keep; neither is lost.
        </p>
      )}
    </ChoiceDialog>
  );
}
