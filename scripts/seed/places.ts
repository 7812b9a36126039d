import { readFile } from 'node:fs/promises';
import type { Transaction } from 'sequelize';
import { DEMO_LAYOUTS, DEMO_SITES } from '../../demo/demo';
import { asIfAt } from '../../demo/shift-times';
import type { Sheet } from '../../lib/layout';
import { parseExchange } from '../../lib/layout/exchange';
import { insertLayout } from '../../lib/server/layouts/insert-layout';
import { insertSite } from '../../lib/server/sites/create-site';
import { saveGroundIn } from '../../lib/server/sites/save-ground';
import type { Author } from './agency';

/** The demo's sites with their ground, and the layouts drawn there, as if drawn at `now`. */
export async function seedPlaces(
  author: Author,
  transaction: Transaction,
  now: Date,
): Promise<void> {
  const ids = new Map<string, string>();
  for (const { key, name, place, county, notes, ground, scene } of DEMO_SITES) {
    const entered = { name, where: `${place}, ${county}`, notes, at: scene.origin };
    const siteId = await insertSite(author, entered, transaction);
    const { site } = await readSheet(ground, now);
    const change = { ground: site, label: 'Enter the ground', at: now };
    await saveGroundIn(author, siteId, 1, change, transaction);
    ids.set(key, siteId);
  }
  // The one to meet first is saved last, because lists begin with what was saved last.
  for (const [index, { site, name, file }] of DEMO_LAYOUTS.entries()) {
    const { layout } = await readSheet(file, now);
    const at = new Date(now.getTime() - index);
    const siteId = ids.get(site);
    if (!siteId)
      throw new Error(`${file} belongs to the site ${site}, which the demo doesn't have.`);
    await insertLayout(author, siteId, { ...layout, name }, 'Import a file', transaction, at);
  }
}

/** The file's sheet as if it had been drawn at `now`: an old wind reading would teach nothing. */
async function readSheet(file: string, now: Date): Promise<Sheet> {
  const parsed = parseExchange(JSON.parse(await readFile(file, 'utf8')));
  if (parsed.ok) return asIfAt(now, parsed.sheet);
  const [first] = parsed.faults;
  throw new Error(
    `${file} has ${parsed.faults.length} faults, the first at ${first?.path}: ${first?.message}`,
  );
}
