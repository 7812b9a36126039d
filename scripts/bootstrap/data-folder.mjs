// @ts-check
import { chmodSync, lstatSync, mkdirSync } from 'node:fs';
import { Refusal } from './refusal.mjs';

/**
 * Makes a folder that only its owner may look into, or makes sure that the one there is such.
 * @param {string} folder
 */
export function ensurePrivateFolder(folder) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const found = lstatSync(folder);
  if (!found.isDirectory()) {
    throw new Refusal(`${folder} is not a folder; move it away and run the command again.`);
  }
  const me = process.getuid?.();
  if (me !== undefined && found.uid !== me) {
    throw new Refusal(
      `${folder} belongs to another user (number ${found.uid}); run the command as that user, or use a copy of your own.`,
    );
  }
  if ((found.mode & 0o077) !== 0) chmodSync(folder, 0o700);
}
