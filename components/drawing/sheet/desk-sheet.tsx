'use client';

import { FloatingTag, KitShelf, Strip } from './after-plan';
import { Complaint } from './complaint';
import { IndexTabs } from './index-tabs';
import { More } from './more';
import { PiecesSheet } from './pieces-sheet';
import { PlanFrame } from './plan-frame';
import { SaveLine } from './save-line';

/** The sheet on a desk: plan in its ruled frame, strip at the right, kit in the bottom margin. */
export function DeskSheet() {
  return (
    <>
      <div className="h-dvh min-h-[38rem] p-2">
        <div className="grid h-full grid-cols-[minmax(0,1fr)_24.5rem] border border-rule">
          <main className="flex min-h-0 min-w-0 flex-col" aria-label="Plan">
            <div className="flex min-w-0 items-end justify-between gap-x-3 pl-8 pr-4 pt-1.5 max-xl:flex-col-reverse max-xl:items-stretch">
              <IndexTabs />
              <div className="flex min-w-0 items-center justify-end gap-2.5">
                <SaveLine />
                <More />
              </div>
            </div>
            <Complaint />
            <div className="min-h-0 grow">
              <PlanFrame>
                <FloatingTag />
              </PlanFrame>
            </div>
            <KitShelf />
          </main>
          <aside
            aria-label="Conditions, checks and title"
            className="flex min-h-0 flex-col overflow-y-auto border-l-2 border-ink"
          >
            <Strip />
          </aside>
        </div>
      </div>
      <PiecesSheet />
    </>
  );
}
