import 'server-only';
import type { KitsAnswer } from '@/lib/api';
import { db } from '../database';
import type { SignedIn } from '../session';

/** The agency's kits by name, each with its items in their order. */
export async function listKits(person: SignedIn): Promise<KitsAnswer> {
  const where = { agency_id: person.agencyId };
  const kits = await db.Kit.findAll({ where, order: ['name', 'id'], raw: true });
  const items = await db.KitItem.findAll({ where, order: ['kit_id', 'place'], raw: true });
  return {
    kits: kits.map((kit) => ({
      id: kit.id,
      name: kit.name,
      items: items
        .filter((item) => item.kit_id === kit.id)
        .map(({ kind, length_ft, diameter_in, count }) => ({
          kind,
          count,
          ...(length_ft !== null && { length_ft }),
          ...(diameter_in !== null && { diameter_in }),
        })),
    })),
  };
}
