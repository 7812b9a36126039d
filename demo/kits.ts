import type { Kit, KitItem } from '../lib/layout';

/** Longer cables than the trade's usual fifty feet, so that they reach past a hot zone. */
const truckItems: KitItem[] = [
  { kind: 'rod', length_ft: 6, diameter_in: 0.625, count: 9 },
  { kind: 'coupler', count: 6 },
  { kind: 'jumper', length_ft: 10, count: 6 },
  { kind: 'ground-cable', length_ft: 75, count: 3 },
  { kind: 'ground-cable', length_ft: 50, count: 3 },
  { kind: 'bond-cable', length_ft: 125, count: 1 },
  { kind: 'bond-cable', length_ft: 75, count: 1 },
  { kind: 'clamp', count: 12 },
  { kind: 'probe', count: 2 },
  { kind: 'tester', count: 1 },
  { kind: 'test-lead', length_ft: 150, count: 2 },
  { kind: 'test-lead', length_ft: 30, count: 1 },
  { kind: 'hose', length_ft: 75, diameter_in: 4, count: 2 },
  { kind: 'driver', count: 1 },
];

/** As commonly packed: fifty-foot cables and nothing to spare. */
const trailerItems: KitItem[] = [
  { kind: 'rod', length_ft: 6, diameter_in: 0.625, count: 6 },
  { kind: 'coupler', count: 3 },
  { kind: 'jumper', length_ft: 10, count: 3 },
  { kind: 'ground-cable', length_ft: 50, count: 3 },
  { kind: 'bond-cable', length_ft: 125, count: 1 },
  { kind: 'bond-cable', length_ft: 75, count: 1 },
  { kind: 'clamp', count: 8 },
  { kind: 'probe', count: 2 },
  { kind: 'tester', count: 1 },
  { kind: 'test-lead', length_ft: 150, count: 2 },
  { kind: 'test-lead', length_ft: 30, count: 1 },
  { kind: 'hose', length_ft: 75, diameter_in: 3, count: 2 },
  { kind: 'driver', count: 1 },
];

export const TRUCK_KIT: Kit & { name: string } = {
  name: 'Hazmat 7 grounding kit',
  items: truckItems,
};
export const TRAILER_KIT: Kit & { name: string } = {
  name: 'Trailer 2 grounding kit',
  items: trailerItems,
};
