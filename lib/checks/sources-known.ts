import { COMMON_PRACTICE } from '../limits';
import { piecesOf } from '../layout';
import { answer, atMost, measured } from './support/answer';
import { noSources, sourcesOf, ventsOf } from './support/sources';
import type { Check, Missing } from './types';

const rule = { id: 'sources-known', gate: 'ack', backing: COMMON_PRACTICE } as const;

/** Without a source, a hot zone and the receiver's vent nothing about place can be judged. */
export const sourcesKnown: Check = {
  ...rule,
  question: 'Are the systems complete?',
  title: 'Sources, hot zone and vent drawn',
  check({ layout }) {
    const lacking: { missing: Missing; words: string }[] = [];
    if (noSources(sourcesOf(layout))) {
      lacking.push({ missing: 'source', words: 'where vapour comes from' });
    }
    if (piecesOf(layout.pieces, 'hot-zone').length === 0) {
      lacking.push({ missing: 'hot-zone', words: 'the hot zone' });
    }
    if (ventsOf(layout).length === 0) {
      lacking.push({ missing: 'vent', words: "the receiver's vent" });
    }
    const known = lacking.length === 0;
    return [
      answer(
        rule,
        [],
        known ? 'meets' : 'not-known',
        known
          ? "A source, the hot zone and the receiver's vent are drawn"
          : `Not drawn: ${lacking.map(({ words }) => words).join(', ')}`,
        {
          measured: measured(lacking.length, 'count'),
          allowed: atMost(0, 'count'),
          missing: lacking.map(({ missing }) => missing),
        },
      ),
    ];
  },
};
