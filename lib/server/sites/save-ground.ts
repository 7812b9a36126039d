import 'server-only';
import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import type { groundSave, SavedAnswer, StaleGround } from '@/lib/api';
import type { SiteGround } from '@/lib/layout';
import { appendAudit } from '../audit';
import { db, inTransaction } from '../database';
import { Refusal, refuseFaults } from '../problems';
import type { SignedIn } from '../session';
import { duplicateFaults } from '../layouts/duplicate-faults';
import { findSite } from './find-site';
import { readGround } from './read-ground';
import { writeGround } from './write-ground';

/** Saves the site's ground if nobody saved it since `version`; else answers with what is there. */
export async function saveGround(
  person: SignedIn,
  siteId: string,
  version: number,
  { ground, label }: z.output<typeof groundSave>,
): Promise<SavedAnswer> {
  const faults = duplicateFaults(ground.features, 'ground.features');
  if (faults.length > 0) throw refuseFaults(faults);

  const at = new Date();
  const saved = await inTransaction((transaction) =>
    saveGroundIn(person, siteId, version, { ground, label, at }, transaction),
  );
  if (saved) return { version: version + 1, saved_at: at.toISOString() };

  await findSite(person, siteId, { attributes: ['id'] });
  const { version: newest, ground: theirs, saved_at, saved_by } = await readGround(person, siteId);
  const current: StaleGround = { version: newest, ground: theirs, saved_at, saved_by };
  throw new Refusal(
    'stale',
    `${saved_by?.name ?? 'Someone'} changed this site’s ground in the meantime. Neither version is lost: choose which to keep.`,
    { current },
  );
}

/** The save itself, within a transaction: false, and nothing written, where `version` is not newest. */
export async function saveGroundIn(
  person: Pick<SignedIn, 'id' | 'agencyId'>,
  siteId: string,
  version: number,
  { ground, label, at }: { ground: SiteGround; label: string; at: Date },
  transaction: Transaction,
): Promise<boolean> {
  const [won] = await db.Site.update(
    {
      version: version + 1,
      overhead_none_known_as_of: ground.overhead_none_known_as_of,
      ground_saved_at: at,
      ground_saved_by: person.id,
    },
    { where: { id: siteId, agency_id: person.agencyId, version }, transaction },
  );
  if (won === 0) return false;
  const owner = { site_id: siteId, agency_id: person.agencyId };
  const changes = await writeGround(owner, ground, transaction);
  await appendAudit(transaction, {
    agencyId: person.agencyId,
    subject: { kind: 'site', id: siteId },
    action: 'ground-saved',
    personId: person.id,
    at,
    facts: {
      version: version + 1,
      label,
      added: changes.added,
      changed: changes.changed,
      removed: changes.remove.length,
      answers: Object.fromEntries(
        Object.entries(ground.answers).map(([name, entry]) => [name, entry?.answer ?? null]),
      ),
      locates: ground.locates.length,
    },
  });
  return true;
}
