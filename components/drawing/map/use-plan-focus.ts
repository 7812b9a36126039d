'use client';

import type { Map as LeafletMap } from 'leaflet';
import { useEffect } from 'react';
import { findPiece, placesOf } from '@/lib/layout';
import type { LocalPlane } from '@/lib/geo';
import { useDrawingStore } from '@/lib/client/use-drawing';
import type { ViewStore } from './view-store';

/** Px kept between a selected piece and the plan's edge. */
const EDGE_PX = 56;

/**
 * Leads the eye and the keyboard to what is being worked on: something picked by keyboard is laid
 * from the plan, and a piece selected elsewhere, in a check or in the table, comes into view.
 */
export function usePlanFocus(map: LeafletMap, views: ViewStore, plane: LocalPlane): void {
  const store = useDrawingStore();
  useEffect(
    () =>
      store.subscribe((now, before) => {
        if (now.inHand && now.inHand !== before.inHand) {
          if (document.activeElement?.matches(':focus-visible')) {
            map.getContainer().focus({ preventScroll: true });
          }
        }
        if (now.selection === null || now.selection === before.selection) return;
        const piece = findPiece(now.sheet, now.selection);
        const { view } = views.getState();
        if (!piece || !view || now.preview) return;
        const seen = placesOf(plane, piece)
          .flat()
          .map((place) => view.toPx(place))
          .some(({ x, y }) => x >= 0 && y >= 0 && x <= view.size.x && y <= view.size.y);
        const first = placesOf(plane, piece)[0]?.[0];
        if (seen || !first) return;
        const [lon, lat] = plane.toLonLat(first);
        map.panInside([lat, lon], { padding: [EDGE_PX, EDGE_PX] });
      }),
    [store, map, views, plane],
  );
}
