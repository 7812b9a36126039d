// @ts-check
import { Refusal } from './refusal.mjs';

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
 * keeps the database whole and each part of it has its own time limit.
 * @param {(signal: NodeJS.Signals) => Promise<void>} stop
 */
export function onSignal(stop) {
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => {
      if (stopping) return;
      stopping = true;
      void stop(signal);
    });
  }
}
