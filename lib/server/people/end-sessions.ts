import 'server-only';
import type { Transaction } from 'sequelize';
import { db } from '../database';

/** Ends every session of a person: at a change of role or password, or when someone leaves. */
export async function endSessions(
  agencyId: string,
  personId: string,
  transaction?: Transaction,
): Promise<number> {
  const [ended] = await db.Session.update(
    { revoked_at: new Date() },
    { where: { agency_id: agencyId, person_id: personId, revoked_at: null }, transaction },
  );
  return ended;
}
