'use client';

import { useEffect } from 'react';
import { useView } from './map/view-store';

/** Long enough for the plan and the strip to be done with the network. */
const AFTER_MS = 4000;

/**
 * Fetches, once all is quiet, what is needed when the connection is gone: to write a file, and to
 * ask about two versions. Asked for then, it could not be fetched any more.
 */
export function useForethought(): void {
  const answers = useView((state) => state.view !== null);
  useEffect(() => {
    if (!answers) return;
    const timer = setTimeout(() => {
      const ahead = [
        import('@/lib/layout/exchange'),
        import('./saving/draft-dialog'),
        import('./saving/stale-dialog'),
      ];
      // Not reached now: it is asked for again, and complained of, when it is wanted.
      void Promise.allSettled(ahead);
    }, AFTER_MS);
    return () => clearTimeout(timer);
  }, [answers]);
}
