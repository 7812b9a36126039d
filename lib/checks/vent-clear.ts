import { distance, footprintToPoint } from '../geo';
import { LIMIT_TABLE } from '../limits';
import { keptClear } from './support/clearance';
import { ventsOf } from './support/sources';
import type { Check } from './types';

const rule = { id: 'vent-clear', gate: 'deviation', backing: LIMIT_TABLE.vent_clear_ft } as const;

export const ventClear: Check = {
  ...rule,
  question: 'Is everything in the right place?',
  title: "Pump and tester clear of the receiver's vents",
  check(input) {
    const { layout, limits } = input;
    const vents = ventsOf(layout);
    return keptClear({
      rule,
      input,
      units: ['P'],
      metresTo:
        vents.length === 0
          ? null
          : (shape) =>
              Math.min(
                ...vents.map((vent) =>
                  'x' in shape ? distance(shape, vent) : footprintToPoint(shape, vent),
                ),
              ),
      leastFt: limits.values.vent_clear_ft,
      what: 'the nearest vent',
      notDrawn: { words: "The receiver's vent is not drawn", missing: 'vent' },
    });
  },
};
