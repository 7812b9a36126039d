'use client';

import 'leaflet/dist/leaflet.css';
import './plan-map.css';
import { useMemo, useRef } from 'react';
import { createPortal } from 'react-dom';
import { MapContainer, useMap } from 'react-leaflet';
import { BaseMapTiles } from '@/components/map-paper/base-map-tiles';
import { planeAt } from '@/lib/layout';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { placesToShow } from './first-view';
import { FollowView } from './follow-view';
import { PlanOver } from './plan-over';

/** Tiles are drawn larger than they are down to this zoom, where a foot is some 40 px. */
const DEEPEST_ZOOM = 24;
const WIDEST_ZOOM = 12;

/** The plan: Leaflet owns the view, the drawing lies over it. Loaded in the browser only. */
export default function DrawingMap() {
  const store = useDrawingStore();
  const baseMap = useDrawing((state) => state.meta.baseMap);
  const firstBounds = useMemo(
    () => placesToShow(store.getState().sheet).map(([lon, lat]): [number, number] => [lat, lon]),
    [store],
  );
  return (
    <MapContainer
      bounds={firstBounds}
      boundsOptions={{ padding: [40, 40], maxZoom: 22 }}
      maxZoom={DEEPEST_ZOOM}
      minZoom={WIDEST_ZOOM}
      zoomSnap={0.25}
      zoomDelta={0.75}
      wheelPxPerZoomLevel={90}
      zoomControl={false}
      attributionControl={false}
      doubleClickZoom={false}
      boxZoom={false}
      className="plan-map absolute inset-0"
    >
      {baseMap && <BaseMapTiles map={baseMap} deepestZoom={DEEPEST_ZOOM} />}
      <OverTheMap />
    </MapContainer>
  );
}

function OverTheMap() {
  const map = useMap();
  const over = useRef<HTMLDivElement>(null);
  const origin = useDrawing((state) => state.sheet.layout.origin);
  const plane = planeAt(origin);
  return (
    <>
      <FollowView plane={plane} over={over} />
      {createPortal(
        <div ref={over} className="pointer-events-none absolute inset-0 z-[450]">
          <PlanOver plane={plane} />
        </div>,
        map.getContainer(),
      )}
    </>
  );
}
