'use client';

import { CheckStepper, ChecksPanel } from '@/components/checks';
import { ConditionsPanel } from '@/components/conditions';
import { KitShelf } from '@/components/kit';
import { PiecesTable } from '@/components/pieces';
import { StakeTag } from '../tag/stake-tag';
import { IndexTabs } from './index-tabs';
import type { Panel } from './phone-sheet';
import { ScaledTitleBlock } from './scaled-title-block';

/** What lies below a phone's plan: the piece that was pressed, else the panel that was chosen. */
export function PhonePanel({ panel, piece }: { panel: Panel; piece: string | null }) {
  if (piece !== null) {
    return (
      <div className="space-y-3 px-3 py-2">
        <StakeTag key={piece} id={piece} roomy />
        <CheckStepper pieceId={piece} />
      </div>
    );
  }
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
