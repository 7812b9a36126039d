// @ts-check
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { Refusal } from './refusal.mjs';
import { step } from './say.mjs';
import { runScript } from './tool.mjs';

/** @typedef {{ name: string, email: string, role: string, password: string }} SignIn */

/**
 * Brings the tables up to date and lays the demo in once.
 * @param {string} root
 * @param {NodeJS.ProcessEnv} env with DATABASE_URL and STILLGROUND_DATA
 * @param {{ ownServer: boolean }} [options] whether the server is one that a person named
 */
export async function prepareData(root, env, { ownServer } = { ownServer: false }) {
  const advice = ownServer
    ? 'check that DATABASE_URL is right and its server reachable, then run the command again'
    : 'put right what it says and run the command again';
  const scripts = /** @type {const} */ ([
    ['Bringing the database up to date', 'scripts/migrate.ts'],
    ['Laying in the demo', 'scripts/seed.ts'],
  ]);
  for (const [label, file] of scripts) {
    await step(label, async () => {
      const { code } = await runScript(root, file, { env, live: true });
      if (code !== 0) throw new Refusal(`${label} failed, as said above; ${advice}.`);
    });
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
