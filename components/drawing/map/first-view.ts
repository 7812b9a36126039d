import { feetToMetres, type LonLat } from '@/lib/geo';
import { planeOf, positionsOf, type Kind, type Sheet } from '@/lib/layout';

/** Ground shown round the origin of a drawing that is still empty. */
const EMPTY_REACH_FT = 120;

/** What reaches far round everything and would make the rest small. */
const WIDE: readonly Kind[] = ['warm-zone', 'note'];

/** What a drawing opens on: what the layout holds, or the ground round the origin of an empty one. */
export function placesToShow(sheet: Sheet): LonLat[] {
  const drawn = sheet.layout.pieces.filter(({ kind }) => !WIDE.includes(kind)).flatMap(positionsOf);
  if (drawn.length > 1) return drawn;
  const plane = planeOf(sheet.layout);
  const reach = feetToMetres(EMPTY_REACH_FT);
  return [
    plane.toLonLat({ x: -reach, y: -reach }),
    plane.toLonLat({ x: reach, y: reach }),
    ...drawn,
  ];
}
