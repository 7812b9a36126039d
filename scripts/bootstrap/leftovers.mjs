// @ts-check
import { end, isAlive } from './process-identity.mjs';
import { Refusal } from './refusal.mjs';
import { step } from './say.mjs';

/**
 * Ends what a launcher that was killed outright left running, in the order it would have kept.
 * @param {import('./folder-lock.mjs').LockNote | null} left
 */
export async function endLeftovers(left) {
  const alive = (left?.children ?? []).filter(isAlive).reverse();
  if (alive.length === 0) return;
  const names = alive.map(({ name }) => name).join(' and ');
  await step(`Ending what an earlier run left behind (${names})`, async () => {
    for (const child of alive) {
      const isDatabase = child.name === 'database';
      const gone = await end(child, {
        patienceMs: isDatabase ? 60_000 : 8_000,
        insist: !isDatabase,
      });
      if (!gone) {
        throw new Refusal(
          `The ${child.name} of an earlier run (process ${child.pid}) is still busy; wait until it has ended and run the command again.`,
        );
      }
    }
  });
}
