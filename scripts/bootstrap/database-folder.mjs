// @ts-check
import {
  lstatSync,
  mkdirSync,
  readFileSync,
  readdirSync,
  renameSync,
  rmSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { Refusal } from './refusal.mjs';
import { run, tail } from './run.mjs';

const MARKER = 'stillground.json';

/**
 * The identity of the private database in a folder; null if there is none yet. Refuses everything
 * that Stillground did not make itself: a database server writes to whatever it is given.
 * @param {string} folder
 * @returns {string | null}
 */
export function databaseIn(folder) {
  let found;
  try {
    found = lstatSync(folder);
  } catch (fault) {
    if (/** @type {NodeJS.ErrnoException} */ (fault).code === 'ENOENT') return null;
    throw fault;
  }
  if (!found.isDirectory()) {
    throw new Refusal(`${folder} is not a folder; move it away and run the command again.`);
  }
  const me = process.getuid?.();
  if (me !== undefined && found.uid !== me) {
    throw new Refusal(
      `${folder} belongs to another user (number ${found.uid}); run the command as that user, or use a copy of your own.`,
    );
  }
  if (readdirSync(folder).length === 0) {
    rmSync(folder, { recursive: true });
    return null;
  }
  const id = readMarker(folder);
  if (!id) {
    throw new Refusal(
      `${folder} holds a database that Stillground did not make; move it away and run the command again.`,
    );
  }
  return id;
}

/**
 * Makes sure that a database is the one these secrets belong to.
 * @param {string} folder
 * @param {string | null} found
 * @param {string} wanted
 */
export function checkIdentity(folder, found, wanted) {
  if (found !== null && found !== wanted) {
    throw new Refusal(
      `${folder} is the database of another copy of Stillground; move it away, or bring the secrets.json that was kept beside it.`,
    );
  }
}

/** @param {string} folder */
function readMarker(folder) {
  try {
    const marker = JSON.parse(readFileSync(join(folder, MARKER), 'utf8'));
    return marker?.madeBy === 'stillground' && typeof marker.id === 'string' ? marker.id : null;
  } catch {
    return null;
  }
}

/**
 * Makes an empty database beside its place and moves it there whole, so that an interruption
 * leaves nothing that looks like one.
 * @param {string} folder
 * @param {string} id
 * @param {{ installer: string, plainFolder: string }} by the command mariadb-install-db, and a
 *   folder whose path has no spaces, because that command can't handle them
 */
export async function createDatabase(folder, id, { installer, plainFolder }) {
  const draft = `${folder}.new`;
  rmSync(draft, { recursive: true, force: true });
  mkdirSync(draft, { mode: 0o700 });
  const plainDraft = join(plainFolder, 'new');
  rmSync(plainDraft, { force: true });
  symlinkSync(draft, plainDraft);
  const asRoot = process.getuid?.() === 0 ? ['--user=root'] : [];
  const { code, output } = await run(installer, [
    '--no-defaults',
    ...asRoot,
    `--datadir=${plainDraft}`,
    '--auth-root-authentication-method=normal',
    '--skip-test-db',
    '--skip-name-resolve',
  ]);
  rmSync(plainDraft, { force: true });
  if (code !== 0) {
    throw new Refusal(
      `The private database could not be made in ${folder}; put right what MariaDB says and run the command again:\n${tail(output)}`,
    );
  }
  writeFileSync(join(draft, MARKER), `${JSON.stringify({ madeBy: 'stillground', id })}\n`);
  renameSync(draft, folder);
}
