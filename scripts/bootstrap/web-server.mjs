// @ts-check
import { spawn } from 'node:child_process';
import { setTimeout as wait } from 'node:timers/promises';
import { end, identify } from './process-identity.mjs';
import { Refusal } from './refusal.mjs';
import { tail } from './run.mjs';
import { mustGoOn, onStop } from './stopping.mjs';
import { toolCommand } from './tool.mjs';

const READY_WITHIN_MS = 3 * 60_000;
// Next may not end by itself while a browser keeps a connection open.
const STOPPED_WITHIN_MS = 8_000;
const KEPT_OUTPUT = 20_000;

/**
 * @typedef {object} WebServer
 * @property {import('./process-identity.mjs').ProcessIdentity} identity
 * @property {Promise<void>} ended
 * @property {() => Promise<void>} stop
 */

/**
 * Starts Next on a port and waits until it answers.
 * @param {string} root
 * @param {{ port: number, env: NodeJS.ProcessEnv, dev?: boolean, log: (text: string) => void, began?: (identity: import('./process-identity.mjs').ProcessIdentity) => void }} options
 * @returns {Promise<WebServer | { portTaken: true }>}
 */
export async function startWeb(root, { port, env, dev = false, log, began }) {
  mustGoOn();
  const [command, args] = toolCommand(root, 'next', [dev ? 'dev' : 'start', '-p', String(port)]);
  const child = spawn(command, args, {
    cwd: root,
    env: { ...env, NODE_ENV: dev ? 'development' : 'production' },
    stdio: ['ignore', 'pipe', 'pipe'],
    // Its own group: Ctrl-C reaches the launcher alone, which then stops things in their order.
    detached: true,
  });
  let output = '';
  for (const stream of [child.stdout, child.stderr]) {
    stream.setEncoding('utf8').on('data', (text) => {
      output = (output + text).slice(-KEPT_OUTPUT);
      log(text);
    });
  }
  let alive = true;
  /** @type {Promise<void>} */
  const ended = new Promise((resolve) => {
    child.once('close', () => resolve());
    child.once('error', () => resolve());
  });
  void ended.then(() => {
    alive = false;
  });
  if (child.pid === undefined) throw new Refusal(`Node could not be run again from ${command}.`);
  const identity = identify(child.pid);
  began?.(identity);
  const stop = async () => {
    forget();
    await end(identity, { patienceMs: STOPPED_WITHIN_MS, insist: true });
    endGroup(identity.pid);
  };
  const forget = onStop(stop);
  const until = performance.now() + READY_WITHIN_MS;
  // Both: another server on the port would answer too, while this one is still about to fail.
  while (alive && !(/Ready in/.test(output) && (await answers(port)))) {
    if (performance.now() > until) {
      await stop();
      throw new Refusal(`The web server did not answer within three minutes:\n${tail(output)}`);
    }
    await wait(150);
  }
  if (!alive) {
    forget();
    if (/EADDRINUSE/.test(output)) return { portTaken: true };
    throw new Refusal(`The web server did not start:\n${tail(output)}`);
  }
  return { identity, ended, stop };
}

/**
 * Whatever the server itself had started and left behind.
 * @param {number} leader
 */
function endGroup(leader) {
  try {
    process.kill(-leader, 'SIGKILL');
  } catch (fault) {
    if (/** @type {NodeJS.ErrnoException} */ (fault).code !== 'ESRCH') throw fault;
  }
}

/** @param {number} port */
async function answers(port) {
  try {
    // Any answer will do, an error page too: the point is that it listens.
    await fetch(`http://127.0.0.1:${port}/api/health`, { signal: AbortSignal.timeout(30_000) });
    return true;
  } catch {
    return false;
  }
}
