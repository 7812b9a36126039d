import { mayJoin, type Edit, type End } from '../../edits';
import { distance, footprintToPoint, type LonLat } from '../../geo';
import {
  findPiece,
  footprintOf,
  isRun,
  isUnit,
  placeOf,
  planeOf,
  type Piece,
  type Run,
} from '../../layout';
import { NEAR_PX } from './threshold';
import type { Scene } from './types';

/** The piece at a place that a run's end may be led to: the nearest within a finger's reach. */
export function targetAt(
  scene: Scene,
  fits: (piece: Piece) => boolean,
  at: LonLat,
  metresPerPx: number,
): Piece | null {
  const plane = planeOf(scene.sheet.layout);
  const place = plane.toPlane(at);
  const within = scene.sheet.layout.pieces.flatMap((piece) => {
    if (!('at' in piece) || !fits(piece)) return [];
    const metres = isUnit(piece)
      ? footprintToPoint(footprintOf(plane, piece), place)
      : distance(placeOf(plane, piece), place);
    return metres <= NEAR_PX * metresPerPx ? [{ piece, metres, large: isUnit(piece) }] : [];
  });
  // A rod beside a vehicle must stay in reach: under one finger the smaller thing wins.
  within.sort((a, b) => Number(a.large) - Number(b.large) || a.metres - b.metres);
  return within[0]?.piece ?? null;
}

/** Leads an end to the piece under the pointer, or slides its clamp along the unit it is on. */
export function leadEnd(
  scene: Scene,
  { id, end }: { readonly id: string; readonly end: End },
  to: LonLat,
  metresPerPx: number,
): readonly Edit[] | null {
  const run = findPiece(scene.sheet, id);
  if (!run || !isRun(run)) return null;
  const other = end === 'from' ? run.to : run.from;
  const fits = (piece: Piece) => mayJoin(run.kind, end, piece) && piece.id !== other;
  const target = targetAt(scene, fits, to, metresPerPx);
  if (!target) return null;
  const join: readonly Edit[] =
    target.id === run[end] ? [] : [{ type: 'join', id, end, piece: target.id }];
  const slide = isUnit(target) ? [slideTo(run, end, to)] : [];
  const edits = [...join, ...slide];
  return edits.length > 0 ? edits : null;
}

const slideTo = (run: Run, end: End, to: LonLat): Edit => ({
  type: 'reshape',
  id: run.id,
  part: 0,
  vertex: end === 'from' ? 0 : run.path.length - 1,
  to,
});
