import { COMMON_PRACTICE } from '../limits';
import { rodsOf, SYSTEMS, systemsInUse } from '../layout';
import { answer, atLeast, measured } from './support/answer';
import { NOT_IN_USE, systemWords } from './support/words';
import type { Check } from './types';

const rule = { id: 'system-complete', gate: 'stop', backing: COMMON_PRACTICE } as const;
const LEAST_RODS = 1;

export const systemComplete: Check = {
  ...rule,
  question: 'Are the systems complete?',
  title: 'Each system has a rod',
  check({ layout }) {
    return SYSTEMS.map((system) => {
      if (!systemsInUse(layout).includes(system)) return answer(rule, [system], 'n/a', NOT_IN_USE);
      const count = rodsOf(layout, system).length;
      return answer(
        rule,
        [system],
        count >= LEAST_RODS ? 'meets' : 'not-met',
        count === 0
          ? `No rod drawn for ${systemWords(system)}`
          : `${count} ${count === 1 ? 'rod' : 'rods'} drawn for ${systemWords(system)}`,
        { measured: measured(count, 'count'), allowed: atLeast(LEAST_RODS, 'count') },
      );
    });
  },
};
