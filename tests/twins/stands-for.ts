import type { CheckInput, WindArc } from '@/lib/checks';
import { bearing, turnBetween } from './ground';
import { air } from './place';
import { Scene } from './scene';

const STEP = 0.01;

/** Every wind tried, a hundredth of a degree apart: the arc of those that all answer meets. */
export function twinStandsFor({ layout, site, limits, asOf }: CheckInput): WindArc | null {
  const scene = new Scene(layout, site, limits, asOf);
  const { speed, calm, w } = air(scene);
  const pieces = scene.pieces.filter(
    ({ kind }) =>
      kind === 'rod' ||
      kind === 'tester' ||
      kind === 'receiving-vehicle' ||
      (kind === 'pump' && scene.pumpApart),
  );
  const sources = scene.sourcePlaces();
  if (speed === null || calm || w === null || sources.length === 0 || pieces.length === 0)
    return null;
  const directions = pieces.flatMap((piece) =>
    'at' in piece ? sources.map((source) => bearing(source, piece.at)) : [],
  );
  const stands = (wind: number): boolean =>
    directions.every(
      (direction) => turnBetween(direction, wind) + w <= limits.values.upwind_max_deg,
    );
  const winds = Array.from({ length: 360 / STEP }, (_, i) => i * STEP);
  const good = winds.map(stands);
  const from = winds.find((_, i) => good[i] && !good.at(i - 1));
  const to = winds.find((_, i) => good[i] && !good[(i + 1) % good.length]);
  return from === undefined || to === undefined ? null : { from_deg: from, to_deg: to };
}
