import 'server-only';
import type { SiteAnswer } from '@/lib/api';
import { db } from '../database';
import type { SignedIn } from '../session';
import { knownId } from '../database/known-id';
import { notFound } from '../problems';
import { baseMapAnswer, LISTED, siteRow, type Listed } from './rows';

type Found = Listed & Pick<db.Site, 'notes' | 'version'> & { baseMap: db.BaseMap };

export async function readSite(person: SignedIn, siteId: string): Promise<SiteAnswer> {
  const site = (await db.Site.findOne({
    where: { id: knownId(siteId, 'site'), agency_id: person.agencyId },
    attributes: [...LISTED, 'notes', 'version'],
    include: { model: db.BaseMap, as: 'baseMap' },
    raw: true,
    nest: true,
  })) as unknown as Found | null;
  if (!site) throw notFound('site');
  return {
    ...siteRow(site),
    notes: site.notes,
    ground_version: site.version,
    base_map: baseMapAnswer(site.baseMap),
  };
}
