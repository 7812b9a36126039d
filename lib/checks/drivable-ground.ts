import { insideArea } from '../geo';
import { OUR_DEFAULT } from '../limits';
import { piecesOf, placesOf, planeOf } from '../layout';
import { answer } from './support/answer';
import { betterPlaceRemedy } from './support/better-place';
import { subjectsOf } from './support/subjects';
import { capital } from './support/words';
import type { Check } from './types';

const rule = { id: 'drivable-ground', gate: 'deviation', backing: OUR_DEFAULT } as const;

export const drivableGround: Check = {
  ...rule,
  question: 'Is everything in the right place?',
  title: 'Ground that a rod can be driven into',
  check(input) {
    const { layout, site } = input;
    const plane = planeOf(layout);
    const areas = piecesOf(site.features, 'no-drive').map((area) => ({
      rings: placesOf(plane, area),
      surface: area.surface ?? 'no-drive ground',
    }));
    const subjects = subjectsOf(layout, ['rod', 'z-probe', 'y-probe'], []);
    if (subjects.length === 0) return [answer(rule, [], 'n/a', 'No rod or probe drawn')];
    return subjects.flatMap((subject) => {
      if (subject.kind === 'undrawn') return [];
      if (areas.length === 0) {
        return [answer(rule, [subject.id], 'n/a', 'No no-drive ground is drawn')];
      }
      const under = areas.find(({ rings }) => insideArea(subject.at, rings));
      if (!under) {
        return [
          answer(
            rule,
            [subject.id],
            'meets',
            `${capital(subject.name)} is clear of no-drive ground`,
          ),
        ];
      }
      return [
        answer(
          rule,
          [subject.id],
          subject.role === 'probe' ? 'caution' : 'not-met',
          `${capital(subject.name)} stands on ${under.surface}`,
          {
            remedy: betterPlaceRemedy(
              input,
              subject,
              (at) => !areas.some(({ rings }) => insideArea(at, rings)),
            ),
          },
        ),
      ];
    });
  },
};
