import 'server-only';
import type { Transaction } from 'sequelize';
import { isCollision } from '../problems/from-error';
import { database } from './database';

const MOST_RUNS = 4;

/**
 * Runs the work in one transaction, all or nothing. When MariaDB undoes it to end a deadlock it is
 * run again, so the work must change nothing but the database.
 *
 * Inside, write the row that is compared (or lock it) before reading anything: MariaDB's default
 * isolation shows a transaction the state as of its first read, and a read before the lock would
 * be of the past.
 */
export async function inTransaction<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
  for (let run = 1; ; run += 1) {
    try {
      return await database.transaction(work);
    } catch (error) {
      if (!isCollision(error) || run >= MOST_RUNS) throw error;
    }
  }
}
