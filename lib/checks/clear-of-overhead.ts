import { insideFootprint, metresToFeet, nearestOnPath, pathToPath, type Vec } from '../geo';
import { OVERHEAD_CLEARANCE, overheadClearanceFeet } from '../limits';
import { nameOf, piecesOf, placesOf, planeOf, type PieceOf } from '../layout';
import { answer, atLeast, measured } from './support/answer';
import { betterPlaceRemedy } from './support/better-place';
import { shapeAt, subjectsOf, type Subject } from './support/subjects';
import { NOT_IN_USE, capital, feet, feetBeside } from './support/words';
import type { Check, CheckInput, Finding } from './types';

const rule = { id: 'clear-of-overhead', gate: 'deviation', backing: OVERHEAD_CLEARANCE } as const;

export const clearOfOverhead: Check = {
  ...rule,
  question: 'What is under and over us?',
  title: 'Clear of overhead lines',
  check(input) {
    const { layout, site } = input;
    const lines = piecesOf(site.features, 'overhead-line');
    if (lines.length === 0) {
      return [
        site.overhead_none_known_as_of
          ? answer(rule, [], 'n/a', 'No overhead line is known here')
          : answer(rule, [], 'not-known', 'Overhead lines: nobody has said that there are none', {
              missing: ['overhead'],
            }),
      ];
    }
    const subjects = subjectsOf(layout, ['rod'], ['C', 'R', 'P']);
    return subjects.flatMap((subject) => lines.map((line) => judge(input, subject, line)));
  },
};

function judge(input: CheckInput, subject: Subject, line: PieceOf<'overhead-line'>): Finding {
  const about = [subject.id, line.id];
  if (subject.kind === 'undrawn') {
    return answer(rule, about, 'not-known', `${capital(subject.name)} is not drawn`);
  }
  if (subject.outOfUse) return answer(rule, about, 'n/a', NOT_IN_USE);
  const least = line.volts === undefined ? null : overheadClearanceFeet(line.volts);
  const plane = planeOf(input.layout);
  const path = placesOf(plane, line)[0]!;
  const feetFrom = (at: Vec): number => {
    const shape = shapeAt(subject, at);
    if ('x' in shape) return metresToFeet(nearestOnPath(shape, path).metres);
    return path.some((v) => insideFootprint(v, shape)) ? 0 : metresToFeet(pathToPath(shape, path));
  };
  const clear = feetFrom(subject.at);
  if (least === null) {
    return answer(
      rule,
      about,
      'not-known',
      line.volts === undefined
        ? `The voltage of ${nameOf(line)} is not entered; drawn at ${OVERHEAD_CLEARANCE.unknownDrawnFeet} ft`
        : `${nameOf(line)} is above the table: ask its owner what to keep`,
      { measured: measured(clear, 'ft'), missing: ['voltage'] },
    );
  }
  const meets = clear >= least;
  return answer(
    rule,
    about,
    meets ? 'meets' : 'not-met',
    `${capital(subject.name)} is ${meets ? feet(clear) : feetBeside(least, clear)} from ${nameOf(line)}, at least ${feet(least)}`,
    {
      measured: measured(clear, 'ft'),
      allowed: atLeast(least, 'ft'),
      remedy: meets ? null : betterPlaceRemedy(input, subject, (at) => feetFrom(at) >= least),
    },
  );
}
