import { BaseError, ConnectionError, DatabaseError, TimeoutError } from 'sequelize';
import { Refusal } from './problem';

/** What the driver says when the connection went, whatever it was doing. */
const CONNECTION_LOST = new Set([
  'ER_SOCKET_UNEXPECTED_CLOSE',
  'ER_SOCKET_BAD_PORT',
  'ER_CMD_CONNECTION_CLOSED',
  'ER_CMD_NOT_EXECUTED_DESTROYED',
  'ER_CONNECTION_TIMEOUT',
  'ER_SOCKET_TIMEOUT',
  'ER_CONNECTION_ALREADY_CLOSED',
  'ER_CONNECTION_KILLED',
  'ER_SERVER_SHUTDOWN',
  'ER_NORMAL_SHUTDOWN',
  'ECONNRESET',
  'ECONNREFUSED',
  'EPIPE',
]);

const codeOf = (error: unknown): string | null =>
  typeof error === 'object' && error !== null && 'code' in error && typeof error.code === 'string'
    ? error.code
    : null;

export function isDatabaseAway(error: unknown): boolean {
  if (error instanceof ConnectionError || error instanceof TimeoutError) return true;
  const inner = error instanceof DatabaseError ? error.parent : error;
  const code = codeOf(inner);
  return code !== null && CONNECTION_LOST.has(code);
}

/** Two transactions in each other's way: MariaDB undid one of them, which may simply run again. */
export function isCollision(error: unknown): boolean {
  const code = error instanceof BaseError && 'parent' in error ? codeOf(error.parent) : null;
  return code === 'ER_LOCK_DEADLOCK' || code === 'ER_LOCK_WAIT_TIMEOUT';
}

export const databaseAway = (): Refusal =>
  new Refusal(
    'database-away',
    'The database is not answering. What was saved before is kept; what is on the screen stays there. Try again in a moment.',
    { retryAfterSeconds: 5 },
  );

/** The refusal an error amounts to; null where it is a failure of ours. */
export function refusalFrom(error: unknown): Refusal | null {
  if (error instanceof Refusal) return error;
  return isDatabaseAway(error) ? databaseAway() : null;
}
