'use client';

import { useDrawingStore } from '@/lib/client/use-drawing';
import { placesToShow } from '../map/first-view';
import { fitPlaces, useViewStore } from '../map/view-store';

const CELL =
  'inline-flex min-h-8 min-w-9 cursor-pointer items-center justify-center border-ink px-2 not-first:border-l-[1.5px] hover:bg-ink hover:text-paper pointer-coarse:min-h-11 pointer-coarse:min-w-11';

/** Nearer, farther and everything by single taps, seated in the frame's corner. */
export function ZoomCells() {
  const store = useDrawingStore();
  const views = useViewStore();
  const map = () => views.getState().map;
  return (
    <div className="flex shrink-0 border-[1.5px] border-t-0 border-ink">
      <button type="button" className={CELL} aria-label="Farther" onClick={() => map()?.zoomOut()}>
        −
      </button>
      <button type="button" className={CELL} aria-label="Nearer" onClick={() => map()?.zoomIn()}>
        +
      </button>
      <button
        type="button"
        className={CELL}
        onClick={() => {
          const { map: leaflet } = views.getState();
          if (leaflet) fitPlaces(leaflet, placesToShow(store.getState().sheet), true);
        }}
      >
        All
      </button>
    </div>
  );
}
