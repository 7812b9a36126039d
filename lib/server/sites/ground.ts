import 'server-only';
import type { Transaction } from 'sequelize';
import type { SiteGround } from '@/lib/layout';
import { db } from '../database';

/** What a site's rows say together. `site` must already be known to be the agency's. */
export async function groundOf(
  site: Pick<db.Site, 'id' | 'agency_id' | 'overhead_none_known_as_of'>,
  transaction?: Transaction,
): Promise<SiteGround> {
  const where = { site_id: site.id, agency_id: site.agency_id };
  const options = { where, raw: true, transaction } as const;
  const features = await db.SiteFeature.findAll({
    ...options,
    attributes: ['feature'],
    order: ['place'],
  });
  const answers = await db.OwnersAnswer.findAll({ ...options, attributes: ['class', 'entry'] });
  const locates = await db.Locate.findAll({ ...options, attributes: ['entry'], order: ['place'] });
  return {
    features: features.map((row) => row.feature),
    answers: Object.fromEntries(answers.map((row) => [row.class, row.entry])),
    overhead_none_known_as_of: site.overhead_none_known_as_of,
    locates: locates.map((row) => row.entry),
  };
}
