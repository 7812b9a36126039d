import { feetToMetres, type LonLat } from '@/lib/geo';
import { planeOf, positionsOf, type Sheet } from '@/lib/layout';

/** Ground shown round the origin of a drawing that is still empty. */
const EMPTY_REACH_FT = 120;

/** What a drawing opens on: everything the layout holds; of an empty one, the ground round it. */
export function placesToShow(sheet: Sheet): LonLat[] {
  const drawn = sheet.layout.pieces.flatMap(positionsOf);
  if (drawn.length > 1) return drawn;
  const plane = planeOf(sheet.layout);
  const reach = feetToMetres(EMPTY_REACH_FT);
  return [
    plane.toLonLat({ x: -reach, y: -reach }),
    plane.toLonLat({ x: reach, y: reach }),
    ...drawn,
  ];
}
