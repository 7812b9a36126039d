import type { Role } from '../lib/access';
import type { Kit } from '../lib/layout';
import type { Acceptance, LimitOverrides } from '../lib/limits';
import { dunmarrowSiding, harrowFlatCoop, sorrelCreekRamp } from '../tiles/scenes';
import type { Scene } from '../tiles/scene';
import { TRAILER_KIT, TRUCK_KIT } from './kits';

/**
 * The demonstration, invented from start to finish: no team, person, place or utility in it
 * exists. Files are named from the project's root.
 */
export const DEMO_AGENCY = 'Quillan County Hazmat';

/** `.example` is reserved: no mail ever reaches it. */
export const DEMO_PEOPLE: readonly {
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

export const DEMO_KITS: readonly (Kit & { readonly name: string })[] = [TRUCK_KIT, TRAILER_KIT];

export const DEMO_LIMITS: {
  readonly name: string;
  readonly values: LimitOverrides;
  readonly acceptance: Acceptance;
} = {
  name: 'Quillan County limits',
  values: {},
  acceptance: { max_ohm: 25, authority: 'Quillan County Fire Marshal, order 7 (invented)' },
};

export type DemoSite = {
  /** The scene's pack, by which layouts name their site. */
  readonly key: string;
  readonly name: string;
  readonly county: string;
  readonly place: string;
  readonly notes: string;
  readonly ground: string;
  readonly scene: Scene;
};

const site = (scene: Scene, rest: Pick<DemoSite, 'place' | 'notes'>): DemoSite => ({
  key: scene.pack,
  name: scene.name,
  county: 'Quillan County',
  ground: `demo/files/${scene.pack}.ground.geojson`,
  scene,
  ...rest,
});

export const DEMO_SITES: readonly DemoSite[] = [
  site(sorrelCreekRamp, {
    place: 'Highway 9, exit 41 ramp at Tollgate Road',
    notes: 'Invented place. The turnout above the ramp takes one tank truck.',
  }),
  site(dunmarrowSiding, {
    place: 'Team track off Elevator Road, Dunmarrow',
    notes: 'Invented place. Two cars a week are emptied here; the branch line runs daily.',
  }),
  site(harrowFlatCoop, {
    place: 'Harrow Road, 3 miles west of Harrow Flat',
    notes: 'Invented place. Visited every season: keep the standing plan current.',
  }),
];

/** In the order a visitor should meet them. `site` is a site's key. */
export const DEMO_LAYOUTS: readonly {
  readonly site: string;
  readonly name: string;
  readonly file: string;
}[] = [
  {
    site: 'sorrel-creek-ramp',
    name: 'Ramp, plan A',
    file: 'demo/files/ramp-plan-a.geojson',
  },
  {
    site: 'dunmarrow-siding',
    name: 'Team track, plan B',
    file: 'demo/files/siding-plan-b.geojson',
  },
  {
    site: 'dunmarrow-siding',
    name: 'Team track, first look',
    file: 'demo/files/siding-first-look.geojson',
  },
  {
    site: 'harrow-flat-coop',
    name: 'Loading rack, wind up the slope',
    file: 'demo/files/coop-against-the-wind.geojson',
  },
  {
    site: 'harrow-flat-coop',
    name: 'Standing plan, rack to north apron',
    file: 'demo/files/coop-standing-plan.geojson',
  },
];
