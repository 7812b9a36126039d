'use client';

import type { Map as LeafletMap } from 'leaflet';
import { useEffect, useRef } from 'react';
import type { PointerType } from '@/lib/client/hit-test';
import type { ToolEvent, Under } from '@/lib/client/tools';
import type { LocalPlane, LonLat, Vec } from '@/lib/geo';
import type { Px } from '@/lib/draw';
import type { ViewStore } from './view-store';

/** Two presses closer than this in time and place are a double click. */
const DOUBLE_MS = 400;
const DOUBLE_PX = 24;
/** The bench counts the script that was fetched before this mark. */
const ANSWERS = 'plan-answers';

type Find = (at: Vec, metresPerPx: number, pointer: PointerType) => Under;

export type PlanPointer = {
  readonly send: (event: ToolEvent) => boolean;
  readonly find: Find;
  /** The pointer moves without pressing; null when it has left the plan. */
  readonly onHover: (under: Under) => void;
};

/**
 * Hands pointer events on the map to the tools before Leaflet sees them. What the tools take is
 * kept from Leaflet, with the mouse and touch events that the browser sends after it; everything
 * else pans, pinches and zooms as usual.
 */
export function usePlanPointer(
  map: LeafletMap,
  views: ViewStore,
  plane: LocalPlane,
  pointer: PlanPointer,
): void {
  const latest = useRef(pointer);
  useEffect(() => {
    latest.current = pointer;
  });

  useEffect(() => {
    const box = map.getContainer();
    const held = new Set<number>();
    let last = { at: -Infinity, px: { x: 0, y: 0 }, clicks: 0 };

    const pxOf = (event: PointerEvent): Px => {
      const { left, top } = box.getBoundingClientRect();
      return { x: event.clientX - left - box.clientLeft, y: event.clientY - top - box.clientTop };
    };
    const typeOf = (event: PointerEvent): PointerType =>
      event.pointerType === 'touch' || event.pointerType === 'pen' ? event.pointerType : 'mouse';

    const factsOf = (event: PointerEvent, finds: boolean) => {
      const { view } = views.getState();
      if (!view) return null;
      const px = pxOf(event);
      const place = view.toPlane(px);
      const at: LonLat = plane.toLonLat(place);
      const kind = typeOf(event);
      return {
        pointerId: event.pointerId,
        pointer: kind,
        at,
        px,
        under: finds ? latest.current.find(place, view.metresPerPx, kind) : null,
        metresPerPx: view.metresPerPx,
        fine: event.shiftKey,
      };
    };

    const clicksAt = (event: PointerEvent, px: Px): number => {
      const near = Math.hypot(px.x - last.px.x, px.y - last.px.y) <= DOUBLE_PX;
      const again = near && event.timeStamp - last.at <= DOUBLE_MS;
      last = { at: event.timeStamp, px, clicks: again ? last.clicks + 1 : 1 };
      return last.clicks;
    };

    const onDown = (event: PointerEvent): void => {
      if (event.pointerType === 'mouse' && event.button !== 0) return;
      const facts = factsOf(event, true);
      if (!facts) return;
      const taken = latest.current.send({
        type: 'down',
        clicks: clicksAt(event, facts.px),
        ...facts,
      });
      // Also when Leaflet pans: else a mouse let go outside the plan would seem pressed for ever.
      box.setPointerCapture(event.pointerId);
      if (!taken) return;
      held.add(event.pointerId);
      event.stopImmediatePropagation();
    };
    const onMove = (event: PointerEvent): void => {
      const hovering = event.buttons === 0 && event.pointerType === 'mouse';
      const facts = factsOf(event, hovering);
      if (!facts) return;
      if (hovering) latest.current.onHover(facts.under);
      latest.current.send({ type: 'move', ...facts });
      if (held.has(event.pointerId)) event.stopImmediatePropagation();
    };
    const onUp = (event: PointerEvent): void => {
      const facts = factsOf(event, false);
      if (facts) latest.current.send({ type: 'up', ...facts });
      if (held.has(event.pointerId)) event.stopImmediatePropagation();
      // The mouse and touch events that belong to this press come right after it.
      const { pointerId } = event;
      setTimeout(() => held.delete(pointerId), 0);
    };
    const onLost =
      (type: 'cancel' | 'lost-capture') =>
      (event: PointerEvent): void => {
        latest.current.send({ type, pointerId: event.pointerId });
        held.delete(event.pointerId);
      };
    const onLeave = (event: PointerEvent): void => {
      latest.current.onHover(null);
      latest.current.send({ type: 'leave', pointerId: event.pointerId });
    };
    const keepFromLeaflet = (event: Event): void => {
      if (held.size > 0) event.stopImmediatePropagation();
    };

    const onCancel = onLost('cancel');
    const onLostCapture = onLost('lost-capture');
    const early = { capture: true };
    box.addEventListener('pointerdown', onDown, early);
    box.addEventListener('pointermove', onMove, early);
    box.addEventListener('pointerup', onUp, early);
    box.addEventListener('pointercancel', onCancel, early);
    box.addEventListener('lostpointercapture', onLostCapture, early);
    box.addEventListener('pointerleave', onLeave);
    box.addEventListener('mousedown', keepFromLeaflet, early);
    box.addEventListener('touchstart', keepFromLeaflet, early);
    // From here on the drawing answers: what was fetched before is what a reader waits for.
    performance.mark(ANSWERS);
    return () => {
      box.removeEventListener('pointerdown', onDown, early);
      box.removeEventListener('pointermove', onMove, early);
      box.removeEventListener('pointerup', onUp, early);
      box.removeEventListener('pointercancel', onCancel, early);
      box.removeEventListener('lostpointercapture', onLostCapture, early);
      box.removeEventListener('pointerleave', onLeave);
      box.removeEventListener('mousedown', keepFromLeaflet, early);
      box.removeEventListener('touchstart', keepFromLeaflet, early);
    };
  }, [map, views, plane]);
}
