'use client';

import dynamic from 'next/dynamic';
import type { ReactNode } from 'react';
import { CAUTION_WORDS } from '@/components/ui/caution';
import { useDrawing } from '@/lib/client/use-drawing';
import { Border } from './border';
import { ZoomCells } from './zoom-cells';

/** Leaflet and Konva need a window: the plan is drawn in the browser only. */
const DrawingMap = dynamic(() => import('../map/drawing-map'), {
  ssr: false,
  loading: () => <p className="p-6">Unrolling the plan …</p>,
});

/** The plan in its ruled border, with the feet from the casualty vehicle along it. */
export function PlanFrame({ children, slim = false }: { children?: ReactNode; slim?: boolean }) {
  const attribution = useDrawing((state) => state.meta.baseMap?.attribution ?? null);
  return (
    <div className={`h-full min-h-0 ${slim ? 'px-2 pb-1' : 'pl-8 pr-4 pt-6'}`}>
      <div className="relative h-full border-2 border-ink bg-paper">
        <div className="absolute inset-0 overflow-hidden">
          <DrawingMap />
        </div>
        {!slim && <Border />}
        <p className="plan-caution pointer-events-none absolute bottom-1 left-2 right-40 z-[460] font-semibold leading-tight">
          {CAUTION_WORDS}
          {attribution && (
            <span className="block text-sm font-normal text-ink-soft">{attribution}</span>
          )}
        </p>
        <ZoomCells />
        {children}
      </div>
    </div>
  );
}
