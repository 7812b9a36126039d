'use client';

import type { ZoomAnimEvent } from 'leaflet';
import { useLayoutEffect, type RefObject } from 'react';
import { useMap } from 'react-leaflet';
import type { LocalPlane } from '@/lib/geo';
import { planView } from './plan-view';
import { useViewStore } from './view-store';

/** Leaflet's own, from leaflet.css: what lies over the map has to move exactly with its tiles. */
const ZOOM_TRANSITION = 'transform 0.25s cubic-bezier(0, 0, 0.25, 1)';

/**
 * Publishes Leaflet's view as it changes, and keeps `over` glued to the map while Leaflet animates
 * a zoom: the tiles are then moved by CSS alone and the view stays old until the end.
 */
export function FollowView({
  plane,
  over,
}: {
  plane: LocalPlane;
  over: RefObject<HTMLElement | null>;
}) {
  const map = useMap();
  const store = useViewStore();

  useLayoutEffect(() => {
    const follow = (): void => {
      const element = over.current;
      if (element) {
        element.style.transition = '';
        element.style.transform = '';
      }
      store.setState({ view: planView(map, plane) });
    };
    const rest = (): void => {
      const view = planView(map, plane);
      store.setState({ view, atRest: view });
    };
    const animate = ({ center, zoom }: ZoomAnimEvent): void => {
      const element = over.current;
      if (!element) return;
      const scale = map.getZoomScale(zoom, map.getZoom());
      const to = map.latLngToContainerPoint(center).multiplyBy(scale);
      const shift = map.getSize().divideBy(2).subtract(to);
      element.style.transformOrigin = '0 0';
      element.style.transition = ZOOM_TRANSITION;
      element.style.transform = `translate(${shift.x}px, ${shift.y}px) scale(${scale})`;
    };
    map.on('move zoom viewreset resize', follow);
    map.on('moveend zoomend resize', rest);
    map.on('zoomanim', animate);
    store.setState({ map });
    rest();
    // Leaflet learns of the window's size only; the frame also changes with the strip and the tag.
    const resized = new ResizeObserver(() => map.invalidateSize({ animate: false, pan: false }));
    resized.observe(map.getContainer());
    return () => {
      map.off('move zoom viewreset resize', follow);
      map.off('moveend zoomend resize', rest);
      map.off('zoomanim', animate);
      resized.disconnect();
      store.setState({ map: null, view: null, atRest: null });
    };
  }, [map, store, plane, over]);

  return null;
}
