import { COMMON_PRACTICE } from '../limits';
import { isUnit, nameOf, piecesOf, systemOfUnit, type Layout, type System } from '../layout';
import { answer, atMost, measured } from './support/answer';
import { pieceById } from './support/runs';
import { capital } from './support/words';
import type { Check } from './types';

const rule = { id: 'cables-separate', gate: 'deviation', backing: COMMON_PRACTICE } as const;
const MOST_SYSTEMS = 1;

/** Three systems proved apart must not be tied together by their own jumpers and cables. */
export const cablesSeparate: Check = {
  ...rule,
  question: 'Are the systems complete?',
  title: 'Jumpers and cables keep to one system',
  check({ layout }) {
    const cables = piecesOf(layout.pieces, 'jumper', 'ground-cable');
    if (cables.length === 0) return [answer(rule, [], 'n/a', 'No jumper or ground cable drawn')];
    return cables.map((cable) => {
      const touched = new Set(
        [cable.from, cable.to].flatMap((id) => systemTouched(layout, id) ?? []),
      );
      const apart = touched.size <= MOST_SYSTEMS;
      return answer(
        rule,
        [cable.id],
        apart ? 'meets' : 'not-met',
        apart
          ? `${capital(nameOf(cable))} keeps to one system`
          : `${capital(nameOf(cable))} ties systems ${[...touched].sort().join(' and ')} together`,
        { measured: measured(touched.size, 'count'), allowed: atMost(MOST_SYSTEMS, 'count') },
      );
    });
  },
};

function systemTouched(layout: Layout, id: string): System | null {
  const piece = pieceById(layout, id);
  if (piece?.kind === 'rod') return piece.system;
  return piece && isUnit(piece) ? systemOfUnit(piece) : null;
}
