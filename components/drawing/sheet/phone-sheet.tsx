'use client';

import dynamic from 'next/dynamic';
import { useState } from 'react';
import { FIELD_CAUTION_WORDS } from '@/components/ui/caution';
import { CheckStepper, ChecksPanel } from '@/components/checks';
import { ConditionsPanel, WindChip } from '@/components/conditions';
import { KitShelf } from '@/components/kit';
import { undoLabel } from '@/lib/edits';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { useScreen } from '../screen-store';
import { StakeTag } from '../tag/stake-tag';
import { Complaint } from './complaint';
import { IndexTabs } from './index-tabs';
import { More } from './more';
import { PlanFrame } from './plan-frame';
import { SaveWords } from './save-line';
import { ScaledTitleBlock } from './scaled-title-block';

const PiecesTable = dynamic(() => import('@/components/pieces').then((m) => m.PiecesTable), {
  ssr: false,
  loading: () => <p>Listing the pieces …</p>,
});

const PANELS = ['Checks', 'Place', 'Wind', 'Pieces', 'Title'] as const;
type Panel = (typeof PANELS)[number];

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
          {shownPiece !== null ? (
            <div className="space-y-3 px-3 py-2">
              <StakeTag key={shownPiece} id={shownPiece} roomy />
              <CheckStepper pieceId={shownPiece} />
            </div>
          ) : (
            <PanelOf panel={panel} />
          )}
          <p className="px-3 pb-2 pt-1 text-sm font-semibold text-alarm">{FIELD_CAUTION_WORDS}</p>
        </div>
      </div>
    </div>
  );
}

function PanelOf({ panel }: { panel: Panel }) {
  switch (panel) {
    case 'Checks':
      return (
        <>
          <div className="border-b border-ink px-3 py-2">
            <CheckStepper />
          </div>
          <ChecksPanel />
        </>
      );
    case 'Place':
      return <KitShelf />;
    case 'Wind':
      return <ConditionsPanel />;
    case 'Pieces':
      return (
        <div id="pieces" className="px-3 py-2">
          <PiecesTable />
        </div>
      );
    case 'Title':
      return (
        <>
          <ScaledTitleBlock />
          <div className="px-3 py-2">
            <IndexTabs />
          </div>
        </>
      );
  }
}
