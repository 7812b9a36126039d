import { layoutParams, layoutsQuery } from '@/lib/api';
import { listChanges } from '@/lib/server/layouts/list-changes';
import { route } from '@/lib/server/route';

export const GET = route(
  { can: 'agency.see', params: layoutParams, query: layoutsQuery },
  ({ person, params, query }) => listChanges(person, params.layoutId, query),
);
