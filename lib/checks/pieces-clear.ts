import { footprintsOverlap, insideFootprint } from '../geo';
import { OUR_DEFAULT } from '../limits';
import { footprintOf, nameOf, piecesOf, placeOf, planeOf, systemsInUse, unitOf } from '../layout';
import { answer, atMost, measured } from './support/answer';
import { capital } from './support/words';
import type { Check } from './types';

const rule = { id: 'pieces-clear', gate: 'deviation', backing: OUR_DEFAULT } as const;
const MOST_OVERLAPS = 0;

export const piecesClear: Check = {
  ...rule,
  question: 'Are the systems complete?',
  title: 'Nothing stands on anything else',
  check({ layout }) {
    const plane = planeOf(layout);
    const units = systemsInUse(layout).flatMap((system) => unitOf(layout, system) ?? []);
    const rods = piecesOf(layout.pieces, 'rod');
    if (units.length === 0) {
      return [answer(rule, [], 'n/a', 'No vehicle or pump drawn to stand on')];
    }
    const overlaps = units.flatMap((unit, i) => {
      const ring = footprintOf(plane, unit);
      const under = [
        ...units.slice(i + 1).filter((other) => footprintsOverlap(ring, footprintOf(plane, other))),
        ...rods.filter((rod) => insideFootprint(placeOf(plane, rod), ring)),
      ];
      return under.map((piece) => `${nameOf(piece)} and the ${nameOf(unit)}`);
    });
    const clear = overlaps.length <= MOST_OVERLAPS;
    return [
      answer(
        rule,
        [],
        clear ? 'meets' : 'not-met',
        clear
          ? 'No two footprints overlap and no rod stands inside one'
          : `${capital(overlaps.join('; '))} overlap`,
        { measured: measured(overlaps.length, 'count'), allowed: atMost(MOST_OVERLAPS, 'count') },
      ),
    ];
  },
};
