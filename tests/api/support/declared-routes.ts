import type { Action } from '@/lib/access';
import { emptyLayout, EMPTY_GROUND } from '@/lib/layout';
import type { Sent } from './call';

/** What a request needs to name: things of the agency whose person made them. */
export type World = {
  readonly siteId: string;
  readonly layoutId: string;
  /** A base map of the agency's with one tile, at 14/3700/6100. */
  readonly pack: string;
};

export type DeclaredRoute = {
  /** `public` answers anybody; `sign-in` is next-auth's own and has its own tests. */
  readonly can: Action | 'public' | 'sign-in';
  /** A `thing` of another agency is not found; a `list` of another agency is its own. */
  readonly reach: 'thing' | 'list' | 'nothing';
  readonly status: number;
  readonly send: (world: World) => Sent;
};

const layout = emptyLayout([-98.3, 41.2], 'Matrix');
const file = {
  type: 'FeatureCollection',
  stillground: { version: 1, origin: [-98.3, 41.2] },
  features: [],
};
const site = ({ siteId }: World) => ({ params: { siteId } });
const ofLayout = ({ layoutId }: World) => ({ params: { layoutId } });
const see = (reach: DeclaredRoute['reach'], send: (world: World) => Sent = () => ({})) =>
  ({ can: 'agency.see', reach, status: 200, send }) satisfies DeclaredRoute;

/** The answer every route owes to everybody. A route that isn't here fails the test. */
export const DECLARED: Record<string, DeclaredRoute> = {
  'GET /api/health': { can: 'public', reach: 'nothing', status: 200, send: () => ({}) },
  'GET /api/auth/[...nextauth]': {
    can: 'sign-in',
    reach: 'nothing',
    status: 200,
    send: () => ({}),
  },
  'POST /api/auth/[...nextauth]': {
    can: 'sign-in',
    reach: 'nothing',
    status: 200,
    send: () => ({}),
  },
  'GET /api/kits': see('list'),
  'GET /api/limits': see('list'),
  'POST /api/checks': see('nothing', () => ({ body: file })),
  'GET /api/sites': see('list'),
  'POST /api/sites': {
    can: 'site.change',
    reach: 'list',
    status: 201,
    send: () => ({ body: { name: 'Matrix' } }),
  },
  'GET /api/sites/[siteId]': see('thing', site),
  'PATCH /api/sites/[siteId]': {
    can: 'site.change',
    reach: 'thing',
    status: 200,
    send: (world) => ({ ...site(world), body: { name: 'Matrix' } }),
  },
  'GET /api/sites/[siteId]/ground': see('thing', site),
  'PUT /api/sites/[siteId]/ground': {
    can: 'site.change',
    reach: 'thing',
    status: 200,
    send: (world) => ({
      ...site(world),
      ifMatch: '"1"',
      body: { ground: EMPTY_GROUND, label: 'Matrix' },
    }),
  },
  'GET /api/sites/[siteId]/layouts': see('thing', site),
  'POST /api/sites/[siteId]/layouts': {
    can: 'layout.draw',
    reach: 'thing',
    status: 201,
    send: (world) => ({ ...site(world), body: { name: 'Matrix' } }),
  },
  'GET /api/layouts/[layoutId]': see('thing', ofLayout),
  'PUT /api/layouts/[layoutId]': {
    can: 'layout.draw',
    reach: 'thing',
    status: 200,
    send: (world) => ({ ...ofLayout(world), ifMatch: '"1"', body: { layout, label: 'Matrix' } }),
  },
  'GET /api/layouts/[layoutId]/changes': see('thing', ofLayout),
  'GET /api/layouts/[layoutId]/changes/[version]': see('thing', ({ layoutId }) => ({
    params: { layoutId, version: '1' },
  })),
  'POST /api/layouts/[layoutId]/restore': {
    can: 'layout.draw',
    reach: 'thing',
    status: 200,
    send: (world) => ({ ...ofLayout(world), body: { version: 1 } }),
  },
  'GET /api/layouts/[layoutId]/export': see('thing', ofLayout),
  'GET /tiles/[pack]/[version]/[z]/[x]/[y]': see('thing', ({ pack }) => ({
    params: { pack, version: 'v1', z: '14', x: '3700', y: '6100' },
  })),
};
