import { migrate } from '../migrations';
import { openDatabase } from '../lib/server/database/open';

/** Brings the database at DATABASE_URL up to date. */
async function main(): Promise<void> {
  const database = openDatabase(process.env.DATABASE_URL ?? '', 1);
  try {
    const done = await migrate(database);
    process.stdout.write(
      done.length === 0
        ? 'The database is up to date.\n'
        : `Brought the database up to ${done.at(-1)}.\n`,
    );
  } finally {
    await database.close();
  }
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
});
