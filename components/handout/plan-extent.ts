import type { Bounds } from '@/lib/draw';
import { boundsOf } from '@/lib/draw';
import { feetToMetres, type LocalPlane, type Vec } from '@/lib/geo';
import { footprintOf, isUnit, placesOf, type Piece, type Sheet } from '@/lib/layout';

/** A fixed point this near to the layout is worth a smaller scale: tapes start there. */
const FIXED_POINT_WITHIN_FT = 40;

/** Ground that a reader needs: all that is placed, and the fixed points close to it. */
export function planExtent(sheet: Sheet, plane: LocalPlane): Bounds {
  const origin: Vec = { x: 0, y: 0 };
  const placed = boundsOf(
    sheet.layout.pieces.filter(isPlaced).flatMap((piece) => groundOf(plane, piece)),
  ) ?? { min: origin, max: origin };
  const near = feetToMetres(FIXED_POINT_WITHIN_FT);
  const fixed = sheet.site.features
    .filter((feature) => feature.kind === 'fixed-point')
    .flatMap((feature) => groundOf(plane, feature))
    .filter(
      ({ x, y }) =>
        x > placed.min.x - near &&
        x < placed.max.x + near &&
        y > placed.min.y - near &&
        y < placed.max.y + near,
    );
  return boundsOf([placed.min, placed.max, ...fixed]) ?? placed;
}

/** The warm zone may run off the sheet; nobody has to find it with a tape. */
const isPlaced = ({ kind }: Piece): boolean => kind !== 'warm-zone' && kind !== 'note';

const groundOf = (plane: LocalPlane, piece: Piece): readonly Vec[] =>
  isUnit(piece) ? footprintOf(plane, piece) : placesOf(plane, piece).flat();

export function piecesBeyond(sheet: Sheet, plane: LocalPlane, seen: Bounds): Piece[] {
  return sheet.layout.pieces
    .filter(isPlaced)
    .filter((piece) =>
      groundOf(plane, piece).some(
        ({ x, y }) => x < seen.min.x || x > seen.max.x || y < seen.min.y || y > seen.max.y,
      ),
    );
}
