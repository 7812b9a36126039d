import { metresToFeet } from '../../geo';
import type { PieceOf, Rod, Sheet } from '../../layout';
import { jumperReachFt } from './from-kit';
import { runBetween } from './run-between';
import { joinedRods, nearestRod } from './system-piece';
import { limitsOf, type Means } from './wanted';

/**
 * A jumper from the rod to the nearest joined rod of its system; null where there is none, or
 * none that the kit's longest jumper reaches. Without a kit no length is known to fall short.
 */
export function jumperFor(sheet: Sheet, rod: Rod, means: Means): PieceOf<'jumper'> | null {
  const others = joinedRods(sheet.layout, rod.system).filter((other) => other.id !== rod.id);
  const near = nearestRod(sheet.layout, others, rod.at);
  const reach = jumperReachFt(sheet.layout, limitsOf(means).cable_slack_pct);
  if (!near || (reach !== null && metresToFeet(near.metres) > reach)) return null;
  return runBetween(sheet, { id: means.newId(), kind: 'jumper', ends: [near.rod, rod] });
}
