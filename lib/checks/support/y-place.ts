import type { Vec } from '../../geo';
import { nameOf, planeOf, type Layout } from '../../layout';
import type { Remedy } from '../types';
import { moveRemedy, nearestPlace } from './move';
import type { TestLine } from './test-line';

/** The place on the way from the system to Z at `part` of the whole. */
export function onLine(line: TestLine, part: number): Vec {
  const [from, to] = [line.centre!, line.z!.at];
  return { x: from.x + (to.x - from.x) * part, y: from.y + (to.y - from.y) * part };
}

/**
 * Moves Y onto the line at one of `parts`, the first of them that clears the finding; else to the
 * nearest place that does.
 */
export function moveY(
  layout: Layout,
  line: TestLine,
  ok: (y: Vec) => boolean,
  parts: readonly number[],
): Remedy | null {
  if (!line.y || !line.z || !line.centre || line.z.metres === 0) return null;
  const plane = planeOf(layout);
  const { probe, at } = line.y;
  const places = parts.map((part) => onLine(line, part));
  const to = places.find((place) => nearestPlace(plane, at, ok, [place]) === place);
  return moveRemedy(
    plane,
    { id: probe.id, name: nameOf(probe) },
    at,
    to ?? nearestPlace(plane, at, ok),
  );
}
