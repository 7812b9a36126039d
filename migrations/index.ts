import { type Sequelize, QueryTypes } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import { people } from './0001-people';
import { baseMaps } from './0002-base-maps';
import { sites } from './0003-sites';
import { kitsAndLimits } from './0004-kits-and-limits';
import { layouts } from './0005-layouts';
import { audit } from './0006-audit';
import type { Migration } from './migration';

export const MIGRATIONS: readonly Migration[] = [
  people,
  baseMaps,
  sites,
  kitsAndLimits,
  layouts,
  audit,
];

const LOCK = 'stillground migrations';
const LOCK_SECONDS = 120;

/**
 * Brings the database up to date and answers with the names of the steps that ran. Two servers
 * starting at once take turns; `database` must use a single connection, because the lock is its.
 */
export async function migrate(database: Sequelize): Promise<string[]> {
  const umzug = new Umzug({
    migrations: MIGRATIONS.map(({ name, up }) => ({ name, up: () => up(database) })),
    storage: new SequelizeStorage({ sequelize: database, tableName: 'migrations' }),
    logger: undefined,
  });
  const [lock] = await database.query<{ got: number | null }>(
    'SELECT GET_LOCK(:lock, :seconds) AS got',
    { replacements: { lock: LOCK, seconds: LOCK_SECONDS }, type: QueryTypes.SELECT },
  );
  if (lock?.got !== 1) {
    throw new Error(
      `Another server has been changing this database for more than ${LOCK_SECONDS} seconds. Nothing was changed; start again when it is done.`,
    );
  }
  try {
    return (await umzug.up()).map((step) => step.name);
  } finally {
    await database.query('SELECT RELEASE_LOCK(:lock)', {
      replacements: { lock: LOCK },
      type: QueryTypes.SELECT,
    });
  }
}
