import { layoutsQuery, MOST_BYTES, newLayout, siteParams } from '@/lib/api';
import { createLayout } from '@/lib/server/layouts/create-layout';
import { listLayouts } from '@/lib/server/layouts/list-layouts';
import { json, route } from '@/lib/server/route';

export const GET = route(
  { can: 'agency.see', params: siteParams, query: layoutsQuery },
  ({ person, params, query }) => listLayouts(person, params.siteId, query),
);

/** An imported file may carry the site's ground, hence the larger body. */
export const POST = route(
  { can: 'layout.draw', params: siteParams, body: newLayout, mostBytes: MOST_BYTES.ground },
  async ({ person, params, body }) => {
    const created = await createLayout(person, params.siteId, body);
    return json(created, 201, { location: `/api/layouts/${created.id}` });
  },
);
