'use client';

import { useState } from 'react';
import { FIELD_CAUTION_WORDS } from '@/components/ui/caution';
import { undoLabel } from '@/lib/edits';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { useScreen } from '../screen-store';
import { PhonePanel, WindChip } from './after-plan';
import { Complaint } from './complaint';
import { More } from './more';
import { PlanFrame } from './plan-frame';
import { SaveWords } from './save-line';

const PANELS = ['Checks', 'Place', 'Wind', 'Pieces', 'Title'] as const;
export type Panel = (typeof PANELS)[number];

/** The sheet on a phone: plan on top, one panel below it, one thing at a time. */
export function PhoneSheet() {
  const store = useDrawingStore();
  const [panel, setPanel] = useState<Panel>('Checks');
  const selection = useDrawing((state) => state.selection);
  const back = useDrawing((state) => undoLabel(state.history));
  const name = useDrawing((state) => state.sheet.layout.name);
  const tagOpen = useScreen((state) => state.tagOpen);
  const shownPiece = tagOpen ? selection : null;

  const show = (next: Panel): void => {
    setPanel(next);
    store.getState().select(null);
  };

  return (
    <div className="flex h-dvh min-h-[36rem] flex-col">
      <header className="flex items-center justify-between gap-2 px-3">
        <div className="min-w-0 leading-tight">
          <p className="truncate text-lg font-bold">{name ?? 'Not named yet'}, draft</p>
          <SaveWords />
        </div>
        <div className="flex shrink-0 items-center gap-2">
          <button
            type="button"
            className="min-h-11 cursor-pointer px-1 underline underline-offset-4 disabled:text-ink-soft disabled:no-underline"
            disabled={back === null}
            aria-label={back === null ? 'Nothing to undo' : `Undo ${back}`}
            onClick={() => store.getState().undo()}
          >
            Undo
          </button>
          <More />
        </div>
      </header>
      <Complaint />
      <main aria-label="Plan" className="min-h-[40dvh] grow">
        <PlanFrame slim>
          <div className="absolute right-0 top-0 z-[460]">
            <WindChip />
          </div>
        </PlanFrame>
      </main>
      <div className="flex max-h-[46dvh] min-h-[34dvh] flex-col">
        <div role="group" aria-label="Panel" className="grid grid-cols-5 border-y border-ink">
          {PANELS.map((one) => (
            <button
              key={one}
              type="button"
              aria-pressed={panel === one && shownPiece === null}
              className="min-h-11 cursor-pointer border-r border-ink px-1 last:border-r-0 aria-pressed:bg-ink aria-pressed:font-bold aria-pressed:text-paper"
              onClick={() => show(one)}
            >
              {one}
            </button>
          ))}
        </div>
        <div className="min-h-0 grow overflow-y-auto overscroll-contain">
          <PhonePanel panel={panel} piece={shownPiece} />
          <p className="px-3 pb-2 pt-1 text-sm font-semibold text-alarm">{FIELD_CAUTION_WORDS}</p>
        </div>
      </div>
    </div>
  );
}
