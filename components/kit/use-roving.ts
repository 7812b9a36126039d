'use client';

import { useState, type KeyboardEvent } from 'react';

const BY: Record<string, number> = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 };

/** One stop of the Tab key for a row of buttons; arrows, Home and End go along it. */
export function useRoving(count: number): {
  tabIndexOf: (place: number) => 0 | -1;
  onFocus: (place: number) => void;
  onKeyDown: (event: KeyboardEvent<HTMLElement>) => void;
} {
  const [current, setCurrent] = useState(0);
  const stop = Math.min(current, Math.max(0, count - 1));

  const onKeyDown = (event: KeyboardEvent<HTMLElement>): void => {
    // What else stands in the row (a choice) keeps its own arrow keys.
    if (!(event.target as HTMLElement).hasAttribute('data-stop')) return;
    const by = BY[event.key];
    const to =
      by !== undefined
        ? (stop + by + count) % count
        : event.key === 'Home'
          ? 0
          : event.key === 'End'
            ? count - 1
            : null;
    if (to === null) return;
    event.preventDefault();
    event.stopPropagation();
    setCurrent(to);
    event.currentTarget.querySelectorAll<HTMLElement>('[data-stop]')[to]?.focus();
  };

  return {
    tabIndexOf: (place) => (place === stop ? 0 : -1),
    onFocus: setCurrent,
    onKeyDown,
  };
}
