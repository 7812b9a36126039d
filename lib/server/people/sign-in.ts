import 'server-only';
import { randomUUID } from 'node:crypto';
import { writeSignInError, type SignInError } from '@/lib/api';
import { appendAudit } from '../audit';
import { db, inTransaction } from '../database';
import { isRight } from '../session/passwords';
import { SESSION_DAYS } from '../session/rules';
import { beginAttempt } from './attempts';
import { plainEmail } from './email';

export class SignInRefused extends Error {
  constructor(readonly why: SignInError) {
    super(writeSignInError(why));
    this.name = 'SignInRefused';
  }
}

export type SignIn = {
  readonly email: string;
  readonly password: string;
  /** Where the request came from, as far as can be told. */
  readonly address: string;
  /** A session the same browser already has; it ends when the new one begins. */
  readonly before: string | null;
};

/** A new session, or SignInRefused with the same answer for a wrong password and an unknown e-mail. */
export async function signIn({ email, password, address, before }: SignIn) {
  const attempt = await beginAttempt(email, address);
  if (attempt.waitMinutes > 0) {
    throw new SignInRefused({ code: 'too-many-tries', minutes: attempt.waitMinutes });
  }
  const person = await db.Person.findOne({
    where: { email: plainEmail(email), disabled_at: null },
  });
  if (!(await isRight(person?.password_hash ?? null, password)) || !person) {
    await attempt.row.update({ outcome: 'failed', agency_id: person?.agency_id ?? null });
    throw new SignInRefused({ code: 'wrong' });
  }

  const now = new Date();
  const session = { id: randomUUID(), agency_id: person.agency_id, person_id: person.id };
  await inTransaction(async (transaction) => {
    // Holds the person's row, so that two sign-ins at once write the trail one after the other.
    await db.Person.findByPk(person.id, { transaction, lock: true, attributes: ['id'] });
    await db.Session.create(
      {
        ...session,
        created_at: now,
        last_seen_at: now,
        expires_at: new Date(now.getTime() + SESSION_DAYS * 86_400_000),
        revoked_at: null,
      },
      { transaction },
    );
    if (before) {
      await db.Session.update(
        { revoked_at: now },
        { where: { id: before, revoked_at: null }, transaction },
      );
    }
    await attempt.row.update(
      { outcome: 'signed-in', agency_id: person.agency_id },
      { transaction },
    );
    await appendAudit(transaction, {
      agencyId: person.agency_id,
      subject: { kind: 'person', id: person.id },
      action: 'signed-in',
      personId: person.id,
      at: now,
      facts: {},
    });
  });
  return { id: person.id, name: person.name, email: person.email, sessionId: session.id };
}
