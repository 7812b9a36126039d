// @ts-check
import { randomBytes, randomUUID } from 'node:crypto';
import { chmodSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Refusal } from './refusal.mjs';

/**
 * @typedef {object} Secrets
 * @property {string} databaseId which private database belongs to this folder
 * @property {string} rootPassword
 * @property {string} appPassword
 * @property {string} nextAuthSecret
 */

const FILE = 'secrets.json';

/**
 * What this copy keeps to itself, made at the first start.
 * @param {string} dataFolder
 * @param {string} [databaseId] of a database that is already there without its secrets
 * @returns {Secrets}
 */
export function keptSecrets(dataFolder, databaseId) {
  const file = join(dataFolder, FILE);
  const kept = readSecrets(file);
  if (kept) return kept;
  const made = {
    databaseId: databaseId ?? randomUUID(),
    rootPassword: randomBytes(24).toString('hex'),
    appPassword: randomBytes(24).toString('hex'),
    nextAuthSecret: randomBytes(32).toString('base64url'),
  };
  writeFileSync(file, `${JSON.stringify(made, null, 2)}\n`, { mode: 0o600, flag: 'wx' });
  return made;
}

/**
 * @param {string} file
 * @returns {Secrets | null}
 */
function readSecrets(file) {
  let text;
  try {
    text = readFileSync(file, 'utf8');
  } catch (fault) {
    if (/** @type {NodeJS.ErrnoException} */ (fault).code === 'ENOENT') return null;
    throw fault;
  }
  chmodSync(file, 0o600);
  const kept = parse(text);
  // The passwords go into SQL, so nothing but what was made here is accepted.
  const whole =
    /^[0-9a-f-]{36}$/.test(kept.databaseId ?? '') &&
    /^[0-9a-f]{48}$/.test(kept.rootPassword ?? '') &&
    /^[0-9a-f]{48}$/.test(kept.appPassword ?? '') &&
    (kept.nextAuthSecret ?? '').length >= 32;
  if (!whole) {
    throw new Refusal(
      `${file} is damaged; delete it and run the command again (new ones are made, the data stays, people sign in again).`,
    );
  }
  return /** @type {Secrets} */ (kept);
}

/**
 * @param {string} text
 * @returns {Partial<Secrets>}
 */
function parse(text) {
  try {
    return JSON.parse(text) ?? {};
  } catch {
    return {};
  }
}
