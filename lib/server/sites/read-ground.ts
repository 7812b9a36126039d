import 'server-only';
import type { GroundAnswer } from '@/lib/api';
import { db, database } from '../database';
import { whoOf } from '../people/who';
import type { SignedIn } from '../session';
import { findSite } from './find-site';
import { groundOf } from './ground';

/** The ground as of one version: read in one transaction, so that no save falls in between. */
export async function readGround(person: SignedIn, siteId: string): Promise<GroundAnswer> {
  return database.transaction(async (transaction) => {
    const site = (await findSite(person, siteId, {
      transaction,
      include: { model: db.Person, as: 'groundSavedBy', attributes: ['id', 'name'] },
    })) as db.Site & { groundSavedBy: db.Person | null };
    return {
      site_id: site.id,
      version: site.version,
      ground: await groundOf(site, transaction),
      saved_at: site.ground_saved_at.toISOString(),
      saved_by: whoOf(site.groundSavedBy),
    };
  });
}
