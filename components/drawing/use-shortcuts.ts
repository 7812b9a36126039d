'use client';

import { useEffect } from 'react';
import { useDrawingStore } from '@/lib/client/use-drawing';
import { useScreen } from './screen-store';

/** Keys that work anywhere on the screen, unless a field is being typed in. */
export function useShortcuts(): void {
  const store = useDrawingStore();
  const showKeys = useScreen((state) => state.showKeys);
  useEffect(() => {
    const onKey = (event: KeyboardEvent): void => {
      if (event.defaultPrevented || isTyping(event.target)) return;
      const { undo, redo, putDown, inHand, selection, select } = store.getState();
      const key = event.key.toLowerCase();
      if ((event.ctrlKey || event.metaKey) && !event.altKey) {
        if (key === 'z' && !event.shiftKey) undo();
        else if (key === 'y' || key === 'z') redo();
        else return;
        event.preventDefault();
      } else if (event.key === 'Escape') {
        if (inHand) putDown();
        else if (selection) select(null);
      } else if (event.key === '?') {
        event.preventDefault();
        showKeys(true);
      }
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [store, showKeys]);
}

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement &&
  target.closest('input, textarea, select, [role="dialog"], [role="alertdialog"]') !== null;
