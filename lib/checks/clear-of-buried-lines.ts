import { feetToMetres, metresToFeet, type Vec } from '../geo';
import { BURIED_REPORT_WITHIN_FT, LIMIT_TABLE, type LimitValues } from '../limits';
import { nameOf, planeOf, type BuriedLine, type Layout } from '../layout';
import { CLASS_WORDS } from './buried-lines-known';
import { answer, atLeast, measured } from './support/answer';
import { buriedLines, linesNear, type BuriedLines } from './support/ground-lines';
import { moveRemedy, nearestPlace } from './support/move';
import { subjectsOf, type DrawnSubject } from './support/subjects';
import { capital, feet } from './support/words';
import type { Check, Finding, Gate, Status } from './types';

const rule = {
  id: 'clear-of-buried-lines',
  gate: 'deviation',
  backing: LIMIT_TABLE.buried_tolerance_ft,
} as const;

export const clearOfBuriedLines: Check = {
  ...rule,
  question: 'What is under and over us?',
  title: 'Clear of buried lines',
  check({ layout, site, limits }) {
    const ground = buriedLines(planeOf(layout), site);
    if (ground.lines.length === 0) return [answer(rule, [], 'n/a', 'No buried line is drawn')];
    const subjects = subjectsOf(layout, ['rod', 'z-probe', 'y-probe'], []);
    if (subjects.length === 0) return [answer(rule, [], 'n/a', 'No rod or probe drawn')];
    const within = feetToMetres(BURIED_REPORT_WITHIN_FT.value);
    return subjects.flatMap((subject) =>
      subject.kind === 'undrawn'
        ? []
        : linesNear(ground, subject.at, within).map(({ line, metres }) =>
            judge(layout, ground, limits.values, subject, line, metresToFeet(metres)),
          ),
    );
  },
};

function judge(
  layout: Layout,
  ground: BuriedLines,
  limits: LimitValues,
  subject: DrawnSubject,
  line: BuriedLine,
  clear: number,
): Finding {
  const doubt = doubtFt(line, limits);
  const least = limits.buried_tolerance_ft + doubt;
  const status = statusOf(subject, line, clear, limits);
  const gate: Gate =
    subject.role === 'rod' && deadly(line) && clear < limits.buried_tolerance_ft
      ? 'stop'
      : 'deviation';
  const plane = planeOf(layout);
  // As far as the widest doubt reaches, so that a farther but vaguer line is seen too.
  const reach = feetToMetres(limits.buried_tolerance_ft + widestDoubtFt(limits));
  const clearOfAll = (at: Vec): boolean =>
    linesNear(ground, at, reach).every(
      (near) => statusOf(subject, near.line, metresToFeet(near.metres), limits) === 'meets',
    );
  return answer(
    rule,
    [subject.id, line.id],
    status,
    `${capital(subject.name)} is ${feet(clear)} from ${lineWords(line)}, at least ${feet(least)} with ${feet(doubt)} of doubt`,
    {
      gate,
      measured: measured(clear, 'ft'),
      allowed: atLeast(least, 'ft'),
      remedy:
        status === 'meets'
          ? null
          : moveRemedy(plane, subject, subject.at, nearestPlace(plane, subject.at, clearOfAll)),
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
  const roughly = quality(line) === 'C' || quality(line) === 'D';
  return deadly(line) && roughly ? 'not-met' : 'caution';
}

const quality = (line: BuriedLine): 'A' | 'B' | 'C' | 'D' => line.quality ?? 'D';

const deadly = (line: BuriedLine): boolean =>
  line.utility === 'electric' || line.utility === 'gas-oil-steam';

/** How far the line may be from where it is drawn, by its quality level. */
export function doubtFt(line: BuriedLine, limits: LimitValues): number {
  const byLevel = {
    A: limits.doubt_a_ft,
    B: limits.doubt_b_ft,
    C: limits.doubt_c_ft,
    D: limits.doubt_d_ft,
  };
  return byLevel[quality(line)];
}

const widestDoubtFt = (limits: LimitValues): number =>
  Math.max(limits.doubt_a_ft, limits.doubt_b_ft, limits.doubt_c_ft, limits.doubt_d_ft);

const lineWords = (line: BuriedLine): string =>
  `${CLASS_WORDS[line.utility].toLowerCase()} ${line.label ?? nameOf(line)}`;
