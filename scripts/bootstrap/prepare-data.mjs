// @ts-check
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { Refusal } from './refusal.mjs';
import { tail } from './run.mjs';
import { step } from './say.mjs';
import { runScript } from './tool.mjs';

/** @typedef {{ name: string, email: string, role: string, password: string }} SignIn */

/**
 * Brings the tables up to date and lays the demo in once.
 * @param {string} root
 * @param {NodeJS.ProcessEnv} env with DATABASE_URL and STILLGROUND_DATA
 */
export async function prepareData(root, env) {
  await script(root, env, 'Bringing the database up to date', 'scripts/migrate.ts');
  await script(root, env, 'Laying in the demo', 'scripts/seed.ts');
}

/**
 * @param {string} root
 * @param {NodeJS.ProcessEnv} env
 * @param {string} label
 * @param {string} file
 */
async function script(root, env, label, file) {
  const { code, output } = await step(label, () => runScript(root, file, { env, live: true }));
  if (code !== 0) {
    throw new Refusal(
      `${label} failed (${file}); nothing was started. If DATABASE_URL is set, check it. This was said:\n${tail(output)}`,
    );
  }
}

/**
 * The demo's generated sign-ins; empty where the database was not given a demo from here.
 * @param {string} dataFolder
 * @returns {Promise<SignIn[]>}
 */
export async function demoSignIns(dataFolder) {
  try {
    return JSON.parse(await readFile(join(dataFolder, 'demo-sign-ins.json'), 'utf8'));
  } catch (fault) {
    if (/** @type {NodeJS.ErrnoException} */ (fault).code === 'ENOENT') return [];
    throw fault;
  }
}
