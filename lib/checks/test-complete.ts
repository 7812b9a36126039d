import { quantise, type Vec } from '../geo';
import { COMMON_PRACTICE, TRUE_POINT_RATIO } from '../limits';
import {
  piecesOf,
  planeOf,
  probeFor,
  SYSTEMS,
  systemsInUse,
  type LayoutPiece,
  type Sheet,
  type System,
} from '../layout';
import { answer, atMost, measured } from './support/answer';
import { freshIds } from './support/place';
import { testLineOf } from './support/test-line';
import { capital, NOT_IN_USE, systemWords } from './support/words';
import { onLine } from './support/y-place';
import type { Check, Remedy } from './types';

const rule = { id: 'test-complete', gate: 'deviation', backing: COMMON_PRACTICE } as const;
/** Beside the rods, within reach of a short lead. */
const TESTER_ASIDE_METRES = 1.2;

export const testComplete: Check = {
  ...rule,
  question: 'Will the test line read true?',
  title: 'Z, Y and tester drawn',
  check({ layout, site }) {
    const tester = piecesOf(layout.pieces, 'tester').length > 0;
    return SYSTEMS.map((system) => {
      if (!systemsInUse(layout).includes(system)) return answer(rule, [system], 'n/a', NOT_IN_USE);
      const lacks = [
        ...(probeFor(layout, 'z-probe', system) ? [] : ['Z']),
        ...(probeFor(layout, 'y-probe', system) ? [] : ['Y']),
        ...(tester ? [] : ['tester']),
      ];
      const complete = lacks.length === 0;
      return answer(
        rule,
        [system],
        complete ? 'meets' : 'not-met',
        complete
          ? `Z, Y and a tester serve ${systemWords(system)}`
          : `No ${lacks.join(', no ')} for ${systemWords(system)}`,
        {
          measured: measured(lacks.length, 'count'),
          allowed: atMost(0, 'count'),
          missing: complete ? [] : ['test-line'],
          remedy: complete ? null : placeMissing({ layout, site }, system, lacks),
        },
      );
    });
  },
};

/** Y at the true point and a tester beside the rods. Where Z goes is the planner's choice. */
function placeMissing(sheet: Sheet, system: System, lacks: readonly string[]): Remedy | null {
  const line = testLineOf(sheet.layout, system);
  if (lacks.includes('Z') || !line.centre || !line.z) return null;
  const fresh = freshIds(sheet);
  const plane = planeOf(sheet.layout);
  const stored = (at: Vec) => quantise(plane.toLonLat(at));
  const pieces: LayoutPiece[] = [];
  if (lacks.includes('Y')) {
    pieces.push({
      id: fresh('y-probe'),
      kind: 'y-probe',
      label: `Y–${system}`,
      serves: [system],
      at: stored(onLine(line, TRUE_POINT_RATIO.value)),
    });
  }
  if (lacks.includes('tester')) {
    const { x, y } = line.centre;
    pieces.push({
      id: fresh('tester'),
      kind: 'tester',
      at: stored({ x: x - TESTER_ASIDE_METRES, y }),
    });
  }
  return {
    type: 'place',
    pieces,
    words: `${capital(`place ${lacks.join(' and ')}`)} for ${systemWords(system)}`,
  };
}
