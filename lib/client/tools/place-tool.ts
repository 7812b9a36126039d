import { bring, describe, EditError, type EditOf, type Wanted } from '../../edits';
import type { LonLat } from '../../geo';
import { isUnit } from '../../layout';
import type { Scene, Step, ToolState } from './types';

/** Puts down what is in hand, with what it brings; it stays in hand unless there can be only one. */
export function putDownAt(
  state: ToolState,
  scene: Scene,
  wanted: Pick<Wanted, 'places' | 'ends' | 'radiusFt'>,
): Step {
  const { inHand, sheet, newId, limits } = scene;
  if (!inHand) return { state };
  const edit = tried(() =>
    bring(sheet, { kind: inHand.kind, members: inHand.members, ...wanted }, { newId, limits }),
  );
  if (edit instanceof EditError) return { state, announce: edit.message, taken: true };
  const piece = edit.pieces[0]!;
  const label = describe(sheet, edit);
  const brought = edit.pieces.length - 1;
  return {
    state: { ...state, outline: null, crosshairMoved: false },
    edits: [edit],
    label,
    select: piece.id,
    announce: brought > 0 ? `${label}, with ${brought} more that belong to it` : label,
    ...(isUnit(piece) && { putDown: true }),
    taken: true,
  };
}

export const placePoint = (state: ToolState, scene: Scene, at: LonLat): Step =>
  putDownAt(state, scene, { places: [at] });

/** Not everything in hand can be put anywhere; what the edit refuses is said, not thrown. */
function tried(work: () => EditOf<'place'>): EditOf<'place'> | EditError {
  try {
    return work();
  } catch (error) {
    if (error instanceof EditError) return error;
    throw error;
  }
}
