import { distance, METRES_PER_MILE, type LocalPlane, type LonLat } from '../geo';
import { isSiteKind, type Piece } from './pieces';
import { placesOf } from './plan';
import { positionsOf } from './queries';

/** Farther from the origin a place is a slip of the hand or of a sign. */
export const FARTHEST_MILES = 5;

/**
 * Miles from the origin that count against a piece: its farthest place, or for a line of the site,
 * which may come from far away, its nearest. Infinite on the far side of the world.
 */
export function milesAway(plane: LocalPlane, piece: Piece): number {
  const positions = positionsOf(piece);
  const away = placesOf(plane, piece)
    .flat()
    .map((place, i) =>
      // Beyond the horizon the plane folds back on itself, and only the way back tells.
      near(plane.toLonLat(place), positions[i]!)
        ? distance(place, { x: 0, y: 0 }) / METRES_PER_MILE
        : Infinity,
    );
  return isSiteKind(piece.kind) ? Math.min(...away) : Math.max(...away);
}

const WITHIN_DEGREES = 1e-6;

const near = (a: LonLat, b: LonLat): boolean =>
  Math.abs(a[1] - b[1]) < WITHIN_DEGREES &&
  Math.abs(((a[0] - b[0] + 540) % 360) - 180) < WITHIN_DEGREES;
