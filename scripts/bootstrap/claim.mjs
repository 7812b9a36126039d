// @ts-check
import { join } from 'node:path';
import { ensurePrivateFolder } from './data-folder.mjs';
import { takeLock } from './folder-lock.mjs';
import { endLeftovers } from './leftovers.mjs';
import { Refusal } from './refusal.mjs';
import { onStop } from './stopping.mjs';

/** @typedef {import('./process-identity.mjs').ProcessIdentity} ProcessIdentity */

export const LOCK_FILE = 'running.json';

/**
 * Takes a data folder for this run, and clears up after one that was killed.
 * @param {string} dataFolder
 * @param {string} command as typed, for the refusal
 */
export async function claim(dataFolder, command) {
  ensurePrivateFolder(dataFolder);
  const taken = takeLock(join(dataFolder, LOCK_FILE));
  if ('heldBy' in taken) {
    const { address, holder } = taken.heldBy;
    throw new Refusal(
      `\`${command}\` is already going on in this folder${address ? ` at ${address}` : ''} (process ${holder.pid}); stop that one first, or use another copy.`,
    );
  }
  const { lock } = taken;
  onStop(lock.release);
  await endLeftovers(lock.left);
  /** @type {Map<string, ProcessIdentity>} */
  const children = new Map();
  return {
    /** @param {string} address */
    serving: (address) => lock.note({ address }),
    /**
     * Writes down what was started, so that the next run finds it should this one be killed.
     * @param {string} name
     * @returns {(identity: ProcessIdentity) => void}
     */
    noting: (name) => (identity) => {
      children.set(name, identity);
      lock.note({ children: [...children].map(([of, child]) => ({ name: of, ...child })) });
    },
  };
}
