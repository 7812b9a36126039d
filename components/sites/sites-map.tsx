'use client';

import 'leaflet/dist/leaflet.css';
import '@/components/map-paper/map-paper.css';
import L from 'leaflet';
import { useRouter } from 'next/navigation';
import { useEffect, useMemo } from 'react';
import { MapContainer, ScaleControl, useMap, ZoomControl } from 'react-leaflet';
import { Graticule } from '@/components/map-paper/graticule';
import { useFitted } from '@/components/map-paper/use-fitted';
import type { SiteRow } from '@/lib/api';
import { nameSides } from './name-sides';

type Placed = SiteRow & { at: NonNullable<SiteRow['at']> };

/** A lone site is shown with some miles of its surroundings. */
const CLOSEST_ZOOM = 11;
/** Names stand to the right of their marks; px. */
const ROOM_FOR_NAMES = { left: 72, right: 190, above: 48, below: 48 } as const;

const FIT: L.FitBoundsOptions = {
  paddingTopLeft: [ROOM_FOR_NAMES.left, ROOM_FOR_NAMES.above],
  paddingBottomRight: [ROOM_FOR_NAMES.right, ROOM_FOR_NAMES.below],
  maxZoom: CLOSEST_ZOOM,
};

/** Where the listed sites lie, on plain paper: no tiles are fetched from anywhere. */
export function SitesMap({ sites }: { sites: readonly SiteRow[] }) {
  // Kept while the list is: a new array would move the map back under the reader's hand.
  const placed = useMemo(() => sites.filter((site): site is Placed => site.at !== null), [sites]);
  const unplaced = sites.length - placed.length;
  return (
    <>
      <MapContainer
        center={[39, -98]}
        zoom={4}
        attributionControl={false}
        scrollWheelZoom={false}
        zoomControl={false}
        className="map-paper h-80 border border-ink lg:h-[28rem]"
      >
        <Graticule />
        <ZoomControl position="topright" />
        <ScaleControl metric={false} position="topleft" />
        <SiteButtons sites={placed} />
      </MapContainer>
      {unplaced > 0 && (
        <p className="mt-2 text-ink-soft">
          {unplaced === 1 ? 'One site has' : `${unplaced} sites have`} no position entered and can’t
          be shown here.
        </p>
      )}
    </>
  );
}

function SiteButtons({ sites }: { sites: readonly Placed[] }) {
  const map = useMap();
  const router = useRouter();
  const bounds = useMemo(
    () => (sites.length > 0 ? L.latLngBounds(sites.map(({ at }) => [at[1], at[0]])) : null),
    [sites],
  );
  useFitted(bounds, FIT);
  useEffect(() => {
    const layer = L.layerGroup().addTo(map);
    const marks = sites.map((site) => {
      const [lon, lat] = site.at;
      const at = L.latLng(lat, lon);
      const html = siteButton(site.name, () => router.push(`/sites/${site.id}`));
      const icon = L.divIcon({ className: 'site-mark', iconSize: [0, 0], html });
      L.marker(at, { keyboard: false, interactive: false, icon }).addTo(layer);
      return { at, button: html };
    });
    const sideNames = () => {
      const named = marks.map(({ at, button }) => {
        const { x, y } = map.latLngToContainerPoint(at);
        const height = button.firstElementChild?.clientHeight ?? 0;
        return { x, y, width: button.offsetWidth, height };
      });
      nameSides(named, map.getSize().x).forEach((side, i) => {
        const button = marks[i]?.button;
        if (button) button.dataset.side = side;
      });
    };
    sideNames();
    map.on('zoomend moveend', sideNames);
    return () => {
      map.off('zoomend moveend', sideNames);
      layer.remove();
    };
  }, [map, router, sites]);
  return null;
}

/** A real button, so that the keyboard and screen readers reach it like any other. */
function siteButton(name: string, open: () => void): HTMLButtonElement {
  const button = document.createElement('button');
  button.type = 'button';
  button.append(Object.assign(document.createElement('span'), { textContent: name }));
  button.addEventListener('click', open);
  L.DomEvent.disableClickPropagation(button);
  return button;
}
