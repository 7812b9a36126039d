import { METRES_PER_FOOT } from '@/lib/geo';

/** A bar of a round number of feet in four even parts, and how long it is on the screen. */
export type ScaleBarLength = { readonly feet: number; readonly px: number };

const ROUND = [1, 2, 4, 5, 8] as const;

/** The longest round bar that fits; null for a scale that is not one. */
export function scaleBarLength(metresPerPx: number, mostPx: number): ScaleBarLength | null {
  if (!(metresPerPx > 0) || !Number.isFinite(metresPerPx) || !(mostPx > 0)) return null;
  const mostFeet = (mostPx * metresPerPx) / METRES_PER_FOOT;
  const power = 10 ** Math.floor(Math.log10(mostFeet));
  const step = ROUND.findLast((round) => round * power <= mostFeet * (1 + 1e-9)) ?? 1;
  const feet = step * power;
  return { feet, px: (feet * METRES_PER_FOOT) / metresPerPx };
}
