import 'server-only';

/** The models, reached through here so that nobody uses one before it is tied to the database. */
export * as db from '@/models';
export { database } from './database';
export { SettingError } from './open';
export { inTransaction } from './transaction';
