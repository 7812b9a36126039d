import { DEMO_AGENCY, DEMO_SITES } from '../../demo/demo';
import { db } from '../../lib/server/database';
import { importScene } from '../../tiles/import-scene';

/**
 * Draws the demo sites' base maps where they are missing or were drawn by an older version. It
 * takes a while, so it stands apart from the rest: cut short, it goes on at the next start.
 */
export async function seedBaseMaps(say: (words: string) => void): Promise<void> {
  const agency = await db.Agency.findOne({ where: { name: DEMO_AGENCY }, raw: true });
  if (!agency) return;
  for (const { name, scene } of DEMO_SITES) {
    const where = { agency_id: agency.id, name };
    const site = await db.Site.findOne({ where, attributes: ['id', 'base_map_id'], raw: true });
    if (!site) continue;
    const mapId = await importScene(agency.id, scene, progress(name, say));
    if (site.base_map_id === mapId) continue;
    await db.Site.update({ base_map_id: mapId }, { where: { ...where, id: site.id } });
    say(`The base map of ${name} is drawn.\n`);
  }
}

/** A line every tenth of the way. */
function progress(name: string, say: (words: string) => void): (part: number) => void {
  let told = 0;
  return (part) => {
    const tenths = Math.floor(part * 10);
    if (tenths <= told) return;
    told = tenths;
    say(`Drawing the base map of ${name}: ${tenths * 10} %\n`);
  };
}
