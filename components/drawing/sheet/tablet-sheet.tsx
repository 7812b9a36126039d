'use client';

import { FloatingTag, KitShelf, StripBelow } from './after-plan';
import { Complaint } from './complaint';
import { IndexTabs } from './index-tabs';
import { More } from './more';
import { PiecesSheet } from './pieces-sheet';
import { PlanFrame } from './plan-frame';
import { SaveLine } from './save-line';

/** The sheet on a tablet held upright: the strip lies below the plan, in two columns. */
export function TabletSheet() {
  return (
    <>
      <div className="p-2">
        <div className="border border-rule">
          <main aria-label="Plan">
            <div className="flex items-center justify-between gap-3 px-4 pt-1">
              <SaveLine />
              <More />
            </div>
            <div className="px-4">
              <IndexTabs />
            </div>
            <Complaint />
            <div className="h-[56dvh] min-h-96">
              <PlanFrame>
                <FloatingTag />
              </PlanFrame>
            </div>
            <KitShelf />
          </main>
          <aside
            aria-label="Conditions, checks and title"
            className="grid grid-cols-[minmax(0,1fr)_minmax(0,1fr)] border-t-2 border-ink"
          >
            <StripBelow />
          </aside>
        </div>
      </div>
      <PiecesSheet />
    </>
  );
}
