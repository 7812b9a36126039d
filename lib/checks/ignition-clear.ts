import { LIMIT_TABLE } from '../limits';
import { keptClear } from './support/clearance';
import { metresToSource, noSources, sourcesOf } from './support/sources';
import type { Check } from './types';

const rule = {
  id: 'ignition-clear',
  gate: 'deviation',
  backing: LIMIT_TABLE.ignition_clear_ft,
} as const;

export const ignitionClear: Check = {
  ...rule,
  question: 'Is everything in the right place?',
  title: 'Pump, tester and receiver clear of the sources',
  check(input) {
    const { layout, limits } = input;
    const sources = sourcesOf(layout);
    return keptClear({
      rule,
      input,
      units: ['P', 'R'],
      metresTo: noSources(sources) ? null : (shape) => metresToSource(sources, shape),
      leastFt: limits.values.ignition_clear_ft,
      what: 'the nearest source',
      notDrawn: { words: 'No release point or pool is drawn', missing: 'source' },
    });
  },
};
