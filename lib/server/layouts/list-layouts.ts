import 'server-only';
import { Op } from 'sequelize';
import type { LayoutRow, LayoutsAnswer } from '@/lib/api';
import { db } from '../database';
import { pageOf, readCursor } from '../database/cursor';
import { whoOf } from '../people/who';
import type { SignedIn } from '../session';
import { findSite } from '../sites/find-site';
import { layoutName } from './document';

type Found = db.Layout & { drawnBy: db.Person; savedBy: db.Person };
type Paging = { cursor?: string; limit: number };

const who = (as: 'drawnBy' | 'savedBy') => ({ model: db.Person, as, attributes: ['id', 'name'] });

/** A site's layouts, the one saved last first. */
export async function listLayouts(
  person: SignedIn,
  siteId: string,
  { cursor, limit }: Paging,
): Promise<LayoutsAnswer> {
  await findSite(person, siteId, { attributes: ['id'], raw: true });
  const after = readCursor(cursor);
  const found = (await db.Layout.findAll({
    where: { agency_id: person.agencyId, site_id: siteId, ...(after && olderThan(after)) },
    attributes: { exclude: ['document'] },
    include: [who('drawnBy'), who('savedBy')],
    order: [
      ['saved_at', 'DESC'],
      ['id', 'DESC'],
    ],
    limit: limit + 1,
    raw: true,
    nest: true,
  })) as Found[];
  const { page, next_cursor } = pageOf(found, limit, (row) => [row.saved_at.toISOString(), row.id]);
  return { layouts: page.map(rowOf), next_cursor };
}

const olderThan = ([at, id]: [string, string]) => ({
  [Op.or]: [
    { saved_at: { [Op.lt]: new Date(at) } },
    { saved_at: new Date(at), id: { [Op.lt]: id } },
  ],
});

const rowOf = (row: Found): LayoutRow => ({
  id: row.id,
  site_id: row.site_id,
  name: layoutName(row.name),
  version: row.version,
  pieces: row.pieces,
  drawn_by: whoOf(row.drawnBy),
  saved_by: whoOf(row.savedBy),
  saved_at: row.saved_at.toISOString(),
});
