// @ts-check
import { readFileSync } from 'node:fs';
import { setTimeout as wait } from 'node:timers/promises';

/** @typedef {{ pid: number, started: string | null }} ProcessIdentity */

/**
 * A process by its number and the moment it began, because numbers come round again.
 * @param {number} pid
 * @returns {ProcessIdentity}
 */
export function identify(pid) {
  return { pid, started: startOf(pid) };
}

/** @param {ProcessIdentity} identity */
export function isAlive({ pid, started }) {
  try {
    process.kill(pid, 0);
  } catch (fault) {
    // EPERM: it lives, but is somebody else's.
    if (/** @type {NodeJS.ErrnoException} */ (fault).code !== 'EPERM') return false;
  }
  return started === null || startOf(pid) === started;
}

/**
 * Ends a process: asks, waits, and only insists where that is harmless.
 * @param {ProcessIdentity} identity
 * @param {{ patienceMs: number, insist: boolean }} options
 * @returns {Promise<boolean>} whether it is gone
 */
export async function end(identity, { patienceMs, insist }) {
  if (!isAlive(identity)) return true;
  process.kill(identity.pid, 'SIGTERM');
  if (await goneWithin(identity, patienceMs)) return true;
  if (!insist) return false;
  process.kill(identity.pid, 'SIGKILL');
  return goneWithin(identity, 5_000);
}

/**
 * @param {ProcessIdentity} identity
 * @param {number} ms
 */
async function goneWithin(identity, ms) {
  for (const until = performance.now() + ms; performance.now() < until; await wait(50)) {
    if (!isAlive(identity)) return true;
  }
  return !isAlive(identity);
}

/**
 * Clock ticks from boot to the start of the process; null where the system doesn't tell, or for a
 * zombie, which is gone in all but name.
 * @param {number} pid
 */
function startOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'latin1');
    // The name, in brackets, may hold spaces and brackets itself: fields are counted after the last.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return fields[0] === 'Z' ? null : (fields[19] ?? null);
  } catch {
    return null;
  }
}
