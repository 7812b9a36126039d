import { describe, type Edit } from '../../edits';
import { feetToMetres, type LonLat } from '../../geo';
import { findPiece, isUnit, planeOf } from '../../layout';
import { editForKey } from '../by-keys';
import { isHandle } from './drag-handle';
import { mayChange, mayChangeKind } from './may-change';
import { finish, putCorner, takeBack } from './outline-tool';
import { isRunKind } from './run-ends';
import type { KeyEvent, Scene, Step, ToolState, Under } from './types';

const ARROWS: Readonly<Record<string, number>> = {
  ArrowUp: 0,
  ArrowRight: 90,
  ArrowDown: 180,
  ArrowLeft: 270,
};

/** Feet a step of the crosshair or a corner is, with Shift and with Ctrl. */
const STEP_FT = { plain: 1, fine: 0.1, far: 10 } as const;

/** Keys on the plan: what is in hand is led by the crosshair, what is selected moves. */
export function keyTool(before: ToolState, event: KeyEvent, scene: Scene): Step {
  const state = event.repeat ? before : { ...before, keyPresses: before.keyPresses + 1 };
  if (event.key === 'Escape') return escaped(state, scene);
  if (state.press?.held && state.press.dragging && !state.press.dead) return { state };
  return scene.inHand ? inHandKey(state, event, scene) : selectionKey(state, event, scene);
}

/** Lets go of one thing at a time: the drag, then the outline, what is in hand, the selection. */
function escaped(state: ToolState, scene: Scene): Step {
  if (state.press && !state.press.dead && state.press.held) {
    return {
      state: { ...state, press: { ...state.press, dead: true } },
      preview: null,
      announce: 'Left as it was',
      taken: true,
    };
  }
  if (state.outline)
    return { state: { ...state, outline: null }, announce: 'Begun again', taken: true };
  if (scene.inHand) {
    return {
      state: { ...state, crosshair: null, cursor: null },
      putDown: true,
      announce: `${scene.inHand.words} put down`,
      taken: true,
    };
  }
  return scene.selection === null ? { state } : { state, select: null, taken: true };
}

function inHandKey(state: ToolState, event: KeyEvent, scene: Scene): Step {
  const { inHand } = scene;
  if (!inHand || !mayChangeKind(scene, inHand.kind)) return { state };
  const bearing = ARROWS[event.key];
  if (bearing !== undefined) {
    const from = state.crosshair ?? event.middleOfView;
    return { state: withCrosshair(state, stepped(scene, from, bearing, event)), taken: true };
  }
  if (event.key === 'Backspace') return takeBack(state) ?? { state };
  if (event.key !== 'Enter' || event.repeat) return { state };
  const on = event.under?.type === 'piece' ? event.under.id : null;
  const focused = on === null ? null : findPiece(scene.sheet, on);
  const picked = isRunKind(inHand.kind) && focused && 'at' in focused ? focused.at : null;
  if (!picked && state.outline && !state.crosshairMoved) return finish(state, scene);
  const at = picked ?? state.crosshair;
  if (!at) {
    return {
      state: withCrosshair(state, event.middleOfView),
      announce: 'Crosshair in the middle of the plan. Arrows move it, Enter puts down.',
      taken: true,
    };
  }
  if (!picked && !state.crosshairMoved) {
    return { state, announce: 'Move the crosshair first.', taken: true };
  }
  const { metresPerPx } = event;
  return putCorner({ ...state, crosshair: at }, scene, inHand.kind, { at, metresPerPx, on });
}

const withCrosshair = (state: ToolState, crosshair: LonLat): ToolState => ({
  ...state,
  crosshair,
  crosshairMoved: true,
  cursor: crosshair,
});

function selectionKey(state: ToolState, event: KeyEvent, scene: Scene): Step {
  const target: Under =
    event.under ?? (scene.selection === null ? null : { type: 'piece', id: scene.selection });
  if (!target || !mayChange(scene, target.id)) return { state };
  const edit = isHandle(target)
    ? handleEdit(target, event, scene)
    : editForKey(scene.sheet, target.id, event.key, event.fine);
  if (!edit) return { state };
  const gone = edit.type === 'remove';
  return {
    state,
    edits: [edit],
    label: describe(scene.sheet, edit),
    ...(gone ? { select: null } : { gesture: `${edit.type} ${target.id} ${state.keyPresses}` }),
    taken: true,
  };
}

/** What a key does to a focused corner, turn handle or run's end; null for none of ours. */
function handleEdit(
  handle: Exclude<Under, null | { type: 'piece' }>,
  event: KeyEvent,
  scene: Scene,
): Edit | null {
  const { sheet } = scene;
  const bearing = ARROWS[event.key];
  const piece = findPiece(sheet, handle.id);
  if (!piece) return null;
  if (handle.type === 'turn') {
    if (!isUnit(piece)) return null;
    const sense = { ArrowLeft: '[', ArrowDown: '[', ArrowRight: ']', ArrowUp: ']' }[event.key];
    return editForKey(sheet, handle.id, sense ?? event.key, event.fine);
  }
  const [part, vertex] =
    handle.type !== 'end'
      ? [handle.part, handle.vertex]
      : [0, handle.end === 'from' || !('path' in piece) ? 0 : piece.path.length - 1];
  const shape = { type: 'reshape', id: handle.id, part, vertex } as const;
  const ring = 'rings' in piece ? piece.rings : 'paths' in piece ? piece.paths : null;
  const corners = (ring ?? ('path' in piece ? [piece.path] : []))[part] ?? [];
  const here = corners[vertex];
  if (handle.type === 'middle') {
    const previous = corners[vertex - 1];
    const isPut = event.key === 'Enter' || event.key === ' ';
    return isPut && previous && here
      ? { ...shape, to: middleOf(scene, previous, here), insert: true }
      : null;
  }
  if (bearing !== undefined && here) return { ...shape, to: stepped(scene, here, bearing, event) };
  const takesOut = event.key === 'Delete' || event.key === 'Backspace';
  return takesOut && handle.type === 'vertex' ? { ...shape, to: null } : null;
}

function middleOf(scene: Scene, one: LonLat, other: LonLat): LonLat {
  const plane = planeOf(scene.sheet.layout);
  const [a, b] = [plane.toPlane(one), plane.toPlane(other)];
  return plane.toLonLat({ x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 });
}

function stepped(scene: Scene, from: LonLat, bearing: number, { fine, far }: KeyEvent): LonLat {
  const plane = planeOf(scene.sheet.layout);
  const feet = fine ? STEP_FT.fine : far ? STEP_FT.far : STEP_FT.plain;
  return plane.toLonLat(plane.offset(plane.toPlane(from), bearing, feetToMetres(feet)));
}
