import { randomBytes } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import { join } from 'node:path';
import type { TestProject } from 'vitest/node';
import { openDatabase } from '../../lib/server/database/open';
import { ensureBuild } from '../../scripts/bootstrap/build.mjs';
import { claim } from '../../scripts/bootstrap/claim.mjs';
import { anyFreePort } from '../../scripts/bootstrap/ports.mjs';
import { demoSignIns, prepareData } from '../../scripts/bootstrap/prepare-data.mjs';
import { root } from '../../scripts/bootstrap/root.mjs';
import { onStop, stopAll } from '../../scripts/bootstrap/stopping.mjs';
import { startWeb } from '../../scripts/bootstrap/web-server.mjs';

export type SignIn = { name: string; email: string; role: string; password: string };

declare module 'vitest' {
  export interface ProvidedContext {
    /** Of the served production build, without a slash at its end. */
    address: string;
    /** The demo's people. */
    signIns: SignIn[];
  }
}

/**
 * The production build, served on a port of its own over a database of its own with the demo laid
 * in; everything is gone again after the run.
 */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const server = process.env.TEST_DATABASE_URL ?? process.env.DATABASE_URL;
  if (!server) {
    throw new Error(
      'The browser tests need a MariaDB server: set TEST_DATABASE_URL to an account that may create databases, or run `npm test`, which starts one.',
    );
  }
  const dataFolder = join(root, '.data', 'test', 'browser');
  const run = await claim(dataFolder, 'the browser tests');
  // A signal must not leave a server behind that nobody knows of.
  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    process.once(signal, () => void stopAll().finally(() => process.exit(1)));
  }
  try {
    const databaseUrl = await freshDatabase(server);
    const port = await anyFreePort();
    const address = `http://localhost:${port}`;
    const env: NodeJS.ProcessEnv = {
      ...process.env,
      DATABASE_URL: databaseUrl,
      STILLGROUND_DATA: dataFolder,
      NEXTAUTH_URL: address,
      NEXTAUTH_SECRET: randomBytes(32).toString('base64url'),
      NEXT_TELEMETRY_DISABLED: '1',
      TZ: 'UTC',
    };
    await prepareData(root, env);
    await ensureBuild(root, env);
    const log = createWriteStream(join(dataFolder, 'web-server.log'));
    const web = await startWeb(root, {
      port,
      env,
      log: (text) => void log.write(text),
      began: run.noting('web server'),
    });
    if ('portTaken' in web) throw new Error(`Port ${port} was taken meanwhile; run it again.`);
    project.provide('address', address);
    project.provide('signIns', await demoSignIns(dataFolder));
  } catch (fault) {
    await stopAll();
    throw fault;
  }
  return stopAll;
}

async function freshDatabase(server: string): Promise<string> {
  const name = `stillground_browser_${process.pid}_${randomBytes(3).toString('hex')}`;
  const address = new URL(server);
  address.pathname = '/information_schema';
  const statement = async (sql: string) => {
    const admin = openDatabase(address.href, 1);
    await admin.query(sql);
    await admin.close();
  };
  await statement(`CREATE DATABASE ${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  onStop(() => statement(`DROP DATABASE ${name}`));
  const own = new URL(server);
  own.pathname = `/${name}`;
  return own.href;
}
