'use client';

import type { Map as LeafletMap } from 'leaflet';
import { useEffect, useRef } from 'react';
import type { ToolEvent, Under } from '@/lib/client/tools';
import type { LocalPlane } from '@/lib/geo';
import type { ViewStore } from './view-store';

/**
 * Keys pressed on the plan, on a piece's button or on a handle's go to the tools first. What they
 * take neither pans the map nor scrolls the page.
 */
export function usePlanKeys(
  map: LeafletMap,
  views: ViewStore,
  plane: LocalPlane,
  send: (event: ToolEvent) => boolean,
): void {
  const latest = useRef(send);
  useEffect(() => {
    latest.current = send;
  });

  useEffect(() => {
    const box = map.getContainer();
    const onKey = (event: KeyboardEvent): void => {
      const { view } = views.getState();
      if (!view || event.metaKey || event.altKey) return;
      const target = event.target instanceof HTMLElement ? event.target : null;
      if (target?.closest('input, select, textarea, [data-keys="own"]')) return;
      const { x, y } = view.size;
      const taken = latest.current({
        type: 'key',
        key: event.key,
        fine: event.shiftKey,
        far: event.ctrlKey,
        repeat: event.repeat,
        under: underOf(target),
        middleOfView: plane.toLonLat(view.toPlane({ x: x / 2, y: y / 2 })),
        metresPerPx: view.metresPerPx,
      });
      if (!taken) return;
      event.preventDefault();
      event.stopPropagation();
    };
    box.addEventListener('keydown', onKey, { capture: true });
    return () => box.removeEventListener('keydown', onKey, { capture: true });
  }, [map, views, plane]);
}

/** What the focused button stands for; its data says so (piece-buttons, handle-buttons). */
function underOf(target: HTMLElement | null): Under {
  const { under } = target?.closest<HTMLElement>('[data-under]')?.dataset ?? {};
  return under ? (JSON.parse(under) as Under) : null;
}
