import 'server-only';
import type { LimitsAnswer } from '@/lib/api';
import { db } from '../database';
import { whoOf } from '../people/who';
import type { SignedIn } from '../session';

type Found = db.LimitSet & { setBy: db.Person };

/** The set in force: the one with the highest number. None, and the defaults hold. */
export async function readLimits(person: SignedIn): Promise<LimitsAnswer> {
  const set = (await db.LimitSet.findOne({
    where: { agency_id: person.agencyId },
    include: { model: db.Person, as: 'setBy', attributes: ['id', 'name'] },
    order: [['number', 'DESC']],
    raw: true,
    nest: true,
  })) as Found | null;
  if (!set) return { limits: null };
  return {
    limits: {
      number: set.number,
      name: set.name,
      values: set.overrides as Record<string, number>,
      acceptance:
        set.acceptance_max_ohm === null
          ? null
          : { max_ohm: set.acceptance_max_ohm, authority: set.authority },
      set_at: set.set_at.toISOString(),
      set_by: whoOf(set.setBy),
    },
  };
}
