import type { Locate } from '../layout';
import { answer } from './support/answer';
import type { Check, Finding } from './types';

const rule = {
  id: 'locates-current',
  gate: 'deviation',
  backing: { mark: 'published', source: 'The one-call law of the place' },
} as const;

export const locatesCurrent: Check = {
  ...rule,
  question: 'What is under and over us?',
  title: 'Locate tickets current',
  check({ layout, site, asOf }) {
    if (site.locates.length === 0) {
      return [
        answer(rule, [], 'not-known', 'No locate ticket is entered', { missing: ['locate'] }),
      ];
    }
    const when = layout.planned_at ?? asOf;
    return site.locates.map((locate) => judge(locate, when));
  },
};

function judge(locate: Locate, when: string | null): Finding {
  const { ticket, lawful_start, valid_until, emergency } = locate;
  // Under an emergency ticket work may start at once.
  const needsStart = emergency !== true;
  if (!when || !valid_until || (needsStart && !lawful_start)) {
    const lacks = !when
      ? 'the time of work'
      : !valid_until
        ? 'how long it is valid'
        : 'its lawful start';
    return answer(rule, [ticket], 'not-known', `Ticket ${ticket}: ${lacks} is not entered`, {
      missing: ['locate'],
    });
  }
  const at = Date.parse(when);
  if (needsStart && lawful_start && at < Date.parse(lawful_start)) {
    return answer(
      rule,
      [ticket],
      'not-met',
      `Ticket ${ticket}: work may not start before ${lawful_start}`,
    );
  }
  if (at > Date.parse(valid_until)) {
    return answer(rule, [ticket], 'not-met', `Ticket ${ticket} ran out at ${valid_until}`);
  }
  return answer(rule, [ticket], 'meets', `Ticket ${ticket} is valid until ${valid_until}`);
}
