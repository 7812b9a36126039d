'use client';

import { ChecksPanel } from '@/components/checks/checks-panel';
import { ConditionsPanel } from '@/components/conditions';
import { KitShelf } from '@/components/kit';
import { TitleBlock } from '@/components/title-block';
import { useView } from '../map/view-store';
import { IndexTabs } from './index-tabs';
import { PlanFrame } from './plan-frame';
import { SaveLine } from './save-line';

/** The sheet on a desk: plan in its ruled frame, strip at the right, kit in the bottom margin. */
export function DrawingSheet() {
  return (
    <div className="h-dvh p-2">
      <div className="grid h-full grid-cols-[minmax(0,1fr)_25rem] border border-rule">
        <div className="flex min-w-0 flex-col">
          <div className="flex min-w-0 items-end justify-between gap-4 pl-8 pt-1.5">
            <IndexTabs />
            <SaveLine />
          </div>
          <main className="min-h-0 grow" aria-label="Plan">
            <PlanFrame />
          </main>
          <KitShelf />
        </div>
        <aside className="flex min-h-0 flex-col border-l-2 border-ink">
          <ConditionsPanel />
          <div className="flex min-h-0 grow flex-col border-t border-ink">
            <ChecksPanel />
          </div>
          <ScaledTitleBlock />
        </aside>
      </div>
    </div>
  );
}

function ScaledTitleBlock() {
  const metresPerPx = useView((state) => state.atRest?.metresPerPx ?? null);
  return <TitleBlock metresPerPx={metresPerPx} />;
}
