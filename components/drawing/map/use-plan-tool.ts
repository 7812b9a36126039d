'use client';

import { useCallback, useEffect, useRef, useState } from 'react';
import type { DrawingState, DrawingStore } from '@/lib/client/drawing-store';
import {
  IDLE,
  planTool,
  withAnotherInHand,
  type Scene,
  type Step,
  type ToolEvent,
  type ToolState,
} from '@/lib/client/tools';
import { useDrawingStore } from '@/lib/client/use-drawing';
import { screenStore } from '../screen-store';
import { newPieceId } from '../new-piece-id';
import { sayAtRest } from './say-at-rest';

export type PlanTool = {
  readonly state: ToolState;
  /** Hands an event to the tools and does what they answer. True where the event is used up. */
  send(event: ToolEvent): boolean;
};

export const sceneOf = (state: DrawingState): Scene => ({
  sheet: state.history.present,
  selection: state.selection,
  inHand: state.inHand,
  limits: state.limits.values,
  newId: newPieceId,
  canDraw: state.canDraw,
  canChangeSite: state.canChangeSite,
});

/** The pointer tools on this drawing: their state, and what carries out their steps. */
export function usePlanTool(): PlanTool {
  const store = useDrawingStore();
  const [state, setState] = useState(IDLE);
  const current = useRef(state);

  const become = useCallback((next: ToolState) => {
    if (next === current.current) return;
    current.current = next;
    setState(next);
  }, []);

  useEffect(
    () =>
      store.subscribe((now, before) => {
        if (now.inHand !== before.inHand) become(withAnotherInHand(current.current));
      }),
    [store, become],
  );

  const send = useCallback(
    (event: ToolEvent): boolean => {
      const step = planTool(current.current, event, sceneOf(store.getState()));
      become(step.state);
      carryOut(store, step);
      return step.taken ?? false;
    },
    [store, become],
  );

  return { state, send };
}

function carryOut(store: DrawingStore, step: Step): void {
  const { apply, setPreview, select, putDown, announce } = store.getState();
  if (step.edits && step.label) {
    if (apply(step.edits, step.label, step.gesture)) sayAtRest(store, step);
  } else if (step.preview !== undefined) {
    if (step.preview !== null || store.getState().preview !== null) setPreview(step.preview);
  }
  if (step.select !== undefined) {
    select(step.select);
    screenStore.getState().openTag(step.select !== null);
  }
  if (step.putDown) putDown();
  if (step.announce && !step.edits) announce(step.announce);
}
