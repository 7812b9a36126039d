// @ts-check
import { linkSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { identify, isAlive } from './process-identity.mjs';

/** @typedef {import('./process-identity.mjs').ProcessIdentity} ProcessIdentity */
/** @typedef {{ holder: ProcessIdentity, address: string | null, children: (ProcessIdentity & { name: string })[] }} LockNote */
/** @typedef {{ note: (change: Partial<LockNote>) => void, release: () => void, left: LockNote | null }} Lock */

/**
 * Takes a folder for this process alone. A lock whose holder is dead is taken over; what the dead
 * holder had running is in `left`.
 * @param {string} file
 * @returns {{ lock: Lock } | { heldBy: LockNote }}
 */
export function takeLock(file) {
  /** @type {LockNote} */
  let mine = { holder: identify(process.pid), address: null, children: [] };
  /** @type {LockNote | null} */
  let left = null;
  const draft = `${file}.${process.pid}`;
  writeFileSync(draft, JSON.stringify(mine), { mode: 0o600 });
  // A link either appears with its whole content or not at all, so nobody reads half a note.
  while (!linked(draft, file)) {
    const held = readNote(file);
    if (held && isAlive(held.holder)) {
      rmSync(draft);
      return { heldBy: held };
    }
    left = clearStale(file) ?? left;
  }
  rmSync(draft);
  const write = () => {
    writeFileSync(draft, JSON.stringify(mine), { mode: 0o600 });
    renameSync(draft, file);
  };
  return {
    lock: {
      left,
      note(change) {
        mine = { ...mine, ...change };
        write();
      },
      release: () => rmSync(file, { force: true }),
    },
  };
}

/**
 * @param {string} file
 * @returns {LockNote | null} null when it is gone or unreadable
 */
export function readNote(file) {
  try {
    const note = JSON.parse(readFileSync(file, 'utf8'));
    return typeof note?.holder?.pid === 'number' ? note : null;
  } catch {
    return null;
  }
}

/**
 * Puts a dead holder's lock aside. Two processes may both find it dead; one of them could then put
 * aside the other's fresh lock, so what was really taken is looked at again and given back if alive.
 * @param {string} file
 */
function clearStale(file) {
  const aside = `${file}.stale-${process.pid}`;
  try {
    renameSync(file, aside);
  } catch (fault) {
    if (/** @type {NodeJS.ErrnoException} */ (fault).code === 'ENOENT') return null;
    throw fault;
  }
  const taken = readNote(aside);
  if (taken && isAlive(taken.holder)) linked(aside, file);
  rmSync(aside, { force: true });
  return taken;
}

/**
 * @param {string} from
 * @param {string} to
 * @returns {boolean} false if something is there already
 */
function linked(from, to) {
  try {
    linkSync(from, to);
    return true;
  } catch (fault) {
    if (/** @type {NodeJS.ErrnoException} */ (fault).code !== 'EEXIST') throw fault;
    return false;
  }
}
