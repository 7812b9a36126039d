import { LIMIT_TABLE } from '../limits';
import { planeOf, type Layout } from '../layout';
import { answer, atMost, measured } from './support/answer';
import { betterPlaceRemedy } from './support/better-place';
import { noSources, sourcesOf, worstAngleTo, type Sources } from './support/sources';
import { subjectsOf, type DrawnSubject } from './support/subjects';
import { readWind, type WindReading } from './support/wind';
import { NOT_IN_USE, capital, degrees, degreesBeside } from './support/words';
import type { Check, CheckInput, Finding, Status } from './types';

const rule = { id: 'upwind', gate: 'deviation', backing: LIMIT_TABLE.upwind_max_deg } as const;

type Blowing = Extract<WindReading, { kind: 'blowing' }>;

export const upwind: Check = {
  ...rule,
  question: 'Is everything in the right place?',
  title: 'Upwind of every source',
  check(input) {
    const { layout, limits } = input;
    const wind = readWind(layout, limits);
    const sources = sourcesOf(layout);
    return upwindSubjects(layout).map((subject) => {
      if (subject.kind === 'undrawn') {
        return answer(rule, [subject.id], 'not-known', `${capital(subject.name)} is not drawn`);
      }
      if (subject.outOfUse) return answer(rule, [subject.id], 'n/a', NOT_IN_USE);
      if (wind.kind === 'not-known') {
        return answer(
          rule,
          [subject.id],
          'not-known',
          'Wind direction, speed or swing is not entered',
          {
            missing: ['wind'],
          },
        );
      }
      if (noSources(sources)) {
        return answer(rule, [subject.id], 'not-known', 'No release point or pool is drawn', {
          missing: ['source'],
        });
      }
      if (wind.kind === 'calm') {
        return answer(rule, [subject.id], 'caution', 'Calm: nowhere is upwind, vapour pools');
      }
      return judge(input, subject, sources, wind);
    });
  },
};

export const upwindSubjects = (layout: Layout) =>
  subjectsOf(layout, ['rod', 'z-probe', 'y-probe', 'tester'], ['P', 'R']);

function judge(input: CheckInput, subject: DrawnSubject, sources: Sources, wind: Blowing): Finding {
  const { layout, limits } = input;
  const most = limits.values.upwind_max_deg;
  const angleFrom = worstAngleTo(planeOf(layout), sources, wind.fromDeg);
  const angle = angleFrom(subject.at);
  const status: Status =
    angle + wind.swingDeg <= most
      ? 'meets'
      : angle <= most || subject.role === 'probe'
        ? 'caution'
        : 'not-met';
  const allowed = most - wind.swingDeg;
  return answer(
    rule,
    [subject.id],
    status,
    `${capital(subject.name)} stands ${status === 'meets' ? degrees(angle) : degreesBeside(allowed, angle)} off the wind, at most ${degrees(allowed)} with its swing of ${degrees(wind.swingDeg)}`,
    {
      measured: measured(angle, 'deg'),
      allowed: atMost(allowed, 'deg'),
      remedy:
        status === 'meets' || subject.role === 'probe'
          ? null
          : betterPlaceRemedy(input, subject, (at) => angleFrom(at) + wind.swingDeg <= most),
    },
  );
}
