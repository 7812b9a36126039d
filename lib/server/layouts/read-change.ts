import 'server-only';
import type { ChangeAnswer } from '@/lib/api';
import { db } from '../database';
import { knownId } from '../database/known-id';
import { notFound } from '../problems';
import type { SignedIn } from '../session';
import { openDocument } from './document';
import { changeRow } from './list-changes';

/** One version with the document as it was. */
export async function readChange(
  person: SignedIn,
  layoutId: string,
  version: number,
): Promise<ChangeAnswer> {
  const found = (await db.LayoutChange.findOne({
    where: { agency_id: person.agencyId, layout_id: knownId(layoutId, 'layout'), version },
    include: { model: db.Person, as: 'person', attributes: ['id', 'name'] },
  })) as (db.LayoutChange & { person: db.Person }) | null;
  if (!found) throw notFound('version of this layout');
  return { ...changeRow(found), layout: openDocument(found.document) };
}
