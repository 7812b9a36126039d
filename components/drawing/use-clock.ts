'use client';

import { useEffect } from 'react';
import { useDrawingStore } from '@/lib/client/use-drawing';

/** A wind reading that grows old must be seen to, whether or not anybody touches the drawing. */
const TICK_MS = 30_000;

/** Moves on the instant for which the checks answer; also when the page is looked at again. */
export function useClock(): void {
  const store = useDrawingStore();
  useEffect(() => {
    const tick = (): void => store.getState().setAsOf(new Date().toISOString());
    const onVisible = (): void => {
      if (!document.hidden) tick();
    };
    // What was just seen must not be judged as if it were still to come.
    const unsubscribe = store.subscribe((now, before) => {
      const seen = now.history.present.layout.conditions.wind?.observed_at;
      if (now.history === before.history || !seen || now.asOf === null) return;
      if (Date.parse(seen) > Date.parse(now.asOf) && Date.parse(seen) <= Date.now()) tick();
    });
    const timer = setInterval(tick, TICK_MS);
    document.addEventListener('visibilitychange', onVisible);
    return () => {
      unsubscribe();
      clearInterval(timer);
      document.removeEventListener('visibilitychange', onVisible);
    };
  }, [store]);
}
