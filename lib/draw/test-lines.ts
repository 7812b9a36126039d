import { testLineOf, type TestLine } from '../checks/support/test-line';
import { systemsInUse } from '../layout';
import type { Frame } from './frame';
import { line, stroke } from './marks';
import type { Group } from './types';

/** The systems that have rods, each with its probes as far as drawn. */
export const testLines = ({ sheet: { layout } }: Frame): TestLine[] =>
  systemsInUse(layout)
    .map((system) => testLineOf(layout, system))
    .filter((test) => test.centre !== null);

/** From each system's centre to its Z: what a tape along the ground must follow. */
export function drawTestLines(tests: readonly TestLine[]): Group[] {
  const lines = tests.flatMap(({ centre, z }) => (centre && z ? [[centre, z.at]] : []));
  if (lines.length === 0) return [];
  return [
    {
      id: '~test-lines',
      layer: 'run',
      marks: [line(lines, stroke('ink-soft', 1.25, { dash: [12, 4, 1.5, 4] }))],
    },
  ];
}
