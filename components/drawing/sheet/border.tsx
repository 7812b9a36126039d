'use client';

import { useMemo } from 'react';
import { borderTicks } from '@/lib/draw';
import { useDrawing } from '@/lib/client/use-drawing';
import { placeOf, planeOf, unitOf } from '@/lib/layout';
import { useView } from '../map/view-store';

/** A tick nearer to a corner than this would run into the other edge's, px. */
const CORNER_PX = 14;

/** Feet from the casualty vehicle along the frame's upper and left edge; they follow the view. */
export function Border() {
  const view = useView((state) => state.view);
  const layout = useDrawing((state) => state.sheet.layout);
  const casualty = unitOf(layout, 'C');
  const from = useMemo(
    () => (casualty ? placeOf(planeOf(layout), casualty) : { x: 0, y: 0 }),
    [casualty, layout],
  );
  const ticks = useMemo(() => (view ? borderTicks(view, 'ft', from) : []), [view, from]);
  if (!view) return null;
  return (
    <div aria-hidden="true" className="pointer-events-none text-sm leading-none text-ink-soft">
      {ticks.map(({ edge, at, label }) => {
        const px = view.toPx(edge === 'top' ? { x: at, y: 0 } : { x: 0, y: at });
        const along = edge === 'top' ? px.x : px.y;
        const most = edge === 'top' ? view.size.x : view.size.y;
        if (along < CORNER_PX || along > most - CORNER_PX) return null;
        return edge === 'top' ? (
          <span
            key={`t${label}`}
            data-tick="top"
            className="absolute bottom-full"
            style={{ left: along }}
          >
            <span className="absolute bottom-1.5 -translate-x-1/2 whitespace-nowrap">{label}</span>
            <span className="absolute bottom-0 h-1.5 border-l-[1.5px] border-ink" />
          </span>
        ) : (
          <span
            key={`l${label}`}
            data-tick="left"
            className="absolute right-full"
            style={{ top: along }}
          >
            <span className="absolute right-2 -translate-y-1/2 rotate-180 whitespace-nowrap [writing-mode:vertical-rl]">
              {label}
            </span>
            <span className="absolute right-0 w-1.5 border-t-[1.5px] border-ink" />
          </span>
        );
      })}
    </div>
  );
}
