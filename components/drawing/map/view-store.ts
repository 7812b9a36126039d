'use client';

import type { Map as LeafletMap } from 'leaflet';
import { createContext, useContext } from 'react';
import { useStore } from 'zustand';
import { createStore, type StoreApi } from 'zustand/vanilla';
import type { LonLat } from '@/lib/geo';
import type { PlanView } from './plan-view';

export type ViewState = {
  readonly map: LeafletMap | null;
  /** Follows every step of a pan or pinch; null until the map stands. */
  readonly view: PlanView | null;
  /** The view when the map last came to rest: symbols and labels are set out for it. */
  readonly atRest: PlanView | null;
};

export type ViewStore = StoreApi<ViewState>;

export const createViewStore = (): ViewStore =>
  createStore<ViewState>(() => ({ map: null, view: null, atRest: null }));

/** Shared by the plan and by the sheet's margins, whose ticks follow it. */
export const ViewContext = createContext<ViewStore | null>(null);

export function useViewStore(): ViewStore {
  const store = useContext(ViewContext);
  if (!store) throw new Error('useView is only for what lies on the drawing sheet');
  return store;
}

export const useView = <T>(selector: (state: ViewState) => T): T =>
  useStore(useViewStore(), selector);

/** Px kept free round what is brought into view. */
const MARGIN_PX = 48;
/** Fitting one small piece should not end with a rod filling the screen. */
const FIT_ZOOM = 22;

export function fitPlaces(map: LeafletMap, places: readonly LonLat[], animate = false): void {
  if (places.length === 0) return;
  const margin: [number, number] = [MARGIN_PX, MARGIN_PX];
  map.fitBounds(
    places.map(([lon, lat]): [number, number] => [lat, lon]),
    { padding: margin, maxZoom: FIT_ZOOM, animate },
  );
}
