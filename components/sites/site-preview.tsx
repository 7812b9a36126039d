'use client';

import 'leaflet/dist/leaflet.css';
import '@/components/map-paper/map-paper.css';
import '@/components/drawing/map/plan-map.css';
import type { LatLngBoundsExpression } from 'leaflet';
import { useMemo } from 'react';
import { AttributionControl, MapContainer, ScaleControl, ZoomControl } from 'react-leaflet';
import { BaseMapTiles } from '@/components/map-paper/base-map-tiles';
import { Graticule } from '@/components/map-paper/graticule';
import { useFitted } from '@/components/map-paper/use-fitted';
import type { SiteAnswer } from '@/lib/api';
import type { LonLat } from '@/lib/geo';
import { GroundOver } from './ground-over';

/** Tiles are sharp up to the pack's own zoom and enlarged beyond it. */
const CLOSEST_ZOOM = 24;
const ZOOM_WITHOUT_MAP = 17;

/** The site's base map with what is drawn on it; plain paper where there is no map. */
export function SitePreview({ site }: { site: SiteAnswer }) {
  const map = site.base_map;
  const origin = useMemo(() => site.at ?? (map && middle(map.bounds)), [site.at, map]);
  const bounds = useMemo(() => map && corners(map.bounds), [map]);
  if (!origin) {
    return (
      <p className="border border-rule p-4">
        No position and no base map yet. The drawing still works: it is measured on a plain grid.
      </p>
    );
  }
  return (
    <section aria-label="Map of the site" className="min-w-0">
      <MapContainer
        center={[origin[1], origin[0]]}
        zoom={ZOOM_WITHOUT_MAP}
        maxBounds={bounds ?? undefined}
        maxZoom={CLOSEST_ZOOM}
        zoomSnap={0.25}
        attributionControl={false}
        scrollWheelZoom={false}
        zoomControl={false}
        className="map-paper plan-map h-80 border border-ink lg:h-[28rem]"
      >
        {map ? <BaseMapTiles map={map} deepestZoom={CLOSEST_ZOOM} /> : <Graticule />}
        <Fitted bounds={bounds} />
        <GroundOver siteId={site.id} origin={origin} />
        <AttributionControl prefix={false} position="bottomleft" />
        <ZoomControl position="topright" />
        <ScaleControl metric={false} position="topleft" />
      </MapContainer>
    </section>
  );
}

function Fitted({ bounds }: { bounds: LatLngBoundsExpression | null }) {
  useFitted(bounds);
  return null;
}

type Bounds = NonNullable<SiteAnswer['base_map']>['bounds'];

const corners = ([west, south, east, north]: Bounds): [[number, number], [number, number]] => [
  [south, west],
  [north, east],
];

const middle = ([west, south, east, north]: Bounds): LonLat => [
  (west + east) / 2,
  (south + north) / 2,
];
