'use client';

import { useSyncExternalStore } from 'react';

/** Narrower than this the sheet becomes a plan with one panel below. */
export const PHONE = '(max-width: 639px)';
/** From here on the strip stands beside the plan. */
export const DESK = '(min-width: 1024px)';

/** Whether the window is so; false while the server draws. */
export function useMedia(query: string): boolean {
  return useSyncExternalStore(
    (changed) => {
      const list = window.matchMedia(query);
      list.addEventListener('change', changed);
      return () => list.removeEventListener('change', changed);
    },
    () => window.matchMedia(query).matches,
    () => false,
  );
}
