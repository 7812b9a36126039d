import type { Edit } from '../../edits';
import { distance, normaliseDegrees, type LonLat } from '../../geo';
import { findPiece, isUnit, placeOf, planeOf } from '../../layout';
import { leadEnd } from './lead-end';
import type { Scene, Under } from './types';

/** Nearer to a unit's centre than this the pointer says nothing about where its front is. */
const NO_DIRECTION_METRES = 0.05;

type Handle = Exclude<Under, null | { type: 'piece' }>;

export const isHandle = (under: Under): under is Handle => under !== null && under.type !== 'piece';

/** What dragging a handle to a place does; null where that place asks for nothing. */
export function dragHandle(
  scene: Scene,
  handle: Handle,
  to: LonLat,
  { fine, metresPerPx }: { readonly fine: boolean; readonly metresPerPx: number },
): readonly Edit[] | null {
  switch (handle.type) {
    case 'vertex':
    case 'middle':
      return [
        {
          type: 'reshape',
          id: handle.id,
          part: handle.part,
          vertex: handle.vertex,
          to,
          ...(handle.type === 'middle' && { insert: true }),
        },
      ];
    case 'turn':
      return turnTowards(scene, handle.id, to, fine);
    case 'end':
      return leadEnd(scene, handle, to, metresPerPx);
  }
}

/** Turns the unit's front to the pointer, to whole degrees, or to tenths with Shift. */
function turnTowards(scene: Scene, id: string, to: LonLat, fine: boolean): readonly Edit[] | null {
  const unit = findPiece(scene.sheet, id);
  if (!unit || !isUnit(unit)) return null;
  const plane = planeOf(scene.sheet.layout);
  const [centre, place] = [placeOf(plane, unit), plane.toPlane(to)];
  if (distance(centre, place) < NO_DIRECTION_METRES) return null;
  const perDegree = fine ? 10 : 1;
  const heading = Math.round(plane.bearing(centre, place) * perDegree) / perDegree;
  return [{ type: 'turn', id, heading_deg: normaliseDegrees(heading) }];
}
