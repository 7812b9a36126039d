import { useMemo, useSyncExternalStore } from 'react';
import type { DrawingState, DrawingStore } from '@/lib/client/drawing-store';
import { useDrawingStore } from '@/lib/client/use-drawing';

/**
 * What the drawing says when nothing moves. While a gesture previews, the last such answer stays:
 * lists that nobody reads in mid-drag must not cost it frames. `pick` must be the same each time.
 */
export function useAtRest<T>(pick: (state: DrawingState) => T): T {
  const store = useDrawingStore();
  const read = useMemo(() => readerAtRest(store, pick), [store, pick]);
  return useSyncExternalStore(store.subscribe, read, read);
}

function readerAtRest<T>(store: DrawingStore, pick: (state: DrawingState) => T): () => T {
  let last = pick(store.getState());
  return () => {
    const state = store.getState();
    if (state.preview === null) last = pick(state);
    return last;
  };
}
