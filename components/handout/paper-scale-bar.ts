import type { LengthUnit, Scale } from '@/lib/draw';
import { feetToMetres } from '@/lib/geo';

/** A bar in four even parts: its whole length in words' units, and on the paper. */
export type PaperBar = { readonly length: number; readonly mm: number };

const ROUND = [1, 2, 4, 5, 8] as const;

/** The longest round bar that is at most `mostMm` long at that scale. */
export function paperBar({ ratio }: Scale, units: LengthUnit, mostMm: number): PaperBar {
  const mmEach = ((units === 'ft' ? feetToMetres(1) : 1) * 1000) / ratio;
  const most = mostMm / mmEach;
  const power = 10 ** Math.floor(Math.log10(most));
  const length = (ROUND.findLast((n) => n * power <= most * (1 + 1e-9)) ?? 1) * power;
  return { length, mm: length * mmEach };
}
