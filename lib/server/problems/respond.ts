import 'server-only';
import { randomUUID } from 'node:crypto';
import { PROBLEM_TYPE, type ProblemDetails } from '@/lib/api';
import { log } from '../log';
import { refusalFrom } from './from-error';
import { Refusal, STATUSES } from './problem';

/**
 * Any error as problem details. An unknown one stays private: the answer and the log share a
 * reference, and only the log has the rest.
 */
export function problemResponse(error: unknown, where: string): Response {
  const refusal = refusalFrom(error);
  if (refusal && refusal.code !== 'database-away') return respond(refusal);

  const reference = randomUUID().slice(0, 8);
  if (refusal) {
    log.warn({ reference, where, err: error }, 'the database is not answering');
    return respond(refusal, reference);
  }
  log.error({ reference, where, err: error }, 'request failed');
  return respond(
    new Refusal(
      'unknown',
      `Something failed on the server and nothing was changed by this request. Try again; if it keeps failing, tell your administrator the reference ${reference}.`,
    ),
    reference,
  );
}

function respond(refusal: Refusal, reference?: string): Response {
  const { status, title } = STATUSES[refusal.code];
  const { retryAfterSeconds, faults, current } = refusal.extras;
  const details: ProblemDetails = {
    type: 'about:blank',
    title,
    status,
    detail: refusal.message,
    code: refusal.code,
    ...(reference && { reference }),
    ...(faults && { faults: [...faults] }),
    ...(current !== undefined && { current }),
  };
  const headers = new Headers({ 'content-type': PROBLEM_TYPE, 'cache-control': 'no-store' });
  if (retryAfterSeconds) headers.set('retry-after', String(retryAfterSeconds));
  return new Response(JSON.stringify(details), { status, headers });
}
