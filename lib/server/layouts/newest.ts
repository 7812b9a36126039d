import 'server-only';
import type { StaleLayout } from '@/lib/api';
import { db } from '../database';
import { whoOf } from '../people/who';
import type { SignedIn } from '../session';
import { openDocument } from './document';
import { findLayout } from './find-layout';

/** The newest version, as the answer to a save that was made from an older one. */
export async function newestVersion(person: SignedIn, layoutId: string): Promise<StaleLayout> {
  const layout = (await findLayout(person, layoutId, {
    include: { model: db.Person, as: 'savedBy', attributes: ['id', 'name'] },
  })) as db.Layout & { savedBy: db.Person | null };
  return {
    version: layout.version,
    layout: openDocument(layout.document),
    saved_at: layout.saved_at.toISOString(),
    saved_by: whoOf(layout.savedBy),
  };
}
