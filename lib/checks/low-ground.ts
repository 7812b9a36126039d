import { footprintMeetsArea, insideArea, type Area, type Vec } from '../geo';
import { OUR_DEFAULT } from '../limits';
import { piecesOf, placesOf, planeOf } from '../layout';
import { answer } from './support/answer';
import { betterPlaceRemedy } from './support/better-place';
import { shapeAt, subjectsOf, type DrawnSubject } from './support/subjects';
import { capital, NOT_IN_USE } from './support/words';
import type { Check } from './types';

const rule = { id: 'low-ground', gate: 'ack', backing: OUR_DEFAULT } as const;

/** Vapour heavier than air gathers in ditches, drains and hollows. */
export const lowGround: Check = {
  ...rule,
  question: 'Is everything in the right place?',
  title: 'Out of low ground',
  check(input) {
    const { layout, site } = input;
    const plane = planeOf(layout);
    const hollows = piecesOf(site.features, 'low-ground').map((area) => placesOf(plane, area));
    return subjectsOf(layout, ['rod', 'tester'], ['P', 'R']).map((subject) => {
      if (hollows.length === 0) {
        return answer(rule, [subject.id], 'n/a', 'No low ground is drawn');
      }
      if (subject.kind === 'undrawn') {
        return answer(rule, [subject.id], 'not-known', `${capital(subject.name)} is not drawn`);
      }
      if (subject.outOfUse) return answer(rule, [subject.id], 'n/a', NOT_IN_USE);
      const low = (at: Vec): boolean => hollows.some((hollow) => standsIn(subject, at, hollow));
      if (!low(subject.at)) {
        return answer(rule, [subject.id], 'meets', `${capital(subject.name)} is out of low ground`);
      }
      return answer(
        rule,
        [subject.id],
        'caution',
        `${capital(subject.name)} stands in low ground, where vapour gathers`,
        {
          remedy: betterPlaceRemedy(input, subject, (at) => !low(at)),
        },
      );
    });
  },
};

function standsIn(subject: DrawnSubject, at: Vec, hollow: Area): boolean {
  const shape = shapeAt(subject, at);
  return 'x' in shape ? insideArea(shape, hollow) : footprintMeetsArea(shape, hollow);
}
