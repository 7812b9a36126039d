import { KIND_WORDS, pieceWords } from '../../edits';
import { distance, metresToFeet, type LonLat } from '../../geo';
import { findPiece, placeKey, planeOf, type Kind, type Run } from '../../layout';
import { isRunKind, startWords, whereItFits } from './run-ends';
import { placePoint, putDownAt } from './place-tool';
import { NEAR_PX } from './threshold';
import type { Outline, Scene, Step, ToolState } from './types';

/** A corner put down, by pointer or by crosshair, or the end of the outline asked for. */
export type Spot = {
  readonly at: LonLat;
  readonly metresPerPx: number;
  /** The piece pressed or focused, where one was. */
  readonly on: string | null;
};

const EMPTY: Outline = { corners: [], startsOn: null };

/** Adds a corner to what is in hand, or finishes it where the press says that it is done. */
export function putCorner(state: ToolState, scene: Scene, kind: Kind, spot: Spot): Step {
  if (isRunKind(kind)) return putRunCorner(state, scene, kind, spot);
  if (placeKey(kind) === 'at') return placePoint(state, scene, spot.at);
  const outline = state.outline ?? EMPTY;
  if (closes(scene, kind, outline, spot)) return finish(state, scene);
  return withCorner(state, outline, spot.at);
}

function withCorner(state: ToolState, outline: Outline, at: LonLat): Step {
  const corners = [...outline.corners, at];
  return {
    state: { ...state, outline: { ...outline, corners }, crosshairMoved: false },
    announce: `Corner ${corners.length}`,
    taken: true,
  };
}

/** A press on the last corner ends a line or area, and one on its first closes an area. */
function closes(scene: Scene, kind: Kind, { corners }: Outline, spot: Spot): boolean {
  const near = (corner: LonLat | undefined): boolean =>
    corner !== undefined && isNear(scene, corner, spot);
  const closable = placeKey(kind) === 'rings' && corners.length >= 3;
  return near(corners.at(-1)) || (closable && near(corners[0]));
}

function isNear(scene: Scene, corner: LonLat, { at, metresPerPx }: Spot): boolean {
  const plane = planeOf(scene.sheet.layout);
  return distance(plane.toPlane(corner), plane.toPlane(at)) <= (NEAR_PX / 2) * metresPerPx;
}

/**
 * Puts the outline on the sheet. An area of one corner is a circle of the size its kind is drawn;
 * otherwise a line takes two corners and an area three.
 */
export function finish(state: ToolState, scene: Scene): Step {
  const { inHand } = scene;
  const corners = state.outline?.corners ?? [];
  if (!inHand || corners.length === 0) return { state };
  if (isRunKind(inHand.kind)) {
    return { state, announce: 'Choose the piece where it ends.', taken: true };
  }
  const area = placeKey(inHand.kind) === 'rings';
  if (corners.length < (area ? 3 : 2) && !(area && corners.length === 1)) {
    const needed = area ? 'An area needs three corners.' : 'A line needs two ends.';
    return { state, announce: needed, taken: true };
  }
  return putDownAt(state, scene, { places: corners });
}

/** Takes back the last corner; null where there is none. */
export function takeBack(state: ToolState): Step | null {
  const { outline } = state;
  if (!outline) return null;
  const corners = outline.corners.slice(0, -1);
  return {
    state: { ...state, outline: corners.length > 0 ? { ...outline, corners } : null },
    announce: corners.length > 0 ? `${corners.length} left` : 'Begun again',
    taken: true,
  };
}

/** A circle round the place pressed, as far as the pointer was dragged. */
export function putCircle(state: ToolState, scene: Scene, centre: LonLat, edge: LonLat): Step {
  return putDownAt(state, scene, { places: [centre], radiusFt: radiusFt(scene, centre, edge) });
}

export function radiusFt(scene: Scene, centre: LonLat, edge: LonLat): number {
  const plane = planeOf(scene.sheet.layout);
  const feet = metresToFeet(distance(plane.toPlane(centre), plane.toPlane(edge)));
  return Math.round(feet * 10) / 10;
}

function putRunCorner(state: ToolState, scene: Scene, kind: Run['kind'], spot: Spot): Step {
  const { outline } = state;
  const start = outline?.startsOn ? findPiece(scene.sheet, outline.startsOn) : null;
  const target = whereItFits(scene, kind, start, spot);
  if (!outline || !start) {
    if (!target)
      return { state: { ...state, outline: null }, announce: startWords(kind), taken: true };
    return {
      state: {
        ...state,
        outline: { corners: [spot.at], startsOn: target.id },
        crosshairMoved: false,
      },
      announce: `From ${pieceWords(target)}. Choose where it ends.`,
      taken: true,
    };
  }
  if (target) {
    return putDownAt(state, scene, {
      places: [...outline.corners, spot.at],
      ends: [start.id, target.id],
    });
  }
  if (kind !== 'jumper') return withCorner(state, outline, spot.at);
  return { state, announce: `A ${KIND_WORDS[kind]} runs straight to another rod.`, taken: true };
}
