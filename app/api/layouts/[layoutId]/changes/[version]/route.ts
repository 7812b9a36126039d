import { versionParams } from '@/lib/api';
import { readChange } from '@/lib/server/layouts/read-change';
import { route } from '@/lib/server/route';

export const GET = route({ can: 'agency.see', params: versionParams }, ({ person, params }) =>
  readChange(person, params.layoutId, params.version),
);
