import { db, database, inTransaction } from '../lib/server/database';
import { DEMO_LAYOUTS, DEMO_SITES } from '../demo/demo';
import { seedAgency } from './seed/agency';
import { seedPlaces } from './seed/places';
import { keepSignIns, makeSignIns } from './seed/sign-ins';

/**
 * Lays the demonstration into an empty database, once: a database that holds an agency is left as
 * it is. Generated passwords go to demo-sign-ins.json in the folder STILLGROUND_DATA names.
 */
async function main(): Promise<void> {
  if ((await db.Agency.count()) > 0) {
    process.stdout.write('The database already holds an agency; it is left as it is.\n');
    return;
  }
  const folder = process.env.STILLGROUND_DATA;
  if (!folder) throw new Error('STILLGROUND_DATA is not set: the demo’s sign-ins need a folder.');

  const signIns = makeSignIns();
  await inTransaction(async (transaction) => {
    const planner = await seedAgency(signIns, transaction);
    await seedPlaces(planner, transaction);
    // Before the commit: an agency whose passwords nobody knows could never be entered.
    await keepSignIns(folder, signIns);
  });
  process.stdout.write(
    `Laid in the demo: ${DEMO_SITES.length} sites, ${DEMO_LAYOUTS.length} layouts, ${signIns.length} people.\n`,
  );
}

main()
  .catch((error: unknown) => {
    process.stderr.write(
      `${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`,
    );
    process.exitCode = 1;
  })
  .finally(() => database.close());
