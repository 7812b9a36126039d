'use client';

import { TileLayer } from 'react-leaflet';
import type { LatLngBoundsExpression } from 'leaflet';
import type { LayoutAnswer } from '@/lib/api';

type BaseMap = NonNullable<LayoutAnswer['base_map']>;

/** From here on the deepest level's tiles are sharper than those above it drawn larger. */
const CLOSE_UP_FROM = 0.5;

/**
 * A base map's tiles, drawn larger beyond their deepest level. That level only covers the middle
 * of the site, so it lies over the one before it: elsewhere the ground must not go blank.
 */
export function BaseMapTiles({ map, deepestZoom }: { map: BaseMap; deepestZoom: number }) {
  const [west, south, east, north] = map.bounds;
  const bounds: LatLngBoundsExpression = [
    [south, west],
    [north, east],
  ];
  const shared = {
    url: `/tiles/${map.pack}/${map.version}/{z}/{x}/{y}`,
    maxZoom: deepestZoom,
    bounds,
    keepBuffer: 4,
  };
  const wholeSite = Math.max(map.min_zoom, map.max_zoom - 1);
  return (
    <>
      <TileLayer
        {...shared}
        minNativeZoom={map.min_zoom}
        maxNativeZoom={wholeSite}
        attribution={map.attribution}
      />
      <TileLayer
        {...shared}
        minZoom={map.max_zoom - CLOSE_UP_FROM}
        minNativeZoom={map.max_zoom}
        maxNativeZoom={map.max_zoom}
      />
    </>
  );
}
