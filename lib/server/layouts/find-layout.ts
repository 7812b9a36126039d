import 'server-only';
import type { FindOptions, InferAttributes } from 'sequelize';
import { db } from '../database';
import { knownId } from '../database/known-id';
import { notFound } from '../problems';
import type { SignedIn } from '../session';

/** The layout's row, if it is the person's agency's. */
export async function findLayout(
  person: SignedIn,
  layoutId: string,
  options: FindOptions<InferAttributes<db.Layout>> = {},
): Promise<db.Layout> {
  const layout = await db.Layout.findOne({
    ...options,
    where: { id: knownId(layoutId, 'layout'), agency_id: person.agencyId },
  });
  if (!layout) throw notFound('layout');
  return layout;
}
