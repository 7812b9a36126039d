import type { Role } from '../../lib/access';
import type { KitItem } from '../../lib/layout';

/** The invented team of the demonstration. `.example` is reserved: no mail ever reaches it. */
export const AGENCY = 'Quillan County Hazmat';

export const TEAM: readonly {
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}[] = [
  { name: 'Marit Oduya', email: 'marit.oduya@quillan-hazmat.example', role: 'planner' },
  {
    name: 'Tomas Brandvold',
    email: 'tomas.brandvold@quillan-hazmat.example',
    role: 'safety-officer',
  },
  { name: 'Keisha Lindqvist', email: 'keisha.lindqvist@quillan-hazmat.example', role: 'crew' },
  { name: 'Wen Halloran', email: 'wen.halloran@quillan-hazmat.example', role: 'administrator' },
];

export const LIMIT_SET = {
  name: 'Quillan County limits',
  acceptance_max_ohm: 25,
  authority: 'Quillan County Fire Marshal, order 7 (invented)',
} as const;

/** What lies on the team's truck: longer cables than the trade's usual 50 ft, to reach past a zone. */
export const KIT: { readonly name: string; readonly items: readonly KitItem[] } = {
  name: 'Hazmat 7 grounding kit',
  items: [
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
  ],
};
