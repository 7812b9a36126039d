import 'server-only';
import { appendAudit } from '../audit';
import { db, inTransaction } from '../database';

/** Ends a session at once, wherever its cookie still lies. Ending an ended one does nothing. */
export async function signOut(sessionId: string): Promise<void> {
  const session = await db.Session.findOne({ where: { id: sessionId, revoked_at: null } });
  if (!session) return;
  const now = new Date();
  await inTransaction(async (transaction) => {
    await db.Person.findByPk(session.person_id, { transaction, lock: true, attributes: ['id'] });
    const [ended] = await db.Session.update(
      { revoked_at: now },
      { where: { id: sessionId, revoked_at: null }, transaction },
    );
    if (ended === 0) return;
    await appendAudit(transaction, {
      agencyId: session.agency_id,
      subject: { kind: 'person', id: session.person_id },
      action: 'signed-out',
      personId: session.person_id,
      at: now,
      facts: {},
    });
  });
}
