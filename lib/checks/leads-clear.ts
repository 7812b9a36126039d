import { pathMeetsArea } from '../geo';
import { OUR_DEFAULT } from '../limits';
import { nameOf, piecesOf } from '../layout';
import { hotZones } from './outside-hot-zone';
import { answer } from './support/answer';
import { runPath } from './support/runs';
import { capital } from './support/words';
import type { Check } from './types';

const rule = { id: 'leads-clear', gate: 'deviation', backing: OUR_DEFAULT } as const;

export const leadsClear: Check = {
  ...rule,
  question: 'Will the test line read true?',
  title: 'Test leads outside the hot zone',
  check({ layout }) {
    const leads = piecesOf(layout.pieces, 'test-lead');
    if (leads.length === 0) return [answer(rule, [], 'n/a', 'No test lead is drawn')];
    const zones = hotZones(layout);
    return leads.map((lead) => {
      const name = capital(nameOf(lead));
      if (zones.length === 0) {
        return answer(rule, [lead.id], 'not-known', 'No hot zone is drawn', {
          missing: ['hot-zone'],
        });
      }
      const through = zones.some((zone) => pathMeetsArea(runPath(layout, lead), zone));
      return answer(
        rule,
        [lead.id],
        through ? 'not-met' : 'meets',
        through ? `${name} runs through the hot zone` : `${name} keeps out of the hot zone`,
      );
    });
  },
};
