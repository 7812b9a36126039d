import { layoutParams, layoutSave, MOST_BYTES } from '@/lib/api';
import { readLayout } from '@/lib/server/layouts/read-layout';
import { saveLayout } from '@/lib/server/layouts/save-layout';
import { json, route, versionTag } from '@/lib/server/route';

export const GET = route(
  { can: 'agency.see', params: layoutParams },
  async ({ person, params }) => {
    const layout = await readLayout(person, params.layoutId);
    return json(layout, 200, versionTag(layout.version));
  },
);

export const PUT = route(
  {
    can: 'layout.draw',
    params: layoutParams,
    body: layoutSave,
    mostBytes: MOST_BYTES.layout,
    ifMatch: true,
  },
  async ({ person, params, version, body }) => {
    const saved = await saveLayout(person, params.layoutId, version, body);
    return json(saved, 200, versionTag(saved.version));
  },
);
