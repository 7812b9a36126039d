import 'server-only';
import { Op } from 'sequelize';
import { db } from '../database';
import { SEEN_EVERY_SECONDS, SESSION_UNUSED_HOURS } from './rules';
import type { SignedIn } from './signed-in';

type Found = db.Session & {
  person: db.Person & { agency: db.Agency; membership: db.Membership };
};

/** The person behind a session that still stands, with today's role; else null. */
export async function findSession(sessionId: string): Promise<SignedIn | null> {
  const now = new Date();
  const found = (await db.Session.findOne({
    where: {
      id: sessionId,
      revoked_at: null,
      expires_at: { [Op.gt]: now },
      last_seen_at: { [Op.gt]: new Date(now.getTime() - SESSION_UNUSED_HOURS * 3_600_000) },
    },
    include: {
      model: db.Person,
      as: 'person',
      required: true,
      where: { disabled_at: null },
      attributes: ['id', 'name', 'email'],
      include: [
        { model: db.Agency, as: 'agency', required: true, attributes: ['id', 'name'] },
        { model: db.Membership, as: 'membership', required: true, attributes: ['role'] },
      ],
    },
    raw: true,
    nest: true,
  })) as Found | null;
  if (!found) return null;
  await touch(found, now);
  const { person } = found;
  return {
    id: person.id,
    name: person.name,
    email: person.email,
    role: person.membership.role,
    agencyId: person.agency.id,
    agencyName: person.agency.name,
    sessionId,
  };
}

async function touch(session: db.Session, now: Date): Promise<void> {
  if (now.getTime() - session.last_seen_at.getTime() < SEEN_EVERY_SECONDS * 1000) return;
  await db.Session.update({ last_seen_at: now }, { where: { id: session.id } });
}
