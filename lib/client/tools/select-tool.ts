import { describe, KIND_WORDS, pieceWords, type Edit } from '../../edits';
import { findPiece, isRun } from '../../layout';
import { canDrag, dragPiece, wayWords } from './drag-piece';
import { dragHandle, isHandle } from './drag-handle';
import { mayChange } from './may-change';
import { hasWandered } from './threshold';
import type { PointerEvent, Press, Scene, Step, ToolState, Under } from './types';

/**
 * With nothing in hand a press selects, and a drag moves what was pressed. The press is taken from
 * the map at once when it may become a drag; elsewhere the map pans and a click deselects.
 */
export function selectTool(state: ToolState, event: PointerEvent, scene: Scene): Step {
  if (event.type === 'down') return pressed(state, event, scene);
  const { press } = state;
  if (!press || press.pointerId !== event.pointerId) return { state };
  if (event.type === 'move') return press.dead ? { state } : moved(state, press, event, scene);
  if (press.dead) return ended(state, null, {});
  return press.dragging ? dropped(state, press, event, scene) : clicked(state, press, scene);
}

function pressed(state: ToolState, event: PointerEvent & { type: 'down' }, scene: Scene): Step {
  const { under } = event;
  const held =
    under !== null && (isHandle(under) ? mayChange(scene, under.id) : canDrag(scene, under.id));
  const press: Press = {
    pointerId: event.pointerId,
    from: event.at,
    fromPx: event.px,
    under,
    clicks: event.clicks,
    dragging: false,
    held,
    dead: false,
  };
  return { state: { ...state, press }, taken: held };
}

function moved(state: ToolState, press: Press, event: PointerEvent, scene: Scene): Step {
  if (!press.dragging && !hasWandered(press.fromPx, event)) return { state, taken: press.held };
  const dragging: ToolState = { ...state, press: { ...press, dragging: true } };
  if (!press.held) return { state: dragging };
  const begun = press.dragging || !press.under ? {} : { select: press.under.id };
  return {
    state: { ...dragging, cursor: event.at },
    preview: changes(press, event, scene),
    taken: true,
    ...begun,
  };
}

function dropped(state: ToolState, press: Press, event: PointerEvent, scene: Scene): Step {
  if (!press.held) return ended(state, null, {});
  const edits = changes(press, event, scene);
  const announce = edits ? dropWords(press, event, scene) : nothingThere(press, scene);
  return ended(state, null, {
    preview: null,
    taken: true,
    ...(edits && { edits, label: describe(scene.sheet, edits[0]!) }),
    ...(announce !== null && { announce }),
  });
}

function clicked(state: ToolState, press: Press, scene: Scene): Step {
  const { under } = press;
  if (!under) return ended(state, under, scene.selection === null ? {} : { select: null });
  if (under.type === 'piece') return ended(state, under, { select: under.id, taken: press.held });
  const edit = press.held ? clickOnHandle(press, state.lastClick) : null;
  return ended(state, edit ? null : under, {
    taken: press.held,
    ...(edit && { edits: [edit], label: describe(scene.sheet, edit) }),
  });
}

/** A click between two corners puts one there; a double click on a corner takes it out. */
function clickOnHandle({ under, from, clicks }: Press, last: Under): Edit | null {
  if (under?.type === 'middle') {
    const { id, part, vertex } = under;
    return { type: 'reshape', id, part, vertex, to: from, insert: true };
  }
  if (under?.type === 'vertex' && clicks === 2 && isSameCorner(under, last)) {
    const { id, part, vertex } = under;
    return { type: 'reshape', id, part, vertex, to: null };
  }
  return null;
}

const isSameCorner = (one: Under & { type: 'vertex' }, other: Under): boolean =>
  other?.type === 'vertex' &&
  other.id === one.id &&
  other.part === one.part &&
  other.vertex === one.vertex;

function changes(press: Press, event: PointerEvent, scene: Scene): readonly Edit[] | null {
  const { under } = press;
  if (!under) return null;
  if (isHandle(under)) return dragHandle(scene, under, event.at, event);
  const edit = dragPiece(scene, under.id, press.from, event.at);
  return edit && [edit];
}

function dropWords({ under, from }: Press, event: PointerEvent, scene: Scene): string | null {
  const piece = under && findPiece(scene.sheet, under.id);
  if (!piece || under.type !== 'piece') return null;
  return `${pieceWords(piece)} moved ${wayWords(scene, from, event.at)}`;
}

function nothingThere({ under }: Press, scene: Scene): string | null {
  const piece = under && findPiece(scene.sheet, under.id);
  return piece && isRun(piece)
    ? `Nothing there that a ${KIND_WORDS[piece.kind]} can be led to. It stays where it was.`
    : null;
}

const ended = (state: ToolState, lastClick: Under, step: Omit<Step, 'state'>): Step => ({
  state: { ...state, press: null, lastClick, cursor: null },
  ...step,
});
