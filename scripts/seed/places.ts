import type { Transaction } from 'sequelize';
import type { Layout, SiteGround } from '../../lib/layout';
import type { LonLat } from '../../lib/geo';
import { insertLayout } from '../../lib/server/layouts/insert-layout';
import { insertSite } from '../../lib/server/sites/create-site';
import { saveGroundIn } from '../../lib/server/sites/save-ground';
import type { Author } from './people';

/** One site of the demonstration, out of its exchange files. */
export type DemoPlace = {
  readonly name: string;
  readonly where: string;
  readonly notes: string;
  readonly at: LonLat;
  readonly ground: SiteGround;
  readonly layouts: readonly Layout[];
};

export async function seedPlace(
  author: Author,
  place: DemoPlace,
  transaction: Transaction,
): Promise<string> {
  const { name, where, notes, at, ground } = place;
  const siteId = await insertSite(author, { name, where, notes, at }, transaction);
  const change = { ground, label: 'Enter the ground', at: new Date() };
  await saveGroundIn(author, siteId, 1, change, transaction);
  for (const layout of place.layouts) {
    await insertLayout(author, siteId, layout, 'Import a file', transaction);
  }
  return siteId;
}
