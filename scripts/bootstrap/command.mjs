// @ts-check
import { Refusal } from './refusal.mjs';
import { say } from './say.mjs';
import { isStopping, onSignal, stopAll } from './stopping.mjs';

/**
 * After a signal the one thing left is the stopping, which ends the process itself.
 * @type {Promise<never>}
 */
const FOR_EVER = new Promise(() => undefined);

/**
 * @typedef {object} Manner
 * @property {number} interrupted the exit code when a signal ended it
 * @property {(sentence: string) => void} [refused] says why it stopped
 */

/**
 * Runs a command from its first line to its exit code: signals stop everything in order, a refusal
 * is shown as its sentence, anything unexpected with its stack.
 * @param {() => Promise<number>} work resolves to the exit code
 * @param {Manner} manner
 */
export async function command(work, { interrupted, refused = (sentence) => say(`\n${sentence}`) }) {
  onSignal(async () => {
    say('\nStopping …');
    const code = await stopped(interrupted);
    say('Stopped.');
    process.exit(code);
  });
  let code = 1;
  try {
    code = await work();
  } catch (fault) {
    // What was interrupted by a signal fails as a matter of course; that has been told already.
    if (isStopping()) return FOR_EVER;
    refused(words(fault));
  }
  if (isStopping()) return FOR_EVER;
  process.exitCode = await stopped(code);
}

/** @param {number} code */
async function stopped(code) {
  try {
    await stopAll();
    return code;
  } catch (fault) {
    const faults = fault instanceof AggregateError ? fault.errors : [fault];
    for (const each of faults) say(words(each));
    return 1;
  }
}

/** @param {unknown} fault */
function words(fault) {
  if (fault instanceof Refusal) return fault.message;
  return fault instanceof Error ? (fault.stack ?? fault.message) : String(fault);
}
