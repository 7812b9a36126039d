import 'server-only';
import { isDeepStrictEqual } from 'node:util';
import type { z } from 'zod';
import type { layoutSave, SavedAnswer } from '@/lib/api';
import { inTransaction } from '../database';
import { Refusal, refuseFaults } from '../problems';
import type { SignedIn } from '../session';
import { duplicateFaults } from './duplicate-faults';
import { newestVersion } from './newest';
import { writeVersion } from './write-version';

/** Saves if nobody saved since `version`; else refuses with the newest, and neither is lost. */
export async function saveLayout(
  person: SignedIn,
  layoutId: string,
  version: number,
  { layout, label }: z.output<typeof layoutSave>,
): Promise<SavedAnswer> {
  const faults = duplicateFaults(layout.pieces, 'layout.pieces');
  if (faults.length > 0) throw refuseFaults(faults);

  const at = new Date();
  const saved = await inTransaction((transaction) =>
    writeVersion(
      person,
      { layoutId, from: version, layout, label, action: 'saved', at },
      transaction,
    ),
  );
  if (saved) return { version: version + 1, saved_at: at.toISOString() };

  const current = await newestVersion(person, layoutId);
  // The same save sent again, because the answer to the first got lost on its way.
  const repeated =
    current.version === version + 1 &&
    current.saved_by?.id === person.id &&
    isDeepStrictEqual(current.layout, layout);
  if (repeated) return { version: current.version, saved_at: current.saved_at };

  throw new Refusal(
    'stale',
    `${current.saved_by?.name ?? 'Someone'} saved this layout in the meantime. Neither version is lost: choose which to go on with.`,
    { current },
  );
}
