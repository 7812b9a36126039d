import {
  compassWord,
  distance,
  metresToFeet,
  quantise,
  type LocalPlane,
  type Vec,
} from '../../geo';
import type { Remedy } from '../types';
import { capital } from './words';

/** How far a remedy looks for a better place, and how finely. */
const FARTHEST_METRES = 36;
const STEP_METRES = 0.3048;
const BEARINGS = 36;

/**
 * The nearest place to `from` where `ok` holds, looking in rings outwards: `tries` first, then
 * every 10° at every foot. Null if there is none within 118 ft. `ok` sees the place as it will be
 * stored, so a remedy that is offered clears its finding.
 */
export function nearestPlace(
  plane: LocalPlane,
  from: Vec,
  ok: (at: Vec) => boolean,
  tries: readonly Vec[] = [],
): Vec | null {
  const stored = (at: Vec): Vec => plane.toPlane(quantise(plane.toLonLat(at)));
  const near = tries
    .filter((at) => ok(stored(at)))
    .sort((a, b) => distance(from, a) - distance(from, b))[0];
  if (near) return near;
  for (let ring = STEP_METRES; ring <= FARTHEST_METRES; ring += STEP_METRES) {
    for (let i = 0; i < BEARINGS; i++) {
      const turn = (i * 2 * Math.PI) / BEARINGS;
      const at = { x: from.x + ring * Math.sin(turn), y: from.y + ring * Math.cos(turn) };
      if (ok(stored(at))) return at;
    }
  }
  return null;
}

/** "Move R2 1.4 ft south-east" as an edit; null where there is nowhere to go. */
export function moveRemedy(
  plane: LocalPlane,
  piece: { readonly id: string; readonly name: string },
  from: Vec,
  to: Vec | null,
): Remedy | null {
  if (!to) return null;
  const far = metresToFeet(distance(from, to));
  const way = compassWord(plane.bearing(from, to));
  return {
    type: 'move',
    moves: [{ id: piece.id, to: quantise(plane.toLonLat(to)) }],
    words: `${capital(`move ${piece.name}`)} ${far < 0.1 ? '0.1' : far.toFixed(1)} ft ${way}`,
  };
}
