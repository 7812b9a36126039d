import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { db } from '../../lib/server/database';
import { hashPassword } from '../../lib/server/session/passwords';
import type { DemoSignIn } from './sign-ins';
import { AGENCY, KIT, LIMIT_SET, TEAM } from './team';

export type Author = { readonly id: string; readonly agencyId: string };

/** The agency with its people, kit and limits. Answers with the planner, who draws the demo. */
export async function seedAgency(
  signIns: readonly DemoSignIn[],
  transaction: Transaction,
): Promise<Author> {
  const now = new Date();
  const agencyId = randomUUID();
  await db.Agency.create({ id: agencyId, name: AGENCY, created_at: now }, { transaction });
  const ids = new Map<string, string>();
  for (const [index, { name, email, role }] of TEAM.entries()) {
    const id = randomUUID();
    ids.set(role, id);
    await db.Person.create(
      {
        id,
        agency_id: agencyId,
        name,
        email,
        password_hash: await hashPassword(signIns[index]!.password),
        created_at: now,
        disabled_at: null,
      },
      { transaction },
    );
    await db.Membership.create(
      { agency_id: agencyId, person_id: id, role, created_at: now },
      { transaction },
    );
  }
  await db.LimitSet.create(
    {
      agency_id: agencyId,
      number: 1,
      ...LIMIT_SET,
      overrides: {},
      set_at: now,
      set_by: ids.get('safety-officer')!,
    },
    { transaction },
  );
  await seedKit(agencyId, now, transaction);
  return { id: ids.get('planner')!, agencyId };
}

async function seedKit(agencyId: string, now: Date, transaction: Transaction): Promise<void> {
  const id = randomUUID();
  await db.Kit.create(
    { id, agency_id: agencyId, name: KIT.name, created_at: now },
    { transaction },
  );
  await db.KitItem.bulkCreate(
    KIT.items.map(({ kind, count, length_ft, diameter_in }, place) => ({
      kit_id: id,
      place,
      agency_id: agencyId,
      kind,
      count,
      length_ft: length_ft ?? null,
      diameter_in: diameter_in ?? null,
    })),
    { transaction },
  );
}
