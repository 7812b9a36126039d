import {
  compassWord,
  distance,
  feetToMetres,
  metresToFeet,
  quantise,
  type LocalPlane,
  type Vec,
} from '../../geo';
import type { Remedy } from '../types';
import { capital } from './words';

/** How far a remedy looks for a better place; farther is a new arrangement, not a remedy. */
const FARTHEST_FT = 100;
const FIRST_STEP_FT = 1;
/** Beyond 20 ft the rings widen: nobody minds whether it is 61 or 64 ft. */
const WIDENING = 0.05;
const BEARINGS = 24;

const RINGS_METRES = ringsOutwards();

function ringsOutwards(): number[] {
  const rings: number[] = [];
  for (let ft = FIRST_STEP_FT; ft <= FARTHEST_FT; ft += Math.max(FIRST_STEP_FT, ft * WIDENING)) {
    rings.push(feetToMetres(ft));
  }
  return rings;
}

const WAYS = Array.from({ length: BEARINGS }, (_, i) => {
  const turn = (i * 2 * Math.PI) / BEARINGS;
  return { x: Math.sin(turn), y: Math.cos(turn) };
});

/**
 * The nearest place to `from` where `ok` holds: of `tries`, else in rings outwards. Null if there
 * is none. The place is also `ok` as it will be stored, so a remedy offered clears its finding.
 */
export function nearestPlace(
  plane: LocalPlane,
  from: Vec,
  ok: (at: Vec) => boolean,
  tries: readonly Vec[] = [],
): Vec | null {
  const holds = (at: Vec): boolean => ok(at) && ok(asStored(plane, at));
  const near = tries.filter(holds).sort((a, b) => distance(from, a) - distance(from, b))[0];
  if (near) return near;
  for (const ring of RINGS_METRES) {
    for (const way of WAYS) {
      const at = { x: from.x + ring * way.x, y: from.y + ring * way.y };
      if (holds(at)) return at;
    }
  }
  return null;
}

export const asStored = (plane: LocalPlane, at: Vec): Vec =>
  plane.toPlane(quantise(plane.toLonLat(at)));

/** "Move R2 1.4 ft south-east" as an edit; null where there is nowhere to go. */
export function moveRemedy(
  plane: LocalPlane,
  piece: { readonly id: string; readonly name: string },
  from: Vec,
  to: Vec | null,
): Remedy | null {
  if (!to) return null;
  const far = Math.max(0.1, metresToFeet(distance(from, to)));
  const way = compassWord(plane.bearing(from, to));
  return {
    type: 'move',
    moves: [{ id: piece.id, to: quantise(plane.toLonLat(to)) }],
    words: `${capital(`move ${piece.name}`)} ${far.toFixed(1)} ft ${way}`,
  };
}
