import { handTool } from './hand-tool';
import { keyTool } from './key-tool';
import { selectTool } from './select-tool';
import {
  IDLE,
  type PointerEvent,
  type Scene,
  type Step,
  type ToolEvent,
  type ToolState,
} from './types';

/**
 * Everything that pointers and keys do on the plan. A second finger during a drag calls the drag
 * off and leaves all fingers to the map until the last is lifted; a pointer lost is a drag called
 * off. Pure: ids of new pieces come from the scene.
 */
export function planTool(state: ToolState, event: ToolEvent, scene: Scene): Step {
  switch (event.type) {
    case 'key':
      return keyTool(state, event, scene);
    case 'cancel':
    case 'lost-capture':
      return lost(state, event.pointerId);
    case 'leave':
      return { state: { ...state, cursor: state.crosshair } };
    case 'down':
      return state.pointers.some((id) => id !== event.pointerId)
        ? pinch(state, event)
        : pointed(state, event, scene);
    case 'move':
      return state.pinching ? { state } : pointed(state, event, scene);
    case 'up':
      return state.pinching ? lost(state, event.pointerId) : pointed(state, event, scene);
  }
}

function pointed(state: ToolState, event: PointerEvent, scene: Scene): Step {
  const pointers =
    event.type === 'down'
      ? [event.pointerId]
      : event.type === 'up'
        ? state.pointers.filter((id) => id !== event.pointerId)
        : state.pointers;
  const now = pointers === state.pointers ? state : { ...state, pointers };
  return scene.inHand ? handTool(now, event, scene, scene.inHand) : selectTool(now, event, scene);
}

/** The press that the second finger interrupts counts for nothing; corners already put down stay. */
function pinch(state: ToolState, { pointerId }: PointerEvent): Step {
  const pointers = [...state.pointers.filter((id) => id !== pointerId), pointerId];
  return {
    state: { ...state, pointers, pinching: true, press: null, cursor: state.crosshair },
    preview: null,
  };
}

/** A pointer that is gone without a word. The capture lost after every lift finds nothing to do. */
function lost(state: ToolState, pointerId: number): Step {
  if (!state.pointers.includes(pointerId)) return { state };
  const pointers = state.pointers.filter((id) => id !== pointerId);
  const pinching = state.pinching && pointers.length > 0;
  if (state.press?.pointerId !== pointerId) return { state: { ...state, pointers, pinching } };
  return { state: { ...state, pointers, pinching, press: null }, preview: null };
}

/** The tool when what is in hand changes: no press or outline of one thing outlives it. */
export const withAnotherInHand = (state: ToolState): ToolState => ({
  ...IDLE,
  pointers: state.pointers,
  pinching: state.pinching,
  keyPresses: state.keyPresses,
  press: state.press && { ...state.press, dead: true },
});
