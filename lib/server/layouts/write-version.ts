import 'server-only';
import type { Transaction } from 'sequelize';
import type { Layout } from '@/lib/layout';
import { appendAudit } from '../audit';
import { db } from '../database';
import type { SignedIn } from '../session';
import { columnsOf, fingerprint } from './document';

type Version = {
  readonly layoutId: string;
  /** The version this one follows; the row is only changed if it still has it. */
  readonly from: number;
  readonly layout: Layout;
  readonly label: string;
  readonly action: 'saved' | 'restored';
  readonly at: Date;
};

/**
 * Makes the next version: the compare-and-set first, which takes the row's lock, then the change
 * and the audit row. False, and nothing written, where `from` is no longer the newest.
 */
export async function writeVersion(
  person: SignedIn,
  { layoutId, from, layout, label, action, at }: Version,
  transaction: Transaction,
): Promise<boolean> {
  const version = from + 1;
  const [won] = await db.Layout.update(
    { ...columnsOf(layout), version, saved_at: at, saved_by: person.id },
    { where: { id: layoutId, agency_id: person.agencyId, version: from }, transaction },
  );
  if (won === 0) return false;
  await db.LayoutChange.create(
    {
      layout_id: layoutId,
      version,
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
    subject: { kind: 'layout', id: layoutId },
    action,
    personId: person.id,
    at,
    facts: { version, label, document: fingerprint(layout) },
  });
  return true;
}
