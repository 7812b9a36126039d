'use client';

import dynamic from 'next/dynamic';

/** Leaflet needs a window; until it is there the map's place is kept, so that nothing jumps. */
export const SitePreview = dynamic(
  () => import('./site-preview').then((module) => module.SitePreview),
  { ssr: false, loading: () => <div className="h-80 border border-ink bg-paper lg:h-[28rem]" /> },
);
