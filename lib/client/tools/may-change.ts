import { findPiece, isSiteKind, type Kind, type Sheet } from '../../layout';
import type { Scene } from './types';

/** Whether the reader may change pieces of the kind: the layout's own, or the site's ground. */
export const mayChangeKind = (scene: Scene, kind: Kind): boolean =>
  isSiteKind(kind) ? scene.canChangeSite : scene.canDraw;

export function mayChange(scene: Scene, id: string): boolean {
  const piece = findPiece(scene.sheet, id);
  return piece !== null && mayChangeKind(scene, piece.kind);
}

/** The lines and areas that are drawn corner by corner. */
export const cornersOf = (sheet: Sheet, id: string): boolean => {
  const piece = findPiece(sheet, id);
  return piece !== null && !('at' in piece);
};
