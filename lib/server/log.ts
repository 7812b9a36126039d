import 'server-only';
import pino from 'pino';

/** One line of JSON an event on standard output. Never a password, a token or a document. */
export const log = pino({
  level: process.env.LOG_LEVEL ?? 'info',
  base: null,
  timestamp: pino.stdTimeFunctions.isoTime,
});
