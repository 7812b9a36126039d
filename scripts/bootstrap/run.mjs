// @ts-check
import { spawn } from 'node:child_process';
import { mustGoOn, onStop } from './stopping.mjs';
import { say } from './say.mjs';

const STOPPED_WITHIN_MS = 5_000;

/** @typedef {{ code: number | null, signal: NodeJS.Signals | null, output: string }} Ran */

/**
 * Runs a command to its end and gathers what it wrote.
 * @param {string} command
 * @param {readonly string[]} args
 * @param {{ cwd?: string, env?: NodeJS.ProcessEnv, input?: string, live?: boolean }} [options]
 *   `live` shows each line as it comes, for work whose own progress is worth seeing
 * @returns {Promise<Ran>} also when it failed; rejects only if it could not be started
 */
export function run(command, args, { cwd, env = process.env, input, live = false } = {}) {
  return new Promise((resolve, reject) => {
    mustGoOn();
    const child = spawn(command, args, { cwd, env, stdio: ['pipe', 'pipe', 'pipe'] });
    const closed = new Promise((told) => child.once('close', told));
    const forget = onStop(async () => {
      child.kill('SIGTERM');
      const insisting = setTimeout(() => child.kill('SIGKILL'), STOPPED_WITHIN_MS);
      await closed;
      clearTimeout(insisting);
    });
    let output = '';
    let line = '';
    /** @param {string} text */
    const take = (text) => {
      output += text;
      if (!live) return;
      const lines = (line + text).split('\n');
      line = lines.pop() ?? '';
      for (const whole of lines) say(`  ${whole}`);
    };
    child.stdout.setEncoding('utf8').on('data', take);
    child.stderr.setEncoding('utf8').on('data', take);
    // A command that ends without reading its input is told nothing was lost by this.
    child.stdin.on('error', () => undefined);
    child.stdin.end(input ?? '');
    child.on('error', (fault) => {
      forget();
      reject(fault);
    });
    child.on('close', (code, signal) => {
      forget();
      if (live && line) say(`  ${line}`);
      resolve({ code, signal, output });
    });
  });
}

/**
 * The end of a long output, where the reason usually stands.
 * @param {string} output
 */
export function tail(output, lines = 30) {
  return output.trimEnd().split('\n').slice(-lines).join('\n');
}
