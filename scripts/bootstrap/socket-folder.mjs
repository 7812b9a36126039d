// @ts-check
import { createHash } from 'node:crypto';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ensurePrivateFolder } from './data-folder.mjs';

// Linux gives the name of a local socket 108 bytes, the last of them zero.
const LONGEST_SOCKET_BYTES = 107;

// MariaDB's own installer is a shell script that loses its way at a space.
const PLAIN = /^[\w./-]+$/;

/**
 * Where a database's socket goes: short however long the path of the copy is, and the same one
 * only for the same folder and user.
 * @param {string} databaseFolder absolute
 * @param {string} [temporary]
 */
export function socketPath(databaseFolder, temporary = tmpdir()) {
  const user = process.getuid?.() ?? 0;
  const key = createHash('sha256').update(`${user}:${databaseFolder}`).digest('hex').slice(0, 16);
  const file = join(temporary, `stillground-${key}`, 'db.sock');
  if (Buffer.byteLength(file) <= LONGEST_SOCKET_BYTES && PLAIN.test(file)) return file;
  return join('/tmp', `stillground-${key}`, 'db.sock');
}

/** @param {string} socket */
export function ensureSocketFolder(socket) {
  ensurePrivateFolder(join(socket, '..'));
}
