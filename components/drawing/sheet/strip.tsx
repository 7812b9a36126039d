'use client';

import { ChecksPanel } from '@/components/checks/checks-panel';
import { ConditionsPanel } from '@/components/conditions';
import { ScaledTitleBlock } from './scaled-title-block';

/** The right strip of an engineering sheet: conditions, checks, title block, top to bottom. */
export function Strip() {
  return (
    <>
      <ConditionsPanel />
      <div className="flex min-h-60 shrink grow basis-60 flex-col border-t border-ink">
        <ChecksPanel />
      </div>
      <ScaledTitleBlock />
    </>
  );
}

/** The same below a tablet's plan, in two columns. */
export function StripBelow() {
  return (
    <>
      <div className="border-r border-ink">
        <ConditionsPanel />
        <ScaledTitleBlock />
      </div>
      <ChecksPanel />
    </>
  );
}
