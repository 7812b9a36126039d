'use client';

import { useCallback, useRef, type KeyboardEvent } from 'react';
import { editForKey } from '@/lib/client/by-keys';
import { useDrawingStore } from '@/lib/client/use-drawing';
import { describe } from '@/lib/edits';

/** Steps closer together than this are one gesture, one entry to undo. */
const PAUSE_MS = 1000;

/** Keys that work on the piece with the focus. */
export function useMoveByKeys(): (event: KeyboardEvent, id: string) => void {
  const store = useDrawingStore();
  const last = useRef({ at: -Infinity, gesture: 0 });
  return useCallback(
    (event, id) => {
      if (event.ctrlKey || event.metaKey || event.altKey) return;
      const { history, apply, select } = store.getState();
      const edit = editForKey(history.present, id, event.key, event.shiftKey);
      if (!edit) return;
      // Else Leaflet would pan the map, or the page would scroll, along with the piece.
      event.preventDefault();
      event.stopPropagation();
      if (event.timeStamp - last.current.at > PAUSE_MS) last.current.gesture++;
      last.current.at = event.timeStamp;
      const gesture =
        edit.type === 'remove' ? undefined : `${edit.type} ${id} ${last.current.gesture}`;
      if (apply(edit, describe(history.present, edit), gesture) && edit.type === 'remove') {
        select(null);
      }
    },
    [store],
  );
}
