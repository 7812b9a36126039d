import { Clutter } from './clutter';
import type { Frame } from './frame';
import { textWidth } from './text-width';
import type { Group, Mark } from './types';

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
  for (const { hit, marks } of ground) {
    if (hit?.type === 'spot') clutter.addSpot(hit.at, hit.radiusPx);
    for (const mark of marks) addWords(clutter, mark);
  }
  return clutter;
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
