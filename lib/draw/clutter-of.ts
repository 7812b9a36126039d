import type { Vec } from '../geo';
import { Clutter } from './clutter';
import type { Frame } from './frame';
import { boundsOf } from './paper';
import { textWidth } from './text-width';
import type { Group, Hit, Mark } from './types';

/**
 * What words must keep off: symbols, outlines and lines of `groups`, and words of the ground
 * under them. The lines of the ground itself may be crossed; a halo keeps the word legible.
 */
export function clutterOf(
  frame: Frame,
  groups: readonly Group[],
  ground: readonly Group[],
): Clutter {
  const clutter = new Clutter(frame);
  for (const { hit, layer, marks } of groups) {
    if (hit?.type === 'spot') clutter.addSpot(hit.at, hit.radiusPx);
    if (hit?.type === 'lines') hit.lines.forEach((path) => clutter.addPath(path));
    if (hit?.type === 'area') hit.rings.forEach((ring) => clutter.addPath(ring));
    for (const mark of marks) {
      addWords(clutter, mark);
      // A zone's edge is to stay whole to the eye, teeth and all.
      if (layer === 'zone' && mark.type === 'path') mark.lines.forEach((l) => clutter.addPath(l));
    }
  }
  const near = nearTo(frame, groups);
  for (const { hit, marks } of ground) {
    if (hit?.type === 'spot' && near(hit.at)) clutter.addSpot(hit.at, hit.radiusPx);
    for (const mark of marks) if (mark.type === 'text' && near(mark.at)) addWords(clutter, mark);
  }
  return clutter;
}

/** Labels never stand farther from the layout's pieces than this. */
const NEAR_PX = 260;

/** Whether a place lies close enough to the layout to matter; a site may have thousands of words. */
function nearTo(frame: Frame, groups: readonly Group[]): (place: Vec) => boolean {
  const bounds = boundsOf(groups.flatMap(({ hit }) => (hit ? placesOf(hit) : [])));
  const reach = frame.metres(NEAR_PX);
  return ({ x, y }) =>
    bounds !== null &&
    x > bounds.min.x - reach &&
    x < bounds.max.x + reach &&
    y > bounds.min.y - reach &&
    y < bounds.max.y + reach;
}

function placesOf(hit: Hit): readonly Vec[] {
  if (hit.type === 'spot') return [hit.at];
  return (hit.type === 'lines' ? hit.lines : hit.rings).flat();
}

export function addWords(clutter: Clutter, mark: Mark): void {
  if (mark.type === 'text') {
    const at = clutter.toPx(mark.at);
    clutter.addTurned(
      { x: at.x + mark.offset.x, y: at.y + mark.offset.y },
      textWidth(mark.text, mark.size, mark.weight),
      mark.size,
      mark.turnDeg,
    );
  }
  if (mark.type === 'letters') {
    for (const { at } of mark.letters) clutter.addSpot(at, mark.size / 2);
  }
}
