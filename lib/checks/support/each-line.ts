import { SYSTEMS, systemsInUse, type Layout } from '../../layout';
import type { Finding } from '../types';
import { answer, type Rule } from './answer';
import { testLineOf, type TestLine } from './test-line';
import { NOT_IN_USE } from './words';

/** One finding for each system's test line; a system that is not in use does not apply. */
export function forEachLine(
  layout: Layout,
  rule: Rule,
  judge: (line: TestLine) => Finding,
): Finding[] {
  const inUse = systemsInUse(layout);
  return SYSTEMS.map((system) =>
    inUse.includes(system)
      ? judge(testLineOf(layout, system))
      : answer(rule, [system], 'n/a', NOT_IN_USE),
  );
}

/** Something of the line that the rule needs is not drawn. */
export const lineNotDrawn = (rule: Rule, line: TestLine, lacks: string | null): Finding =>
  answer(
    rule,
    [line.system],
    'not-known',
    `System ${line.system} has ${lacks ?? 'no test line'} to measure`,
    { missing: ['test-line'] },
  );
