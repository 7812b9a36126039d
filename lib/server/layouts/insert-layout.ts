import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import type { Layout } from '@/lib/layout';
import { appendAudit } from '../audit';
import { db } from '../database';
import type { SignedIn } from '../session';
import { columnsOf, fingerprint } from './document';

/** Version 1 of a new layout. The site must already be known to be the person's agency's. */
export async function insertLayout(
  person: Pick<SignedIn, 'id' | 'agencyId'>,
  siteId: string,
  layout: Layout,
  label: string,
  transaction: Transaction,
  at = new Date(),
): Promise<string> {
  const id = randomUUID();
  await db.Layout.create(
    {
      id,
      agency_id: person.agencyId,
      site_id: siteId,
      ...columnsOf(layout),
      version: 1,
      created_at: at,
      drawn_by: person.id,
      saved_at: at,
      saved_by: person.id,
    },
    { transaction },
  );
  await db.LayoutChange.create(
    {
      layout_id: id,
      version: 1,
      agency_id: person.agencyId,
      label,
      document: layout,
      at,
      person_id: person.id,
    },
    { transaction },
  );
  await appendAudit(transaction, {
    agencyId: person.agencyId,
    subject: { kind: 'layout', id },
    action: 'created',
    personId: person.id,
    at,
    facts: { version: 1, label, site: siteId, document: fingerprint(layout) },
  });
  return id;
}
