import { insideFootprint, nearestOnPath, quantise, type LonLat, type Vec } from '../../geo';
import {
  footprintOf,
  isUnit,
  placeOf,
  planeOf,
  type Layout,
  type LayoutPiece,
  type Run,
  type Sheet,
} from '../../layout';

/** Ids for pieces a remedy would place: the first free `stem-n`. Never the same one twice. */
export function freshIds({ layout, site }: Sheet): (stem: string) => string {
  let taken: Set<string> | null = null;
  return (stem) => {
    // Only a remedy that places something needs this, so it is not made before.
    taken ??= new Set([...layout.pieces, ...site.features].map((piece) => piece.id));
    let n = 1;
    while (taken.has(`${stem}-${n}`)) n++;
    const id = `${stem}-${n}`;
    taken.add(id);
    return id;
  };
}

type PointPiece = Extract<LayoutPiece, { at: LonLat }>;

/** A straight run between two pieces; on a unit it ends at the nearest edge of its footprint. */
export function runBetween(
  layout: Layout,
  kind: Extract<Run['kind'], 'jumper' | 'ground-cable' | 'bond-cable'>,
  id: string,
  from: PointPiece,
  to: PointPiece,
): Run {
  const plane = planeOf(layout);
  const end = (piece: PointPiece, toward: PointPiece): Vec => {
    const goal = placeOf(plane, toward);
    if (!isUnit(piece)) return placeOf(plane, piece);
    const ring = footprintOf(plane, piece);
    return insideFootprint(goal, ring) ? placeOf(plane, piece) : nearestOnPath(goal, ring).at;
  };
  const path = [end(from, to), end(to, from)].map((at) => quantise(plane.toLonLat(at)));
  return { id, kind, from: from.id, to: to.id, path };
}
