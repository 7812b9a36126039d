// @ts-check
import { join } from 'node:path';
import { ensureBuild } from './build.mjs';
import { claim } from './claim.mjs';
import { DATABASE_PACKAGES, ensurePackages } from './debian-packages.mjs';
import { patience } from './keep-going.mjs';
import { ensureModules } from './node-modules.mjs';
import { choosePort } from './ports.mjs';
import { demoSignIns, prepareData } from './prepare-data.mjs';
import { openPrivateDatabase } from './private-database.mjs';
import { Refusal } from './refusal.mjs';
import { root } from './root.mjs';
import { say, step } from './say.mjs';
import { keptSecrets } from './secrets.mjs';
import { readSettings } from './settings.mjs';
import { isStopping } from './stopping.mjs';
import { startWeb } from './web-server.mjs';
import { welcome } from './welcome.mjs';

/**
 * From whatever is there to a served application. Returns when it is serving; `fallen` rejects when
 * something that should stay up can't be kept up.
 * @param {{ dev: boolean }} options
 */
export async function start({ dev }) {
  const dataFolder = join(root, '.data');
  const settings = readSettings(process.env);
  // Before the long work, so that a port that will not do is not found out after minutes.
  if (settings.port !== null) await choosePort(settings.port);
  const run = await claim(dataFolder, dev ? 'npm run dev' : 'npm start');
  if (!settings.databaseUrl) await ensurePackages(DATABASE_PACKAGES);
  await ensureModules(root);

  const database = settings.databaseUrl
    ? null
    : await openPrivateDatabase(dataFolder, { began: run.noting('database') });
  const env = {
    ...process.env,
    TZ: 'UTC',
    NEXT_TELEMETRY_DISABLED: '1',
    STILLGROUND_DATA: dataFolder,
    DATABASE_URL: settings.databaseUrl ?? database?.url,
    NEXTAUTH_SECRET: settings.nextAuthSecret ?? keptSecrets(dataFolder).nextAuthSecret,
  };
  await prepareData(root, env, { ownServer: settings.databaseUrl !== null });
  if (!dev) await ensureBuild(root, env);

  /** @param {number} port */
  const serve = (port) =>
    startWeb(root, {
      port,
      env: { ...env, NEXTAUTH_URL: settings.nextAuthUrl ?? `http://localhost:${port}` },
      dev,
      log: (text) => void process.stdout.write(text),
      began: run.noting('web server'),
    });
  const { port, web } = await step('Starting the web server', () =>
    serveOnFreePort(settings, serve),
  );
  const address = settings.nextAuthUrl ?? `http://localhost:${port}`;
  run.serving(address);
  say(welcome(address, await demoSignIns(dataFolder)));

  const keepWeb = keepUp('web server', web, async () => {
    const again = await serve(port);
    if ('portTaken' in again) throw new Refusal(`Port ${port} was taken meanwhile.`);
    return again;
  });
  const keepDatabase = database
    ? keepUp('database', database, () =>
        openPrivateDatabase(dataFolder, {
          port: database.port,
          began: run.noting('database'),
        }),
      )
    : keepWeb;
  return { fallen: Promise.all([keepWeb, keepDatabase]) };
}

/**
 * @param {import('./settings.mjs').Settings} settings
 * @param {(port: number) => ReturnType<typeof startWeb>} serve
 */
async function serveOnFreePort(settings, serve) {
  for (let port = await choosePort(settings.port); ;) {
    const web = await serve(port);
    if (!('portTaken' in web)) return { port, web };
    // Another copy was quicker.
    port = await choosePort(settings.port, port + 1);
  }
}

/**
 * Puts something up again when it falls, until that stops helping.
 * @template {{ ended: Promise<void> }} T
 * @param {string} name
 * @param {T} first
 * @param {() => Promise<T>} again
 */
async function keepUp(name, first, again) {
  const mayAgain = patience();
  for (let current = first; ; current = await again()) {
    await current.ended;
    if (isStopping()) return;
    if (!mayAgain()) throw new Refusal(`The ${name} keeps stopping; see what it wrote above.`);
    say(`The ${name} stopped by itself; starting it again. What was saved is kept.`);
  }
}
