import 'server-only';
import type { Sequelize } from 'sequelize';
import { defineModels } from '@/models';
import { openDatabase, SettingError } from './open';

declare global {
  /** Outlives a reload in development, which would otherwise leave its connections behind. */
  var stillgroundDatabase: Sequelize | undefined;
}

function open(): Sequelize {
  const address = process.env.DATABASE_URL;
  if (address) return openDatabase(address);
  // A build loads this file without a database; only asking one needs its address.
  const unset = openDatabase('mariadb://unset/unset');
  unset.addHook('beforeConnect', () => {
    throw new SettingError(
      'DATABASE_URL',
      'DATABASE_URL is not set, so there is no database to ask.',
    );
  });
  return unset;
}

/** The application's database. Importing it ties the models to it; nothing connects yet. */
export const database: Sequelize = (globalThis.stillgroundDatabase ??= open());
defineModels(database);
