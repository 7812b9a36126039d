import { beyondArea, footprintBeyondArea, metresToFeet, type Area, type Vec } from '../geo';
import { COMMON_PRACTICE } from '../limits';
import { piecesOf, placesOf, planeOf, type Layout } from '../layout';
import { answer, atLeast, measured } from './support/answer';
import { betterPlaceRemedy } from './support/better-place';
import { shapeAt, subjectsOf, type DrawnSubject } from './support/subjects';
import { NOT_IN_USE, capital, feet, feetBeside } from './support/words';
import type { Check, CheckInput, Finding } from './types';

const rule = { id: 'outside-hot-zone', gate: 'deviation', backing: COMMON_PRACTICE } as const;

export const outsideHotZone: Check = {
  ...rule,
  question: 'Is everything in the right place?',
  title: 'Outside the hot zone',
  check(input) {
    const { layout, limits } = input;
    const setback = limits.values.zone_setback_ft;
    const zones = hotZones(layout);
    return subjectsOf(layout, ['rod', 'z-probe', 'y-probe', 'tester'], ['P', 'R']).map(
      (subject) => {
        const gate = sparks(layout, subject.id) ? 'stop' : 'deviation';
        if (subject.kind === 'undrawn') {
          return answer(rule, [subject.id], 'not-known', `${capital(subject.name)} is not drawn`, {
            gate,
          });
        }
        if (subject.outOfUse) return answer(rule, [subject.id], 'n/a', NOT_IN_USE, { gate });
        if (zones.length === 0) {
          return answer(rule, [subject.id], 'not-known', 'No hot zone is drawn', {
            gate,
            missing: ['hot-zone'],
          });
        }
        return judge(input, subject, zones, setback, gate);
      },
    );
  },
};

/** The tester and the pump can spark: inside the zone nothing excuses them. */
function sparks(layout: Layout, id: string): boolean {
  if (id === 'P') return true;
  const kind = layout.pieces.find((piece) => piece.id === id)?.kind;
  return kind === 'tester' || kind === 'pump';
}

export const hotZones = (layout: Layout): Area[] =>
  piecesOf(layout.pieces, 'hot-zone').map((zone) => placesOf(planeOf(layout), zone));

function judge(
  input: CheckInput,
  subject: DrawnSubject,
  zones: readonly Area[],
  setback: number,
  gate: Finding['gate'],
): Finding {
  const beyondFrom = (at: Vec): { feet: number; inside: boolean } => {
    const shape = shapeAt(subject, at);
    const each = zones.map((zone) =>
      'x' in shape ? beyondArea(shape, zone) : footprintBeyondArea(shape, zone),
    );
    const least = Math.min(...each);
    return { feet: metresToFeet(least), inside: least <= 0 };
  };
  const beyond = beyondFrom(subject.at);
  const status = beyond.inside ? 'not-met' : beyond.feet < setback ? 'caution' : 'meets';
  const name = capital(subject.name);
  return answer(
    rule,
    [subject.id],
    status,
    beyond.inside
      ? `${name} is inside the hot zone, ${feetBeside(0, -beyond.feet)} from its edge`
      : `${name} is ${status === 'meets' ? feet(beyond.feet) : feetBeside(setback, beyond.feet)} beyond the hot zone, at least ${feet(setback)}`,
    {
      gate,
      measured: measured(beyond.feet, 'ft'),
      allowed: atLeast(setback, 'ft'),
      remedy:
        status === 'meets'
          ? null
          : betterPlaceRemedy(input, subject, (at) => beyondFrom(at).feet >= setback),
    },
  );
}
