'use client';

import { useEffect, useMemo, useState } from 'react';
import { createPortal } from 'react-dom';
import { useMap } from 'react-leaflet';
import { planView, type PlanView } from '@/components/drawing/map/plan-view';
import { PlanShapes } from '@/components/plan/plan-svg';
import { useTheme } from '@/components/ui/use-theme';
import { useGround } from '@/lib/client/api';
import { drawSite } from '@/lib/draw';
import type { LonLat } from '@/lib/geo';
import { emptyLayout, planeAt } from '@/lib/layout';
import { limitsFrom } from '@/lib/limits';

/** The site's lines, areas and fixed points over its map, as the drawing shows them. */
export function GroundOver({ siteId, origin }: { siteId: string; origin: LonLat }) {
  const map = useMap();
  const theme = useTheme();
  const { data } = useGround(siteId);
  const view = usePlanView(origin);
  const metresPerPx = view?.metresPerPx ?? null;
  const ground = data?.ground;
  const list = useMemo(() => {
    if (!ground || metresPerPx === null) return null;
    const sheet = { layout: emptyLayout(origin), site: ground };
    return drawSite({ sheet, limits: limitsFrom(), view: { metresPerPx } });
  }, [ground, metresPerPx, origin]);

  if (!list || !view) return null;
  return createPortal(
    <svg
      aria-hidden="true"
      className="pointer-events-none absolute inset-0 z-[450] h-full w-full font-sans"
    >
      <PlanShapes list={list} projector={view} theme={theme} />
    </svg>,
    map.getContainer(),
  );
}

/** How the ground lies on the map now; null while Leaflet's zoom glides. */
function usePlanView(origin: LonLat): PlanView | null {
  const map = useMap();
  const [view, setView] = useState<PlanView | null>(null);
  useEffect(() => {
    const plane = planeAt(origin);
    const follow = () => setView(planView(map, plane));
    const hide = () => setView(null);
    follow();
    map.on('move moveend zoomend resize', follow);
    map.on('zoomanim', hide);
    return () => {
      map.off('move moveend zoomend resize', follow);
      map.off('zoomanim', hide);
    };
  }, [map, origin]);
  return view;
}
