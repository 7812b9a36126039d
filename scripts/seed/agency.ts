import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { DEMO_AGENCY, DEMO_KITS, DEMO_LIMITS, DEMO_PEOPLE } from '../../demo/demo';
import { db } from '../../lib/server/database';
import { hashPassword } from '../../lib/server/session/passwords';
import type { DemoSignIn } from './sign-ins';

export type Author = { readonly id: string; readonly agencyId: string };

/** The agency with its people, kits and limits. Answers with the planner, who draws the demo. */
export async function seedAgency(
  signIns: readonly DemoSignIn[],
  transaction: Transaction,
): Promise<Author> {
  const now = new Date();
  const agencyId = randomUUID();
  await db.Agency.create({ id: agencyId, name: DEMO_AGENCY, created_at: now }, { transaction });
  const ids = new Map<string, string>();
  for (const [index, { name, email, role }] of DEMO_PEOPLE.entries()) {
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
      name: DEMO_LIMITS.name,
      overrides: DEMO_LIMITS.values,
      acceptance_max_ohm: DEMO_LIMITS.acceptance.max_ohm,
      authority: DEMO_LIMITS.acceptance.authority ?? null,
      set_at: now,
      set_by: ids.get('safety-officer')!,
    },
    { transaction },
  );
  for (const kit of DEMO_KITS) await seedKit(agencyId, kit, now, transaction);
  return { id: ids.get('planner')!, agencyId };
}

async function seedKit(
  agencyId: string,
  kit: (typeof DEMO_KITS)[number],
  now: Date,
  transaction: Transaction,
): Promise<void> {
  const id = randomUUID();
  await db.Kit.create(
    { id, agency_id: agencyId, name: kit.name, created_at: now },
    { transaction },
  );
  await db.KitItem.bulkCreate(
    kit.items.map(({ kind, count, length_ft, diameter_in }, place) => ({
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
