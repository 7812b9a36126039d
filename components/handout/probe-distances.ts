import { testLineOf } from '@/lib/checks/support/test-line';
import type { LengthUnit } from '@/lib/draw';
import { metresToFeet } from '@/lib/geo';
import { systemsInUse, type Layout } from '@/lib/layout';

/** How far Z and Y stand from each system's centre, in one line each: "50.5  51.0  50.5". */
export function probeDistances(
  layout: Layout,
  units: LengthUnit,
): { readonly systems: string; readonly z: string; readonly y: string } {
  const systems = systemsInUse(layout);
  const lines = systems.map((system) => testLineOf(layout, system));
  const words = (probe: { metres: number } | null): string =>
    probe ? (units === 'ft' ? metresToFeet(probe.metres) : probe.metres).toFixed(1) : '–';
  return {
    systems: systems.join(', '),
    z: lines.map((line) => words(line.z)).join('  '),
    y: lines.map((line) => words(line.y)).join('  '),
  };
}
