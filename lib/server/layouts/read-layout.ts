import 'server-only';
import { actionsOf } from '@/lib/access';
import type { LayoutAnswer } from '@/lib/api';
import { db, database } from '../database';
import { listKits } from '../kits/list-kits';
import { limitsInForce } from '../limits/in-force';
import { whoOf } from '../people/who';
import type { SignedIn } from '../session';
import { groundOf } from '../sites/ground';
import { baseMapAnswer } from '../sites/rows';
import { openDocument } from './document';
import { findLayout } from './find-layout';

type Found = db.Layout & {
  site: db.Site & { baseMap: db.BaseMap | null };
  drawnBy: db.Person | null;
  savedBy: db.Person | null;
};

/** Everything the drawing needs, of one moment. */
export async function readLayout(person: SignedIn, layoutId: string): Promise<LayoutAnswer> {
  const { layout, ground } = await database.transaction(async (transaction) => {
    const found = (await findLayout(person, layoutId, {
      include: [
        { model: db.Site, as: 'site', include: [{ model: db.BaseMap, as: 'baseMap' }] },
        { model: db.Person, as: 'drawnBy', attributes: ['id', 'name'] },
        { model: db.Person, as: 'savedBy', attributes: ['id', 'name'] },
      ],
      transaction,
    })) as Found;
    return { layout: found, ground: await groundOf(found.site, transaction) };
  });
  const { limits, number } = await limitsInForce(person);
  return {
    id: layout.id,
    version: layout.version,
    layout: openDocument(layout.document),
    site: {
      id: layout.site.id,
      name: layout.site.name,
      ground,
      ground_version: layout.site.version,
    },
    limits,
    limits_number: number,
    kits: (await listKits(person)).kits,
    base_map: baseMapAnswer(layout.site.baseMap),
    agency: { name: person.agencyName },
    me: { id: person.id, name: person.name, role: person.role, can: actionsOf(person.role) },
    drawn_by: whoOf(layout.drawnBy),
    saved_by: whoOf(layout.savedBy),
    saved_at: layout.saved_at.toISOString(),
  };
}
