'use client';

import { useLayoutEffect, useRef, type ReactNode } from 'react';
import type { PlanView } from './plan-view';
import { useViewStore } from './view-store';

/**
 * Carries what was set out for the view at rest along with a pan or pinch by one transform, so
 * that no word or button is laid out anew until the map rests again.
 */
export function GlideWith({ view, children }: { view: PlanView; children: ReactNode }) {
  const box = useRef<HTMLDivElement>(null);
  const views = useViewStore();

  useLayoutEffect(() => {
    const glide = (): void => {
      const now = views.getState().view;
      if (!box.current || !now) return;
      const scale = now.pxPerMetre / view.pxPerMetre;
      const [was, is] = [view.toPx({ x: 0, y: 0 }), now.toPx({ x: 0, y: 0 })];
      box.current.style.transform =
        now === view
          ? ''
          : `translate(${is.x - was.x * scale}px, ${is.y - was.y * scale}px) scale(${scale})`;
    };
    glide();
    return views.subscribe(glide);
  }, [views, view]);

  return (
    <div ref={box} className="absolute inset-0 origin-top-left">
      {children}
    </div>
  );
}
