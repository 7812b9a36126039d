import { metresToFeet, type Ring, type Vec } from '../../geo';
import type { System } from '../../layout';
import type { CheckInput, Finding, Missing } from '../types';
import { answer, atLeast, measured, type Rule } from './answer';
import { betterPlaceRemedy } from './better-place';
import { shapeAt, subjectsOf } from './subjects';
import { NOT_IN_USE, capital, feet, feetBeside } from './words';

type Clearance = {
  readonly rule: Rule;
  readonly input: CheckInput;
  readonly units: readonly System[];
  /** Metres from a place or footprint to what must be kept clear of; null when that isn't drawn. */
  readonly metresTo: ((shape: Vec | Ring) => number) | null;
  readonly leastFt: number;
  /** "the nearest source" */
  readonly what: string;
  readonly notDrawn: { readonly words: string; readonly missing: Missing };
};

/** Whatever can spark, kept a distance from where vapour is: the tester and the units named. */
export function keptClear(clearance: Clearance): Finding[] {
  const { rule, input, units, metresTo, leastFt, what, notDrawn } = clearance;
  const { layout } = input;
  const subjects = subjectsOf(layout, ['tester'], units);
  if (subjects.length === 0) return [answer(rule, [], 'n/a', 'No tester and no pump drawn')];
  return subjects.map((subject) => {
    if (subject.kind === 'undrawn') {
      return answer(rule, [subject.id], 'not-known', `${capital(subject.name)} is not drawn`);
    }
    if (subject.outOfUse) return answer(rule, [subject.id], 'n/a', NOT_IN_USE);
    if (!metresTo) {
      return answer(rule, [subject.id], 'not-known', notDrawn.words, {
        missing: [notDrawn.missing],
      });
    }
    const feetFrom = (at: Vec): number => metresToFeet(metresTo(shapeAt(subject, at)));
    const clear = feetFrom(subject.at);
    const meets = clear >= leastFt;
    return answer(
      rule,
      [subject.id],
      meets ? 'meets' : 'not-met',
      `${capital(subject.name)} is ${meets ? feet(clear) : feetBeside(leastFt, clear)} from ${what}, at least ${feet(leastFt)}`,
      {
        measured: measured(clear, 'ft'),
        allowed: atLeast(leastFt, 'ft'),
        remedy: meets ? null : betterPlaceRemedy(input, subject, (at) => feetFrom(at) >= leastFt),
      },
    );
  });
}
