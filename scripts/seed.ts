import { db, database, inTransaction } from '../lib/server/database';
import { DEMO_LAYOUTS, DEMO_SITES } from '../demo/demo';
import { seedAgency } from './seed/agency';
import { seedBaseMaps } from './seed/base-maps';
import { seedPlaces } from './seed/places';
import { keepSignIns, makeSignIns } from './seed/sign-ins';

/**
 * Lays the demonstration into an empty database, once: a database that holds an agency is left as
 * it is. Generated passwords go to demo-sign-ins.json in the folder STILLGROUND_DATA names.
 */
async function main(): Promise<void> {
  const say = (words: string) => void process.stdout.write(words);
  if ((await db.Agency.count()) > 0)
    say('The database already holds an agency; nothing is added.\n');
  else await layIn(say);
  await seedBaseMaps(say);
}

async function layIn(say: (words: string) => void): Promise<void> {
  const folder = process.env.STILLGROUND_DATA;
  if (!folder) throw new Error('STILLGROUND_DATA is not set: the demo’s sign-ins need a folder.');
  const signIns = makeSignIns();
  await inTransaction(async (transaction) => {
    const planner = await seedAgency(signIns, transaction);
    await seedPlaces(planner, transaction, new Date());
    // Before the commit: an agency whose passwords nobody knows could never be entered.
    await keepSignIns(folder, signIns);
  });
  say(
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
