import 'server-only';
import type { HealthAnswer } from '@/lib/api';
import { database } from '../database';
import { log } from '../log';
import { isDatabaseAway } from '../problems';

/** Whether a query comes back. It says nothing else, because anybody may ask. */
export async function health(): Promise<HealthAnswer> {
  try {
    await database.query('SELECT 1');
    return { status: 'up' };
  } catch (error) {
    if (!isDatabaseAway(error)) log.error({ err: error }, 'health query failed');
    return { status: 'database-away' };
  }
}
