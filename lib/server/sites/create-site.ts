import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import type { newSite, SiteAnswer } from '@/lib/api';
import { appendAudit } from '../audit';
import { db, inTransaction } from '../database';
import type { SignedIn } from '../session';
import { readSite } from './read-site';

type Entered = z.output<typeof newSite>;

export async function createSite(person: SignedIn, entered: Entered): Promise<SiteAnswer> {
  const id = await inTransaction((transaction) => insertSite(person, entered, transaction));
  return readSite(person, id);
}

/** A site whose ground is still empty, as version 1. */
export async function insertSite(
  person: Pick<SignedIn, 'id' | 'agencyId'>,
  entered: Entered,
  transaction: Transaction,
): Promise<string> {
  const id = randomUUID();
  const now = new Date();
  await db.Site.create(
    {
      id,
      agency_id: person.agencyId,
      name: entered.name,
      place: entered.where || null,
      notes: entered.notes || null,
      longitude: entered.at?.[0] ?? null,
      latitude: entered.at?.[1] ?? null,
      base_map_id: null,
      version: 1,
      overhead_none_known_as_of: null,
      ground_saved_at: now,
      ground_saved_by: person.id,
      created_at: now,
      changed_at: now,
    },
    { transaction },
  );
  await appendAudit(transaction, {
    agencyId: person.agencyId,
    subject: { kind: 'site', id },
    action: 'created',
    personId: person.id,
    at: now,
    facts: { name: entered.name },
  });
  return id;
}
