'use client';

import dynamic from 'next/dynamic';
import { CAUTION_WORDS } from '@/components/ui/caution';

/** Leaflet and Konva need a window: the plan is drawn in the browser only. */
const DrawingMap = dynamic(() => import('../map/drawing-map'), {
  ssr: false,
  loading: () => <p className="p-6">Unrolling the plan …</p>,
});

/** The plan in its ruled border, with the feet from the casualty vehicle along it. */
export function PlanFrame() {
  return (
    <div className="h-full px-7 py-5">
      <div className="relative h-full border-2 border-ink bg-paper">
        <DrawingMap />
        <p className="plan-caution pointer-events-none absolute bottom-1.5 left-2 z-[460] font-semibold">
          {CAUTION_WORDS}
        </p>
      </div>
    </div>
  );
}
