import 'server-only';
import type { SavedAnswer } from '@/lib/api';
import { inTransaction } from '../database';
import type { SignedIn } from '../session';
import { findLayout } from './find-layout';
import { readChange } from './read-change';
import { writeVersion } from './write-version';

/**
 * Makes an old version the newest once more, as a version of its own: what was newest stays in the
 * history, so a save that falls in between is not written over either.
 */
export async function restoreVersion(
  person: SignedIn,
  layoutId: string,
  version: number,
): Promise<SavedAnswer> {
  const old = await readChange(person, layoutId, version);
  const at = new Date();
  return inTransaction(async (transaction) => {
    const newest = await findLayout(person, layoutId, {
      attributes: ['version'],
      lock: true,
      transaction,
    });
    await writeVersion(
      person,
      {
        layoutId,
        from: newest.version,
        layout: old.layout,
        label: `Restore version ${version}`,
        action: 'restored',
        at,
      },
      transaction,
    );
    return { version: newest.version + 1, saved_at: at.toISOString() };
  });
}
