// @ts-check

const HEARTBEAT_MS = 10_000;
const WORTH_TIMING_MS = 1_000;

// When the terminal is closed, stopping cleanly matters more than telling about it.
process.stdout.on('error', () => undefined);

/** @type {NodeJS.WriteStream} */
let stream = process.stdout;

/** For commands whose standard output is read by machines. */
export function progressOnStderr() {
  stream = process.stderr;
}

/** @param {string} line */
export function say(line) {
  stream.write(`${line}\n`);
}

/** @param {number} ms */
export function seconds(ms) {
  return ms < 10_000 ? `${(ms / 1000).toFixed(1)} s` : `${Math.round(ms / 1000)} s`;
}

/**
 * Does one long thing and shows that it is still going: a line at the start, the elapsed time every
 * ten seconds and at the end.
 * @template T
 * @param {string} label
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function step(label, work) {
  const began = performance.now();
  const elapsed = () => performance.now() - began;
  say(`${label} …`);
  const heartbeat = setInterval(() => say(`${label} … ${seconds(elapsed())}`), HEARTBEAT_MS);
  try {
    const result = await work();
    if (elapsed() >= WORTH_TIMING_MS) say(`${label}: done in ${seconds(elapsed())}`);
    return result;
  } finally {
    clearInterval(heartbeat);
  }
}
