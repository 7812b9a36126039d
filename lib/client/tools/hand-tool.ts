import { placeKey } from '../../layout';
import { mayChangeKind } from './may-change';
import { finish, putCircle, putCorner } from './outline-tool';
import { isRunKind } from './run-ends';
import { hasWandered } from './threshold';
import type { InHand } from '../in-hand';
import type { PointerEvent, Press, Scene, Step, ToolState } from './types';

/**
 * With something in hand a click puts it down, or a corner of it; a drag pans the map as ever.
 * Two drags are taken from the map: an area's first, which draws a circle, and one that starts on
 * a piece with a run in hand, which leads the run to where it is let go.
 */
export function handTool(
  state: ToolState,
  event: PointerEvent,
  scene: Scene,
  inHand: InHand,
): Step {
  if (event.type === 'down') return pressed(state, event, inHand);
  const { press } = state;
  if (!press || press.pointerId !== event.pointerId) {
    return { state: { ...state, cursor: event.at } };
  }
  if (event.type === 'move') {
    const dragging = press.dragging || hasWandered(press.fromPx, event);
    return {
      state: { ...state, cursor: event.at, press: { ...press, dragging } },
      taken: press.held,
    };
  }
  const lifted: ToolState = { ...state, press: null };
  if (press.dead) return { state: lifted };
  if (!mayChangeKind(scene, inHand.kind)) {
    return { state: lifted, announce: 'You may look at this drawing but not change it.' };
  }
  if (!press.dragging) return clicked(lifted, press, event, scene, inHand);
  return press.held ? dropped(lifted, press, event, scene, inHand) : { state: lifted };
}

function pressed(state: ToolState, event: PointerEvent & { type: 'down' }, inHand: InHand): Step {
  const circle = placeKey(inHand.kind) === 'rings' && state.outline === null;
  const lead = isRunKind(inHand.kind) && event.under?.type === 'piece';
  const press: Press = {
    pointerId: event.pointerId,
    from: event.at,
    fromPx: event.px,
    under: event.under,
    clicks: event.clicks,
    dragging: false,
    held: circle || lead,
    dead: false,
  };
  return {
    state: { ...state, press, cursor: event.at, crosshair: null },
    taken: press.held,
  };
}

function clicked(
  state: ToolState,
  press: Press,
  event: PointerEvent,
  scene: Scene,
  { kind }: InHand,
): Step {
  // The first press of a double click put the corner down; the second only ends the outline.
  if (press.clicks > 1 && state.outline && !isRunKind(kind)) return finish(state, scene);
  return putCorner(state, scene, kind, spotOf(press, event));
}

function dropped(
  state: ToolState,
  press: Press,
  event: PointerEvent,
  scene: Scene,
  { kind }: InHand,
): Step {
  if (!isRunKind(kind)) return putCircle(state, scene, press.from, event.at);
  const started = state.outline
    ? { state }
    : putCorner(state, scene, kind, { ...spotOf(press, event), at: press.from });
  if (!started.state.outline) return started;
  const { metresPerPx } = event;
  return putCorner(started.state, scene, kind, { at: event.at, metresPerPx, on: null });
}

const spotOf = (press: Press, { at, metresPerPx }: PointerEvent) => ({
  at,
  metresPerPx,
  on: press.under?.type === 'piece' ? press.under.id : null,
});
