// @ts-check
import { readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { ensureBuild, isBuilt } from './build.mjs';
import { LOCK_FILE } from './claim.mjs';
import { readNote } from './folder-lock.mjs';
import { isAlive } from './process-identity.mjs';
import { Refusal } from './refusal.mjs';
import { say, seconds } from './say.mjs';
import { tallyReport } from './test-tally.mjs';
import { runTool } from './tool.mjs';

/**
 * @typedef {import('./test-tally.mjs').Tally} Tally
 * @typedef {{ root: string, dataFolder: string, env: NodeJS.ProcessEnv }} Bench
 * @typedef {{ name: string, run: (on: Bench) => Promise<{ tally: Tally, output: string }> }} TestStep
 */

/** @type {readonly TestStep[]} */
export const STEPS = [
  { name: 'format', run: (on) => asOneTest(on, 'prettier', ['--check', '.']) },
  { name: 'lint', run: (on) => asOneTest(on, 'eslint', ['--max-warnings=0', '.']) },
  { name: 'types', run: types },
  { name: 'unit', run: (on) => vitest(on, 'unit') },
  { name: 'published', run: (on) => vitest(on, 'published') },
  { name: 'api', run: (on) => vitest(on, 'api') },
  { name: 'build', run: build },
  { name: 'browser', run: (on) => vitest(on, 'browser') },
];

/**
 * @param {Bench} on
 * @param {import('./tool.mjs').Tool} tool
 * @param {readonly string[]} args
 */
async function asOneTest({ root, env }, tool, args) {
  const { code, output } = await runTool(root, tool, args, { env });
  return { tally: asTally(code === 0), output };
}

/** @param {boolean} passed */
function asTally(passed) {
  return passed ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

/** @param {Bench} on */
async function types(on) {
  // Next's own types, of styles and routes, exist only once it has written them.
  const { code, output } = await runTool(on.root, 'next', ['typegen'], { env: on.env });
  if (code !== 0) return { tally: asTally(false), output };
  return asOneTest(on, 'tsc', ['--noEmit']);
}

/** @param {Bench} on */
async function build({ root, env }) {
  const serving = readNote(join(root, '.data', LOCK_FILE));
  if (serving && isAlive(serving.holder) && !isBuilt(root)) {
    throw new Refusal(
      `Stillground is being served from this folder (process ${serving.holder.pid}) by an older build, which a new one would pull from under it; stop it and run npm test again.`,
    );
  }
  await ensureBuild(root, env);
  return { tally: asTally(true), output: '' };
}

/**
 * @param {Bench} on
 * @param {string} project
 */
async function vitest({ root, dataFolder, env }, project) {
  const report = join(dataFolder, `${project}.json`);
  rmSync(report, { force: true });
  const args = ['run', '--project', project, '--reporter=default', '--reporter=json'];
  const { code, output } = await runTool(root, 'vitest', [...args, `--outputFile.json=${report}`], {
    env,
  });
  const tally = readReport(report);
  // An error outside any test, or no test at all, fails the run without failing a test.
  if (code !== 0 && tally.failed === 0) tally.failed = 1;
  return { tally, output };
}

/**
 * @param {string} file
 * @returns {Tally}
 */
function readReport(file) {
  try {
    return tallyReport(JSON.parse(readFileSync(file, 'utf8')));
  } catch {
    // It never got so far as to write one.
    return { passed: 0, failed: 1 };
  }
}

/**
 * Runs one step and tells how it went; what it wrote is shown only when something failed.
 * @param {TestStep} testStep
 * @param {Bench} on
 * @returns {Promise<Tally>}
 */
export async function runStep({ name, run }, on) {
  const began = performance.now();
  const elapsed = () => seconds(performance.now() - began);
  say(`${name} …`);
  const heartbeat = setInterval(() => say(`${name} … ${elapsed()}`), 20_000);
  let result;
  try {
    result = await run(on);
  } catch (fault) {
    const output =
      fault instanceof Refusal ? fault.message : String(/** @type {Error} */ (fault).stack);
    result = { tally: { passed: 0, failed: 1 }, output };
  } finally {
    clearInterval(heartbeat);
  }
  const { passed, failed } = result.tally;
  if (failed > 0) say(`\n${result.output.trimEnd()}\n`);
  say(`${name}: ${passed} passed, ${failed} failed (${elapsed()})`);
  return result.tally;
}
