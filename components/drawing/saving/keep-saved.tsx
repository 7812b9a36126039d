'use client';

import dynamic from 'next/dynamic';
import { createContext, useContext, useState, type ReactNode } from 'react';
import { keepTrying } from '../keep-trying';
import { useSaving } from './use-saving';

// Asked for seldom: their code comes only when there is something to ask.
const DraftDialog = dynamic(() =>
  keepTrying(() => import('./draft-dialog').then((m) => m.DraftDialog)),
);
const StaleDialog = dynamic(() =>
  keepTrying(() => import('./stale-dialog').then((m) => m.StaleDialog)),
);

type Asks = {
  /** Asks again which of two versions to keep, after "Decide later". */
  readonly decide: () => void;
  /** Sends what is not saved; done when the server has answered. */
  readonly saveNow: () => Promise<void>;
};

const AsksContext = createContext<Asks>({ decide: () => {}, saveNow: async () => {} });

export const useKeepSaved = (): Asks => useContext(AsksContext);

/** Keeps the drawing saved, and asks where only a person can say what to keep. */
export function KeepSaved({ children }: { children: ReactNode }) {
  const saving = useSaving();
  const [putOff, setPutOff] = useState<unknown>(null);
  return (
    <AsksContext value={{ decide: () => setPutOff(null), saveNow: saving.saveNow }}>
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
    </AsksContext>
  );
}
