'use client';

import L from 'leaflet';
import { useEffect } from 'react';
import { useMap } from 'react-leaflet';
import { degreeWords, gridStep, linesBetween } from './graticule-lines';

const LINES_WANTED = 4;

/** Lines of latitude and longitude with their degrees: the paper under a map without tiles. */
export function Graticule() {
  const map = useMap();
  useEffect(() => {
    const lines = L.layerGroup().addTo(map);
    const draw = () => {
      const bounds = map.getBounds();
      const [south, north] = [bounds.getSouth(), bounds.getNorth()];
      const [west, east] = [bounds.getWest(), bounds.getEast()];
      lines.clearLayers();
      const step = gridStep(Math.max(east - west, north - south) / LINES_WANTED);
      for (const lon of linesBetween(west, east, step)) {
        line([south, lon], [north, lon]).addTo(lines);
        words([south, lon], degreeWords(lon, step, 'E', 'W'), 'south').addTo(lines);
      }
      for (const lat of linesBetween(south, north, step)) {
        line([lat, west], [lat, east]).addTo(lines);
        words([lat, west], degreeWords(lat, step, 'N', 'S'), 'west').addTo(lines);
      }
    };
    draw();
    map.on('moveend', draw);
    return () => {
      map.off('moveend', draw);
      lines.remove();
    };
  }, [map]);
  return null;
}

const line = (from: L.LatLngTuple, to: L.LatLngTuple) =>
  L.polyline([from, to], { className: 'graticule', weight: 1, interactive: false });

function words(at: L.LatLngTuple, text: string, edge: 'south' | 'west') {
  const label = document.createElement('span');
  label.textContent = text;
  return L.marker(at, {
    interactive: false,
    keyboard: false,
    icon: L.divIcon({ className: `graticule-words ${edge}`, html: label, iconSize: [0, 0] }),
  });
}
