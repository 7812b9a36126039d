'use client';

import dynamic from 'next/dynamic';

/** Leaflet needs a window; until it is there the map's place is kept, so that nothing jumps. */
export const SitesMap = dynamic(() => import('./sites-map').then((module) => module.SitesMap), {
  ssr: false,
  loading: () => <div className="h-80 border border-ink bg-paper lg:h-[28rem]" />,
});
