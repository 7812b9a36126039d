import 'server-only';
import type { z } from 'zod';
import type { SiteAnswer, siteChange } from '@/lib/api';
import { appendAudit } from '../audit';
import { db, inTransaction } from '../database';
import type { SignedIn } from '../session';
import { findSite } from './find-site';
import { readSite } from './read-site';

/** Sets what is named and leaves the rest. The ground and its version are not touched. */
export async function changeSite(
  person: SignedIn,
  siteId: string,
  change: z.output<typeof siteChange>,
): Promise<SiteAnswer> {
  const now = new Date();
  await inTransaction(async (transaction) => {
    await findSite(person, siteId, { transaction, lock: true, attributes: ['id'] });
    await db.Site.update(
      {
        ...(change.name !== undefined && { name: change.name }),
        ...(change.where !== undefined && { place: change.where || null }),
        ...(change.notes !== undefined && { notes: change.notes || null }),
        ...(change.at !== undefined && {
          longitude: change.at?.[0] ?? null,
          latitude: change.at?.[1] ?? null,
        }),
        changed_at: now,
      },
      { where: { id: siteId, agency_id: person.agencyId }, transaction },
    );
    await appendAudit(transaction, {
      agencyId: person.agencyId,
      subject: { kind: 'site', id: siteId },
      action: 'changed',
      personId: person.id,
      at: now,
      facts: change,
    });
  });
  return readSite(person, siteId);
}
