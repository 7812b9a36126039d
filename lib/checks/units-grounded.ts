import { distance } from '../geo';
import { COMMON_PRACTICE } from '../limits';
import {
  piecesOf,
  placeOf,
  planeOf,
  rodsOf,
  SYSTEMS,
  systemsInUse,
  unitOf,
  type Layout,
  type System,
} from '../layout';
import { answer, atLeast, measured } from './support/answer';
import { freshIds, runBetween } from './support/place';
import { capital, NOT_IN_USE, systemWords, unitWords } from './support/words';
import type { Check, Remedy } from './types';

const rule = { id: 'units-grounded', gate: 'stop', backing: COMMON_PRACTICE } as const;
const LEAST_CABLES = 1;

export const unitsGrounded: Check = {
  ...rule,
  question: 'Are the systems complete?',
  title: 'Each unit grounded to its own system',
  check({ layout, site }) {
    const fresh = freshIds({ layout, site });
    return SYSTEMS.map((system) => {
      if (!systemsInUse(layout).includes(system)) return answer(rule, [system], 'n/a', NOT_IN_USE);
      const unit = unitOf(layout, system);
      const own = new Set(rodsOf(layout, system).map((rod) => rod.id));
      const count = piecesOf(layout.pieces, 'ground-cable').filter(
        (cable) => cable.from === unit?.id && own.has(cable.to),
      ).length;
      const grounded = count >= LEAST_CABLES;
      return answer(
        rule,
        [system],
        grounded ? 'meets' : 'not-met',
        words(system, !!unit, grounded),
        {
          measured: measured(count, 'count'),
          allowed: atLeast(LEAST_CABLES, 'count'),
          remedy: grounded ? null : cableTo(layout, system, fresh),
        },
      );
    });
  },
};

function words(system: System, drawn: boolean, grounded: boolean): string {
  if (!drawn) return `${capital(unitWords(system))} is not drawn, so nothing grounds it`;
  return grounded
    ? `A ground cable runs from ${unitWords(system)} to ${systemWords(system)}`
    : `No ground cable runs from ${unitWords(system)} to a rod of ${systemWords(system)}`;
}

function cableTo(layout: Layout, system: System, fresh: (stem: string) => string): Remedy | null {
  const unit = unitOf(layout, system);
  const rods = rodsOf(layout, system);
  if (!unit || rods.length === 0) return null;
  const plane = planeOf(layout);
  const far = (rod: (typeof rods)[number]): number =>
    distance(placeOf(plane, unit), placeOf(plane, rod));
  const rod = rods.reduce((best, other) => (far(other) < far(best) ? other : best));
  return {
    type: 'place',
    pieces: [runBetween(layout, 'ground-cable', fresh('ground-cable'), unit, rod)],
    words: `Ground ${unitWords(system)} to ${systemWords(system)}`,
  };
}
