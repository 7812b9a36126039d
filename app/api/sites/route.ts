import { newSite, siteQuery } from '@/lib/api';
import { json, route } from '@/lib/server/route';
import { createSite } from '@/lib/server/sites/create-site';
import { listSites } from '@/lib/server/sites/list-sites';

export const GET = route({ can: 'agency.see', query: siteQuery }, ({ person, query }) =>
  listSites(person, query),
);

export const POST = route({ can: 'site.change', body: newSite }, async ({ person, body }) => {
  const site = await createSite(person, body);
  return json(site, 201, { location: `/api/sites/${site.id}` });
});
