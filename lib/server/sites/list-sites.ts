import 'server-only';
import { Op } from 'sequelize';
import type { SitesAnswer } from '@/lib/api';
import { db } from '../database';
import { pageOf, readCursor } from '../database/cursor';
import { contains } from '../database/search';
import type { SignedIn } from '../session';
import { LISTED, siteRow, type Listed } from './rows';

export type SiteQuery = { q?: string; cursor?: string; limit: number };

/** The agency's sites by name; `q` looks in name and place. */
export async function listSites(person: SignedIn, query: SiteQuery): Promise<SitesAnswer> {
  const after = readCursor(query.cursor);
  const sites = (await db.Site.findAll({
    where: {
      [Op.and]: [
        { agency_id: person.agencyId },
        query.q ? { [Op.or]: [{ name: contains(query.q) }, { place: contains(query.q) }] } : {},
        after
          ? {
              [Op.or]: [
                { name: { [Op.gt]: after[0] } },
                { name: after[0], id: { [Op.gt]: after[1] } },
              ],
            }
          : {},
      ],
    },
    attributes: LISTED,
    order: ['name', 'id'],
    limit: query.limit + 1,
    raw: true,
  })) as unknown as Listed[];
  const { page, next_cursor } = pageOf(sites, query.limit, (site) => [site.name, site.id]);
  return { sites: page.map(siteRow), next_cursor };
}
