// @ts-check
import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { claim } from './claim.mjs';
import { databaseIn } from './database-folder.mjs';
import {
  BROWSER_PACKAGES,
  DATABASE_PACKAGES,
  ensurePackages,
  findCommand,
} from './debian-packages.mjs';
import { ensureModules } from './node-modules.mjs';
import { openPrivateDatabase } from './private-database.mjs';
import { root } from './root.mjs';
import { isStopping } from './stopping.mjs';
import { runStep, STEPS } from './test-steps.mjs';
import { sum } from './test-tally.mjs';

/** Settings of a person's own that must not reach the tests. */
const OWN_SETTINGS = ['PORT', 'DATABASE_URL', 'SMTP_URL', 'NEXTAUTH_URL', 'NEXTAUTH_SECRET'];

/**
 * Everything a change must pass, with its own set-up and its own fresh database. A failing step
 * does not keep the others from running.
 * @returns {Promise<import('./test-tally.mjs').Tally>}
 */
export async function test() {
  const dataFolder = join(root, '.data', 'test');
  const run = await claim(dataFolder, 'npm test');
  await ensurePackages([...DATABASE_PACKAGES, ...BROWSER_PACKAGES]);
  await ensureModules(root);
  // Each run starts from nothing, so that no test leans on what an earlier run left.
  const folder = join(dataFolder, 'mariadb');
  if (databaseIn(folder) !== null) rmSync(folder, { recursive: true });
  const database = await openPrivateDatabase(dataFolder, { began: run.noting('database') });

  const env = {
    ...process.env,
    TZ: 'UTC',
    NEXT_TELEMETRY_DISABLED: '1',
    NO_COLOR: '1',
    VITE_CONFIG_NATIVE_IGNORE_WARNING: 'true',
    STILLGROUND_DATA: dataFolder,
    TEST_DATABASE_URL: database.rootUrl,
    CHROMIUM: findCommand('chromium') ?? '',
  };
  for (const name of OWN_SETTINGS) delete (/** @type {NodeJS.ProcessEnv} */ (env)[name]);

  const tallies = [];
  for (const testStep of STEPS) {
    if (isStopping()) break;
    tallies.push(await runStep(testStep, { root, dataFolder, env }));
  }
  return sum(tallies);
}
