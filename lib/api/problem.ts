import { z } from 'zod';

/** Every way a request can be refused. The server maps each to one HTTP status. */
export const PROBLEM_CODES = [
  'bad-request',
  'faults',
  'signed-out',
  'not-allowed',
  'not-found',
  'method-not-allowed',
  'stale',
  'too-large',
  'wrong-media-type',
  'version-missing',
  'too-many-tries',
  'cross-site',
  'database-away',
  'unknown',
] as const;
export type ProblemCode = (typeof PROBLEM_CODES)[number];

/** One thing wrong with what was sent. `path` leads to it: `layout.pieces[3].at`. */
export const fault = z.object({ path: z.string(), message: z.string() });
export type Fault = z.infer<typeof fault>;

/** RFC 9457. `detail` is for people: what happened, what is kept, what to do next. */
export const problemDetails = z.looseObject({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  code: z.enum(PROBLEM_CODES),
  /** Leads to the line in the server's log, where there is one. */
  reference: z.string().optional(),
  faults: z.array(fault).optional(),
  /** What the server holds now, where the request was made from something older. */
  current: z.unknown().optional(),
});
export type ProblemDetails = z.infer<typeof problemDetails>;
export const PROBLEM_TYPE = 'application/problem+json';
