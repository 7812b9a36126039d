import 'server-only';
import type { Transaction } from 'sequelize';
import { db } from '../database';
import { FIRST, hashOf, type SubjectKind } from './chain';

export type AuditEntry = {
  readonly agencyId: string;
  readonly subject: { readonly kind: SubjectKind; readonly id: string };
  readonly action: string;
  readonly personId: string | null;
  readonly at: Date;
  readonly facts: Readonly<Record<string, unknown>>;
};

/**
 * Adds the next event of a subject. The caller's transaction must already hold the subject's row,
 * which makes appenders take turns; should two get here at once, the number's key stops one.
 */
export async function appendAudit(transaction: Transaction, entry: AuditEntry): Promise<void> {
  const subject = {
    agency_id: entry.agencyId,
    subject_kind: entry.subject.kind,
    subject_id: entry.subject.id,
  };
  const last = await db.AuditEvent.findOne({
    where: subject,
    attributes: ['number', 'hash'],
    order: [['number', 'DESC']],
    raw: true,
    transaction,
  });
  const link = {
    agencyId: entry.agencyId,
    subjectKind: entry.subject.kind,
    subjectId: entry.subject.id,
    number: (last?.number ?? 0) + 1,
    action: entry.action,
    personId: entry.personId,
    at: entry.at,
    facts: JSON.stringify(entry.facts),
    previousHash: last?.hash ?? FIRST,
  };
  await db.AuditEvent.create(
    {
      ...subject,
      number: link.number,
      action: link.action,
      person_id: link.personId,
      at: link.at,
      facts: link.facts,
      previous_hash: link.previousHash,
      hash: hashOf(link),
    },
    { transaction },
  );
}
