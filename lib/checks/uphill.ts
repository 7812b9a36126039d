import { LIMIT_TABLE } from '../limits';
import { planeOf } from '../layout';
import { answer, atMost, measured } from './support/answer';
import { betterPlaceRemedy } from './support/better-place';
import { noSources, sourcesOf, worstAngleTo } from './support/sources';
import { readSlope, wedge } from './support/wind';
import { NOT_IN_USE, capital, degrees, degreesBeside } from './support/words';
import type { Check, Status } from './types';
import { upwindSubjects } from './upwind';

const rule = { id: 'uphill', gate: 'deviation', backing: LIMIT_TABLE.uphill_max_deg } as const;

export const uphill: Check = {
  ...rule,
  question: 'Is everything in the right place?',
  title: 'Uphill of every source',
  check(input) {
    const { layout, limits } = input;
    const plane = planeOf(layout);
    const slope = readSlope(layout, limits);
    const sources = sourcesOf(layout);
    const most = limits.values.uphill_max_deg;
    const width = wedge(layout, limits);
    const windGoverns = width !== null && width < limits.values.wedge_min_deg;
    return upwindSubjects(layout).map((subject) => {
      if (subject.kind === 'piece' && subject.outOfUse) {
        return answer(rule, [subject.id], 'n/a', NOT_IN_USE);
      }
      if (slope.kind === 'level') {
        return answer(rule, [subject.id], 'n/a', 'The ground is level');
      }
      if (subject.kind === 'undrawn') {
        return answer(rule, [subject.id], 'not-known', `${capital(subject.name)} is not drawn`);
      }
      if (slope.kind === 'not-known') {
        return answer(
          rule,
          [subject.id],
          'not-known',
          'Downhill direction or steepness is not entered',
          {
            missing: ['slope'],
          },
        );
      }
      if (noSources(sources)) {
        return answer(rule, [subject.id], 'not-known', 'No release point or pool is drawn', {
          missing: ['source'],
        });
      }
      const angleFrom = worstAngleTo(plane, sources, slope.uphillDeg);
      const angle = angleFrom(subject.at);
      const excused = windGoverns || subject.role === 'probe';
      const status: Status = angle <= most ? 'meets' : excused ? 'caution' : 'not-met';
      const said = `${capital(subject.name)} stands ${status === 'meets' ? degrees(angle) : degreesBeside(most, angle)} off uphill, at most ${degrees(most)}`;
      return answer(
        rule,
        [subject.id],
        status,
        status === 'caution' && windGoverns
          ? `${said}; wind and slope part, the wind governs`
          : said,
        {
          measured: measured(angle, 'deg'),
          allowed: atMost(most, 'deg'),
          remedy:
            status === 'meets' || subject.role === 'probe'
              ? null
              : betterPlaceRemedy(input, subject, (at) => angleFrom(at) <= most),
        },
      );
    });
  },
};
