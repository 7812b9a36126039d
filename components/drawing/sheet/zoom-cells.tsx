'use client';

import { useDrawingStore } from '@/lib/client/use-drawing';
import { placesToShow } from '../map/first-view';
import { fitPlaces, useViewStore } from '../map/view-store';

const CELL =
  'inline-flex min-h-9 min-w-9 cursor-pointer items-center justify-center border-l-[1.5px] border-ink bg-margin px-2 hover:bg-ink hover:text-paper pointer-coarse:min-h-11 pointer-coarse:min-w-11';

/** Nearer, farther and everything by single taps, seated in the frame's corner. */
export function ZoomCells() {
  const store = useDrawingStore();
  const views = useViewStore();
  const map = () => views.getState().map;
  return (
    <div className="absolute bottom-0 right-0 z-[465] flex border-t-[1.5px] border-ink">
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
