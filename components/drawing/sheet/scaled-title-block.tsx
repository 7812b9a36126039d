'use client';

import { TitleBlock } from '@/components/title-block';
import { useView } from '../map/view-store';

/** The title block with a scale bar that follows the plan. */
export function ScaledTitleBlock() {
  const metresPerPx = useView((state) => state.atRest?.metresPerPx ?? null);
  return <TitleBlock metresPerPx={metresPerPx} />;
}
