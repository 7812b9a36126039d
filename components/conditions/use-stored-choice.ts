'use client';

import { useSyncExternalStore } from 'react';

const CHANGED = 'stillground-choice';

/** A small choice of this browser's reader (a unit), kept for next time. */
export function useStoredChoice<T extends string>(
  key: string,
  choices: readonly T[],
  otherwise: T,
): [T, (choice: T) => void] {
  const read = (): T => {
    try {
      const kept = window.localStorage.getItem(key);
      return choices.find((choice) => choice === kept) ?? otherwise;
    } catch {
      // Storage can be switched off; the choice then lasts as long as the default does.
      return otherwise;
    }
  };
  const chosen = useSyncExternalStore(subscribe, read, () => otherwise);
  const choose = (choice: T): void => {
    try {
      window.localStorage.setItem(key, choice);
    } catch {
      return; // as above
    }
    window.dispatchEvent(new Event(CHANGED));
  };
  return [chosen, choose];
}

function subscribe(changed: () => void): () => void {
  window.addEventListener(CHANGED, changed);
  window.addEventListener('storage', changed);
  return () => {
    window.removeEventListener(CHANGED, changed);
    window.removeEventListener('storage', changed);
  };
}
