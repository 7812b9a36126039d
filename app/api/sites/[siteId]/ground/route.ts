import { groundSave, MOST_BYTES, siteParams } from '@/lib/api';
import { json, route, versionTag } from '@/lib/server/route';
import { readGround } from '@/lib/server/sites/read-ground';
import { saveGround } from '@/lib/server/sites/save-ground';

export const GET = route({ can: 'agency.see', params: siteParams }, async ({ person, params }) => {
  const ground = await readGround(person, params.siteId);
  return json(ground, 200, versionTag(ground.version));
});

export const PUT = route(
  {
    can: 'site.change',
    params: siteParams,
    body: groundSave,
    mostBytes: MOST_BYTES.ground,
    ifMatch: true,
  },
  async ({ person, params, version, body }) => {
    const saved = await saveGround(person, params.siteId, version, body);
    return json(saved, 200, versionTag(saved.version));
  },
);
