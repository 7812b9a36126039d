'use client';

import dynamic from 'next/dynamic';
import type { ComponentType } from 'react';
import { keepTrying } from '../keep-trying';
import { useView } from '../map/view-store';

/**
 * Loads a part of the sheet once the plan answers: a hand that comes in a hurry gets the plan
 * first. Its place on the sheet is kept meanwhile, so that nothing moves when it comes.
 */
function afterPlan<Props extends object>(
  load: () => Promise<ComponentType<Props>>,
  Coming: ComponentType = Words,
): ComponentType<Props> {
  const Part = dynamic<Props>(() => keepTrying(load), { ssr: false, loading: () => <Coming /> });
  return function AfterPlan(props: Props) {
    const answers = useView((state) => state.view !== null);
    return answers ? <Part {...props} /> : <Coming />;
  };
}

const Words = () => (
  <p role="status" className="px-4 py-3 text-ink-soft">
    Coming after the plan …
  </p>
);

/** As high as the shelf will be, so that the plan keeps its size when it comes. */
const ShelfRoom = () => <div className="min-h-[7.609375rem] max-xl:min-h-[9.359375rem]" />;
const Nothing = () => null;

export const KitShelf = afterPlan(
  () => import('@/components/kit').then((m) => m.KitShelf),
  ShelfRoom,
);
export const Strip = afterPlan(() => import('./strip').then((m) => m.Strip));
export const StripBelow = afterPlan(() => import('./strip').then((m) => m.StripBelow));
export const PhonePanel = afterPlan(() => import('./phone-panel').then((m) => m.PhonePanel));
export const PiecesTable = afterPlan(() =>
  import('@/components/pieces').then((m) => m.PiecesTable),
);
export const FloatingTag = afterPlan(
  () => import('../tag/floating-tag').then((m) => m.FloatingTag),
  Nothing,
);
export const MoreList = afterPlan(() => import('./more-list').then((m) => m.MoreList), Nothing);
export const WindChip = afterPlan(
  () => import('@/components/conditions/wind-chip').then((m) => m.WindChip),
  Nothing,
);
