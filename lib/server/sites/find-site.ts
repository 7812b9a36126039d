import 'server-only';
import type { FindOptions, InferAttributes } from 'sequelize';
import { db } from '../database';
import { knownId } from '../database/known-id';
import { notFound } from '../problems';
import type { SignedIn } from '../session';

/** The site's row, if it is the person's agency's. */
export async function findSite(
  person: SignedIn,
  siteId: string,
  options: FindOptions<InferAttributes<db.Site>> = {},
): Promise<db.Site> {
  const site = await db.Site.findOne({
    ...options,
    where: { id: knownId(siteId, 'site'), agency_id: person.agencyId },
  });
  if (!site) throw notFound('site');
  return site;
}
