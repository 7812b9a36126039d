import { randomUUID } from 'node:crypto';
import { encode } from 'next-auth/jwt';
import { ROLES, type Role } from '@/lib/access';
import { emptyLayout, type Layout } from '@/lib/layout';
import { db, inTransaction } from '@/lib/server/database';
import { insertLayout } from '@/lib/server/layouts/insert-layout';
import type { SignedIn } from '@/lib/server/session';
import { hashPassword } from '@/lib/server/session/passwords';
import { insertSite } from '@/lib/server/sites/create-site';

export type TestPerson = SignedIn & { readonly cookie: string };
export type TestAgency = {
  readonly id: string;
  readonly name: string;
  readonly people: Record<Role, TestPerson>;
};

export const PASSWORD = 'correct horse battery staple';
let passwordHash: Promise<string> | undefined;

/** An agency with one person of every role, each signed in. */
export async function makeAgency(name = `Agency ${randomUUID()}`): Promise<TestAgency> {
  const agencyId = randomUUID();
  await db.Agency.create({ id: agencyId, name, created_at: new Date() });
  const people: Partial<Record<Role, TestPerson>> = {};
  for (const role of ROLES) people[role] = await makePerson(agencyId, name, role);
  return { id: agencyId, name, people: people as Record<Role, TestPerson> };
}

export async function makePerson(
  agencyId: string,
  agencyName: string,
  role: Role,
): Promise<TestPerson> {
  const id = randomUUID();
  const now = new Date();
  const name = `${role} of ${agencyName}`;
  const email = `${id}@test.example`;
  passwordHash ??= hashPassword(PASSWORD);
  await db.Person.create({
    id,
    agency_id: agencyId,
    email,
    name,
    password_hash: await passwordHash,
    created_at: now,
    disabled_at: null,
  });
  await db.Membership.create({ agency_id: agencyId, person_id: id, role, created_at: now });
  const sessionId = randomUUID();
  await db.Session.create({
    id: sessionId,
    agency_id: agencyId,
    person_id: id,
    created_at: now,
    last_seen_at: now,
    expires_at: new Date(now.getTime() + 3_600_000),
    revoked_at: null,
  });
  return {
    id,
    name,
    email,
    role,
    agencyId,
    agencyName,
    sessionId,
    cookie: await cookieFor(sessionId),
  };
}

/** The cookie that a browser would hold for the session. */
export async function cookieFor(sid: string): Promise<string> {
  const token = await encode({ token: { sid }, secret: process.env.NEXTAUTH_SECRET! });
  return `next-auth.session-token=${token}`;
}

export const makeSite = (person: SignedIn, name = 'Test siding'): Promise<string> =>
  inTransaction((transaction) =>
    insertSite(person, { name, where: 'Test road', at: [-98.3, 41.2] }, transaction),
  );

export const makeLayout = (
  person: SignedIn,
  siteId: string,
  layout: Layout = emptyLayout([-98.3, 41.2], 'Test plan'),
): Promise<string> =>
  inTransaction((transaction) => insertLayout(person, siteId, layout, 'New layout', transaction));
