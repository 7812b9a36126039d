import { randomBytes } from 'node:crypto';
import { migrate } from '../../migrations';
import { openDatabase } from '../../lib/server/database/open';

/**
 * A database of its own for every run, on the server that TEST_DATABASE_URL (else DATABASE_URL)
 * names; its account must be allowed to create and drop databases.
 */
export default async function setup(): Promise<() => Promise<void>> {
  const server = process.env.TEST_DATABASE_URL ?? process.env.DATABASE_URL;
  if (!server) {
    throw new Error(
      'The api tests need a MariaDB server: set TEST_DATABASE_URL to an account that may create databases, or run `npm test`, which starts one.',
    );
  }
  const name = `stillground_test_${process.pid}_${randomBytes(3).toString('hex')}`;
  const address = new URL(server);
  address.pathname = `/${name}`;
  const admin = new URL(server);
  admin.pathname = '/information_schema';

  await run(admin.href, `CREATE DATABASE ${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  const database = openDatabase(address.href, 1);
  await migrate(database);
  await database.close();

  // The workers start after this and take these with them.
  process.env.DATABASE_URL = address.href;
  process.env.NEXTAUTH_SECRET = randomBytes(32).toString('base64');
  process.env.NEXTAUTH_URL = 'http://localhost';
  process.env.LOG_LEVEL = 'silent';
  process.env.TZ = 'UTC';
  return () => run(admin.href, `DROP DATABASE ${name}`);
}

async function run(address: string, statement: string): Promise<void> {
  const database = openDatabase(address, 1);
  await database.query(statement);
  await database.close();
}
