// @ts-check
import { Refusal } from './refusal.mjs';

const PARENT_LOOKED_AT_MS = 500;

/** @type {(() => Promise<void> | void)[]} */
const undone = [];
let stopping = false;

/**
 * Remembers how to undo something. What began last is stopped first, so that the server is gone
 * before its database.
 * @param {() => Promise<void> | void} stop
 * @returns {() => void} forgets it again
 */
export function onStop(stop) {
  undone.push(stop);
  return () => {
    const at = undone.indexOf(stop);
    if (at >= 0) undone.splice(at, 1);
  };
}

/** Keeps anything new from being started once the stopping has begun: nobody would stop it. */
export function mustGoOn() {
  if (stopping) throw new Refusal('Stopped before it was ready.');
}

export function isStopping() {
  return stopping;
}

/** Stops everything that was begun, each thing even when another failed to stop. */
export async function stopAll() {
  stopping = true;
  /** @type {unknown[]} */
  const faults = [];
  for (let stop = undone.pop(); stop; stop = undone.pop()) {
    try {
      await stop();
    } catch (fault) {
      faults.push(fault);
    }
  }
  if (faults.length > 0) throw new AggregateError(faults, 'Something did not stop cleanly.');
}

/**
 * A first signal stops everything in order; further ones are ignored, because the order is what
 * keeps the database whole and each part of it has its own time limit. Under npm, the end of npm
 * counts as a signal: killed outright, it has no chance to pass one on.
 * @param {() => Promise<void>} stop
 */
export function onSignal(stop) {
  const once = () => {
    if (stopping) return;
    stopping = true;
    void stop();
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, once);
  if (!process.env.npm_lifecycle_event) return;
  const npm = process.ppid;
  setInterval(() => {
    if (process.ppid !== npm) once();
  }, PARENT_LOOKED_AT_MS).unref();
}
