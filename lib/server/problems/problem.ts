import type { Fault, ProblemCode } from '@/lib/api';

/** The one place where a refusal gets its HTTP status and its title. */
export const STATUSES: Record<ProblemCode, { readonly status: number; readonly title: string }> = {
  'bad-request': { status: 400, title: 'The request can’t be read' },
  faults: { status: 422, title: 'What was sent has faults' },
  'signed-out': { status: 401, title: 'Not signed in' },
  'not-allowed': { status: 403, title: 'Not allowed for this role' },
  'cross-site': { status: 403, title: 'Sent from another site' },
  'not-found': { status: 404, title: 'Not found' },
  'method-not-allowed': { status: 405, title: 'Not done here' },
  stale: { status: 412, title: 'Changed in the meantime' },
  'too-large': { status: 413, title: 'Too large' },
  'wrong-media-type': { status: 415, title: 'Not JSON' },
  'version-missing': { status: 428, title: 'No version given' },
  'too-many-tries': { status: 429, title: 'Too many tries' },
  unknown: { status: 500, title: 'Something failed on the server' },
  'database-away': { status: 503, title: 'The database is not answering' },
};

export type ProblemExtras = {
  readonly faults?: readonly Fault[];
  readonly current?: unknown;
  readonly retryAfterSeconds?: number;
};

/** A refusal on purpose. `message` is shown to people: what happened, what is kept, what next. */
export class Refusal extends Error {
  constructor(
    readonly code: ProblemCode,
    message: string,
    readonly extras: ProblemExtras = {},
  ) {
    super(message);
    this.name = 'Refusal';
  }
}

export const notFound = (what: string): Refusal =>
  new Refusal(
    'not-found',
    `There is no such ${what} in your agency. It may never have existed or belong to another agency.`,
  );

export const refuseFaults = (faults: readonly Fault[]): Refusal =>
  new Refusal(
    'faults',
    `${faults.length === 1 ? 'One fault was' : `${faults.length} faults were`} found and nothing was changed. Put ${faults.length === 1 ? 'it' : 'them'} right and send it again.`,
    { faults },
  );
