'use client';

import type { FitBoundsOptions, LatLngBoundsExpression } from 'leaflet';
import { useEffect } from 'react';
import { useMap } from 'react-leaflet';

/**
 * Shows `bounds` as soon as the map has a size. A map that is made while its page is still hidden
 * (as when one comes by a link) has none, and Leaflet would go to its deepest zoom.
 * Keep `bounds` and `options` the same objects until they change: a new one moves the map.
 */
export function useFitted(bounds: LatLngBoundsExpression | null, options?: FitBoundsOptions): void {
  const map = useMap();
  useEffect(() => {
    let waiting = bounds !== null;
    const fit = () => {
      map.invalidateSize({ animate: false });
      const { x, y } = map.getSize();
      if (!waiting || !bounds || x === 0 || y === 0) return;
      waiting = false;
      map.fitBounds(bounds, { animate: false, ...options });
    };
    const watch = new ResizeObserver(fit);
    watch.observe(map.getContainer());
    return () => watch.disconnect();
  }, [map, bounds, options]);
}
