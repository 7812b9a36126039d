'use client';

import { useEffect, useRef } from 'react';
import type { Edit } from '@/lib/edits';
import type { Conditions } from '@/lib/layout';
import { useDrawingStore } from '@/lib/client/use-drawing';

/** Keys that follow one another within this are one turn, and so one entry of the history. */
const REST_MS = 900;

export type Turning = {
  /** Shows the direction at once; nothing is kept until `finish`. */
  show(degrees: number): void;
  /** The same for keys: finishes by itself at rest. */
  step(degrees: number): void;
  finish(): void;
  cancel(): void;
  /** The direction under way, null while nothing turns. */
  underWay(): number | null;
};

/** Turns one direction of the conditions: previews on the way, one labelled entry at the end. */
export function useTurn(
  edit: (before: Conditions, degrees: number) => Edit,
  label: (degrees: number) => string,
): Turning {
  const store = useDrawingStore();
  const pending = useRef<number | null>(null);
  const rest = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);

  // What was present before the gesture: previews never build on one another.
  const editTo = (degrees: number): Edit =>
    edit(store.getState().history.present.layout.conditions, degrees);

  const take = (): number | null => {
    clearTimeout(rest.current);
    const degrees = pending.current;
    pending.current = null;
    return degrees;
  };

  const finish = (): void => {
    const degrees = take();
    if (degrees !== null) store.getState().apply(editTo(degrees), label(degrees));
  };

  const show = (degrees: number): void => {
    pending.current = degrees;
    store.getState().setPreview([editTo(degrees)]);
  };

  const finishLatest = useRef(finish);
  useEffect(() => {
    finishLatest.current = finish;
  });
  // A turn under way when the dial goes away was meant.
  useEffect(() => () => finishLatest.current(), []);

  return {
    show,
    step(degrees) {
      show(degrees);
      clearTimeout(rest.current);
      rest.current = setTimeout(() => finishLatest.current(), REST_MS);
    },
    finish,
    cancel() {
      if (take() !== null) store.getState().setPreview(null);
    },
    underWay: () => pending.current,
  };
}
