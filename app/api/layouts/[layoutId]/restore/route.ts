import { layoutParams, restoreRequest } from '@/lib/api';
import { restoreVersion } from '@/lib/server/layouts/restore-version';
import { json, route, versionTag } from '@/lib/server/route';

export const POST = route(
  { can: 'layout.draw', params: layoutParams, body: restoreRequest },
  async ({ person, params, body }) => {
    const saved = await restoreVersion(person, params.layoutId, body.version);
    return json(saved, 200, versionTag(saved.version));
  },
);
