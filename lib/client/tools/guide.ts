import { circleRing } from '../../edits';
import type { LonLat } from '../../geo';
import { findPiece, isRun, placeKey } from '../../layout';
import { radiusFt } from './outline-tool';
import { isRunKind } from './run-ends';
import type { Scene, ToolState } from './types';

/** What to draw while something is being drawn: no piece yet, and never checked. */
export type Guide = {
  /** Corners put down, with the place of the pointer or crosshair at the end. */
  readonly line: readonly LonLat[];
  /** True where the line will close into an area. */
  readonly closed: boolean;
  /** How far a circle being drawn reaches. */
  readonly radiusFt: number | null;
  /** The corners put down, each to be marked. */
  readonly corners: readonly LonLat[];
  readonly crosshair: LonLat | null;
};

export function guideOf(state: ToolState, scene: Scene): Guide | null {
  const { inHand } = scene;
  if (!inHand) return looseEnd(state, scene);
  const { press, cursor, crosshair, outline } = state;
  const area = placeKey(inHand.kind) === 'rings';
  if (press?.held && press.dragging && !press.dead && cursor) {
    if (area) {
      const reach = radiusFt(scene, press.from, cursor);
      const line = circleRing(scene.sheet.layout, press.from, reach);
      return { line, closed: true, radiusFt: reach, corners: [press.from], crosshair };
    }
    if (isRunKind(inHand.kind) && !outline) {
      return { line: [press.from, cursor], closed: false, radiusFt: null, corners: [], crosshair };
    }
  }
  const corners = outline?.corners ?? [];
  if (corners.length === 0 && !crosshair) return null;
  const line = corners.length > 0 && cursor ? [...corners, cursor] : corners;
  return { line, closed: area && line.length > 2, radiusFt: null, corners, crosshair };
}

/** The run's last stretch, drawn to the pointer that has its end. */
function looseEnd({ press, cursor, crosshair }: ToolState, scene: Scene): Guide | null {
  if (press?.under?.type !== 'end' || !press.dragging || press.dead || !cursor) return null;
  const run = findPiece(scene.sheet, press.under.id);
  if (!run || !isRun(run)) return null;
  const neighbour = press.under.end === 'from' ? run.path[1]! : run.path.at(-2)!;
  return { line: [neighbour, cursor], closed: false, radiusFt: null, corners: [], crosshair };
}
