import { siteChange, siteParams } from '@/lib/api';
import { route } from '@/lib/server/route';
import { changeSite } from '@/lib/server/sites/change-site';
import { readSite } from '@/lib/server/sites/read-site';

export const GET = route({ can: 'agency.see', params: siteParams }, ({ person, params }) =>
  readSite(person, params.siteId),
);

export const PATCH = route(
  { can: 'site.change', params: siteParams, body: siteChange },
  ({ person, params, body }) => changeSite(person, params.siteId, body),
);
