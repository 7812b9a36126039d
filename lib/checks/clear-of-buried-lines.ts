import { feetToMetres, metresToFeet } from '../geo';
import { BURIED_REPORT_WITHIN_FT, LIMIT_TABLE, type LimitValues } from '../limits';
import { nameOf, planeOf, type BuriedLine } from '../layout';
import { CLASS_WORDS } from './buried-lines-known';
import { answer, atLeast, measured } from './support/answer';
import { betterPlaceRemedy } from './support/better-place';
import { buriedLines, clearOfLines, doubtFt, linesNear, qualityOf } from './support/ground-lines';
import { subjectsOf, type DrawnSubject } from './support/subjects';
import { capital, feet, feetBeside } from './support/words';
import type { Check, CheckInput, Finding, Gate, Status } from './types';

const rule = {
  id: 'clear-of-buried-lines',
  gate: 'deviation',
  backing: LIMIT_TABLE.buried_tolerance_ft,
} as const;

export const clearOfBuriedLines: Check = {
  ...rule,
  question: 'What is under and over us?',
  title: 'Clear of buried lines',
  check(input) {
    const { layout, site } = input;
    const ground = buriedLines(planeOf(layout), site);
    if (ground.lines.length === 0) return [answer(rule, [], 'n/a', 'No buried line is drawn')];
    const subjects = subjectsOf(layout, ['rod', 'z-probe', 'y-probe'], []);
    if (subjects.length === 0) return [answer(rule, [], 'n/a', 'No rod or probe drawn')];
    const within = feetToMetres(BURIED_REPORT_WITHIN_FT.value);
    return subjects.flatMap((subject) =>
      subject.kind === 'undrawn'
        ? []
        : linesNear(ground, subject.at, within).map(({ line, metres }) =>
            judge(input, subject, line, metresToFeet(metres)),
          ),
    );
  },
};

function judge(input: CheckInput, subject: DrawnSubject, line: BuriedLine, clear: number): Finding {
  const limits = input.limits.values;
  const doubt = doubtFt(line, limits);
  const least = limits.buried_tolerance_ft + doubt;
  const status = statusOf(subject, line, clear, limits);
  const gate: Gate =
    subject.role === 'rod' && deadly(line) && clear < limits.buried_tolerance_ft
      ? 'stop'
      : 'deviation';
  return answer(
    rule,
    [subject.id, line.id],
    status,
    `${capital(subject.name)} is ${status === 'meets' ? feet(clear) : feetBeside(least, clear)} from ${lineWords(line)}, at least ${feet(least)} with ${feet(doubt)} of doubt`,
    {
      gate,
      measured: measured(clear, 'ft'),
      allowed: atLeast(least, 'ft'),
      remedy:
        status === 'meets'
          ? null
          : betterPlaceRemedy(input, subject, (at) =>
              clearOfLines(planeOf(input.layout), input.site, limits, at),
            ),
    },
  );
}

function statusOf(
  subject: DrawnSubject,
  line: BuriedLine,
  clear: number,
  limits: LimitValues,
): Status {
  const tolerance = limits.buried_tolerance_ft;
  if (clear >= tolerance + doubtFt(line, limits)) return 'meets';
  // A probe is pushed in by hand and felt; a rod is driven blind.
  if (subject.role === 'probe') return 'caution';
  if (clear < tolerance) return 'not-met';
  const roughly = qualityOf(line) === 'C' || qualityOf(line) === 'D';
  return deadly(line) && roughly ? 'not-met' : 'caution';
}

const deadly = (line: BuriedLine): boolean =>
  line.utility === 'electric' || line.utility === 'gas-oil-steam';

const lineWords = (line: BuriedLine): string =>
  `${CLASS_WORDS[line.utility].toLowerCase()} ${line.label ?? nameOf(line)}`;
