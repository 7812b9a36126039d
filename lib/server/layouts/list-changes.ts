import 'server-only';
import { Op } from 'sequelize';
import type { ChangeRow, ChangesAnswer } from '@/lib/api';
import { db } from '../database';
import { pageOf, readCursor } from '../database/cursor';
import { whoOf } from '../people/who';
import type { SignedIn } from '../session';
import { findLayout } from './find-layout';

type Found = db.LayoutChange & { person: db.Person };

/** Every version there has been, newest first. */
export async function listChanges(
  person: SignedIn,
  layoutId: string,
  { cursor, limit }: { cursor?: string; limit: number },
): Promise<ChangesAnswer> {
  await findLayout(person, layoutId, { attributes: ['id'], raw: true });
  const after = readCursor(cursor);
  const found = (await db.LayoutChange.findAll({
    where: {
      agency_id: person.agencyId,
      layout_id: layoutId,
      ...(after && { version: { [Op.lt]: Number(after[0]) || 0 } }),
    },
    attributes: ['version', 'label', 'at'],
    include: { model: db.Person, as: 'person', attributes: ['id', 'name'] },
    order: [['version', 'DESC']],
    limit: limit + 1,
    raw: true,
    nest: true,
  })) as Found[];
  const { page, next_cursor } = pageOf(found, limit, (row) => [String(row.version), layoutId]);
  return { changes: page.map(changeRow), next_cursor };
}

export const changeRow = (row: Found): ChangeRow => ({
  version: row.version,
  label: row.label,
  at: row.at.toISOString(),
  by: whoOf(row.person),
});
