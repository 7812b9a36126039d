'use client';

import dynamic from 'next/dynamic';
import type { ReactNode } from 'react';
import { CAUTION_WORDS } from '@/components/ui/caution';
import { useDrawing } from '@/lib/client/use-drawing';
import { keepTrying } from '../keep-trying';
import { Border } from './border';
import { ZoomCells } from './zoom-cells';

/** Leaflet and Konva need a window: the plan is drawn in the browser only. */
const DrawingMap = dynamic(() => keepTrying(() => import('../map/drawing-map')), {
  ssr: false,
  loading: () => <p className="p-6">Unrolling the plan …</p>,
});

/**
 * The plan in its ruled border, with the feet from the casualty vehicle along it. The caution
 * stands below, where it covers nothing.
 */
export function PlanFrame({ children, slim = false }: { children?: ReactNode; slim?: boolean }) {
  const attribution = useDrawing((state) => state.meta.baseMap?.attribution ?? null);
  return (
    <div className={`flex h-full min-h-0 flex-col ${slim ? 'px-2' : 'pl-8 pr-4 pt-6'}`}>
      <div className="relative min-h-0 grow border-2 border-ink bg-paper">
        <div className="absolute inset-0 overflow-hidden">
          <DrawingMap />
        </div>
        {!slim && <Border />}
        {slim && (
          <div className="absolute bottom-0 right-0 z-[465] bg-margin">
            <ZoomCells />
          </div>
        )}
        {children}
      </div>
      {slim ? (
        <p className="shrink-0 py-1 text-sm font-semibold leading-tight">{CAUTION_WORDS}</p>
      ) : (
        <div className="flex shrink-0 items-start justify-between gap-3">
          <p className="pt-1 font-semibold leading-tight">
            {CAUTION_WORDS}
            {attribution && (
              <span className="pl-2 text-sm font-normal text-ink-soft">{attribution}</span>
            )}
          </p>
          <ZoomCells />
        </div>
      )}
    </div>
  );
}
