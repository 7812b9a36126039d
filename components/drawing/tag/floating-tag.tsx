'use client';

import { useLayoutEffect, useRef } from 'react';
import type { Px } from '@/lib/draw';
import { useDrawing } from '@/lib/client/use-drawing';
import {
  findPiece,
  isUnit,
  footprintOf,
  placesOf,
  planeOf,
  type Piece,
  type Sheet,
} from '@/lib/layout';
import type { PlanView } from '../map/plan-view';
import { useViewStore } from '../map/view-store';
import { seatTag, type Box } from './seat-tag';
import { StakeTag } from './stake-tag';

/** Kept free at the foot of the plan for the caution. */
const FOOT_PX = 34;
/** A piece is at least this large to look at, px each way. */
const HALF_PX = 16;

/** The stake tag beside the selected piece; away while a hand moves or is about to place something. */
export function FloatingTag() {
  const box = useRef<HTMLDivElement>(null);
  const views = useViewStore();
  const sheet = useDrawing((state) => state.sheet);
  const selection = useDrawing((state) => state.selection);
  const busy = useDrawing((state) => state.preview !== null || state.inHand !== null);
  const piece = selection === null ? null : findPiece(sheet, selection);

  useLayoutEffect(() => {
    const element = box.current;
    if (!element || !piece) return;
    const seat = (): void => {
      const { view } = views.getState();
      if (!view) return;
      const size = { x: element.offsetWidth, y: element.offsetHeight };
      const at = seatTag(
        boxOf(view, sheet, piece),
        size,
        view.size,
        othersOf(view, sheet, piece),
        FOOT_PX,
      );
      element.style.transform = `translate(${Math.round(at.x)}px, ${Math.round(at.y)}px)`;
    };
    seat();
    const resized = new ResizeObserver(seat);
    resized.observe(element);
    const unsubscribe = views.subscribe(seat);
    return () => {
      resized.disconnect();
      unsubscribe();
    };
  }, [views, sheet, piece]);

  if (!piece) return null;
  return (
    <div
      ref={box}
      hidden={busy}
      className="absolute left-0 top-0 z-[470] max-h-[calc(100%-3.5rem)] w-[17.5rem] max-w-[calc(100%-1rem)] overflow-y-auto border-[1.5px] border-ink bg-margin px-3 py-2"
    >
      <StakeTag key={piece.id} id={piece.id} />
    </div>
  );
}

function boxOf(view: PlanView, sheet: Sheet, piece: Piece): Box {
  const plane = planeOf(sheet.layout);
  const places = isUnit(piece) ? [footprintOf(plane, piece)] : placesOf(plane, piece);
  const px = places.flat().map((v) => view.toPx(v));
  const [xs, ys] = [px.map((p) => p.x), px.map((p) => p.y)];
  return {
    left: Math.min(...xs) - HALF_PX,
    top: Math.min(...ys) - HALF_PX,
    right: Math.max(...xs) + HALF_PX,
    bottom: Math.max(...ys) + HALF_PX,
  };
}

function othersOf(view: PlanView, sheet: Sheet, piece: Piece): Px[] {
  const plane = planeOf(sheet.layout);
  return sheet.layout.pieces
    .filter((other) => other.id !== piece.id && 'at' in other)
    .flatMap((other) => placesOf(plane, other).flat())
    .map((v) => view.toPx(v));
}
