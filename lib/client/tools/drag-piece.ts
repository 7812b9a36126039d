import { anchorOf, type Edit } from '../../edits';
import { compassWord, distance, metresToFeet, type LonLat } from '../../geo';
import { findPiece, isRun, planeOf } from '../../layout';
import { mayChange } from './may-change';
import type { Scene } from './types';

/**
 * True where a drag that starts on the piece moves it. Points go at once; lines and areas only
 * when selected before, since most presses on them mean to pan the map.
 */
export function canDrag(scene: Scene, id: string): boolean {
  const piece = findPiece(scene.sheet, id);
  if (!piece || isRun(piece) || !mayChange(scene, id)) return false;
  return 'at' in piece || scene.selection === id;
}

/** Moves the piece as far as the pointer went, wherever on the piece it was taken. */
export function dragPiece(scene: Scene, id: string, from: LonLat, to: LonLat): Edit | null {
  const piece = findPiece(scene.sheet, id);
  if (!piece) return null;
  const plane = planeOf(scene.sheet.layout);
  const [a, b, anchor] = [from, to, anchorOf(piece)].map((place) => plane.toPlane(place));
  if (!a || !b || !anchor) return null;
  const moved = plane.toLonLat({ x: anchor.x + b.x - a.x, y: anchor.y + b.y - a.y });
  return { type: 'move', moves: [{ id, to: moved }] };
}

/** "1.4 ft south-east", for what is said at the end of a drag. */
export function wayWords(scene: Scene, from: LonLat, to: LonLat): string {
  const plane = planeOf(scene.sheet.layout);
  const [a, b] = [plane.toPlane(from), plane.toPlane(to)];
  const feet = metresToFeet(distance(a, b)).toFixed(1);
  return `${feet} ft ${compassWord(plane.bearing(a, b))}`;
}
