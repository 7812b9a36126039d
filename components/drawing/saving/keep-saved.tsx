'use client';

import dynamic from 'next/dynamic';
import { createContext, useContext, useState, type ReactNode } from 'react';
import { useSaving } from './use-saving';

// Asked for seldom: their code comes only when there is something to ask.
const DraftDialog = dynamic(() => import('./draft-dialog').then((m) => m.DraftDialog));
const StaleDialog = dynamic(() => import('./stale-dialog').then((m) => m.StaleDialog));

const DecideContext = createContext<() => void>(() => {});

/** Asks again which of two versions to keep, after "Decide later". */
export const useDecide = (): (() => void) => useContext(DecideContext);

/** Keeps the drawing saved, and asks where only a person can say what to keep. */
export function KeepSaved({ children }: { children: ReactNode }) {
  const saving = useSaving();
  const [putOff, setPutOff] = useState<unknown>(null);
  return (
    <DecideContext value={() => setPutOff(null)}>
      {children}
      {saving.draft && (
        <DraftDialog draft={saving.draft} onTakeUp={saving.takeUp} onLeave={saving.leave} />
      )}
      {saving.stale && putOff !== saving.stale && (
        <StaleDialog
          stale={saving.stale}
          onKeepMine={saving.keepMine}
          onTakeTheirs={saving.takeTheirs}
          onLater={() => setPutOff(saving.stale)}
        />
      )}
    </DecideContext>
  );
}
