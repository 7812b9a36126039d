import 'server-only';
import type { NextRequest } from 'next/server';
import type { z } from 'zod';
import { can, ROLE_WORDS, whoMay, type Action } from '@/lib/access';
import { MOST_BYTES } from '@/lib/api';
import { faultsOf } from '@/lib/layout/exchange';
import { notFound, problemResponse, Refusal, refuseFaults } from '../problems';
import { personOf, type SignedIn } from '../session';
import { versionIn } from './if-match';
import { readJson } from './read-body';
import { refuseOtherSites } from './same-site';

type Shape<T> = z.ZodType<T>;

export type Declared<Params, Query, Body> = {
  /** What the person must be allowed to do. */
  readonly can: Action;
  readonly params?: Shape<Params>;
  readonly query?: Shape<Query>;
  readonly body?: Shape<Body>;
  readonly mostBytes?: number;
  /** Asks for If-Match and gives its number to the handler. */
  readonly ifMatch?: boolean;
};

export type Call<Params, Query, Body> = {
  readonly person: SignedIn;
  readonly params: Params;
  readonly query: Query;
  readonly body: Body;
  /** The number in If-Match; 0 where the route doesn't ask for one. */
  readonly version: number;
  readonly request: NextRequest;
};

type Context = { params: Promise<Record<string, string | string[] | undefined>> };

/**
 * One way in for every request: identity, access, then each part parsed, then the handler. What
 * the handler gives back is sent as JSON unless it is a Response already.
 */
export function route<Params = undefined, Query = undefined, Body = undefined>(
  declared: Declared<Params, Query, Body>,
  handler: (call: Call<Params, Query, Body>) => Promise<unknown>,
) {
  return async (request: NextRequest, context: Context): Promise<Response> => {
    try {
      refuseOtherSites(request);
      const person = await admit(request, declared.can);
      const answer = await handler({
        person,
        params: parseParams(declared.params, await context.params),
        query: parse(declared.query, Object.fromEntries(request.nextUrl.searchParams)),
        version: declared.ifMatch ? versionIn(request) : 0,
        body: declared.body
          ? parse(declared.body, await readJson(request, declared.mostBytes ?? MOST_BYTES.request))
          : (undefined as Body),
        request,
      });
      return answer instanceof Response ? answer : json(answer);
    } catch (error) {
      return problemResponse(error, `${request.method} ${request.nextUrl.pathname}`);
    }
  };
}

/** For the few addresses that answer anybody. */
export function openRoute(handler: (request: NextRequest) => Promise<Response>) {
  return async (request: NextRequest): Promise<Response> => {
    try {
      return await handler(request);
    } catch (error) {
      return problemResponse(error, `${request.method} ${request.nextUrl.pathname}`);
    }
  };
}

/** Answers are about a moment and a person: no cache keeps them. */
export function json(
  answer: unknown,
  status = 200,
  headers: Record<string, string> = {},
): Response {
  return Response.json(answer, { status, headers: { 'cache-control': 'no-store', ...headers } });
}

/** The version as an ETag, ready to be sent back in If-Match. */
export const versionTag = (version: number): Record<string, string> => ({ etag: `"${version}"` });

async function admit(request: NextRequest, action: Action): Promise<SignedIn> {
  const person = await personOf(request);
  if (!person) {
    throw new Refusal(
      'signed-out',
      'You are not signed in, or your session has ended. What is on the screen stays there: sign in again, then send it.',
    );
  }
  if (!can(person.role, action)) {
    throw new Refusal(
      'not-allowed',
      `This takes ${whoMay(action)}; you are signed in as ${ROLE_WORDS[person.role].toLowerCase()}. Nothing was changed.`,
    );
  }
  return person;
}

function parse<T>(shape: Shape<T> | undefined, value: unknown): T {
  if (!shape) return undefined as T;
  const parsed = shape.safeParse(value);
  if (!parsed.success) throw refuseFaults(faultsOf(parsed.error));
  return parsed.data;
}

/** An address with a malformed id leads nowhere, exactly as one with an unknown id. */
function parseParams<T>(shape: Shape<T> | undefined, value: unknown): T {
  const parsed = shape?.safeParse(value);
  if (parsed && !parsed.success) throw notFound('thing');
  return parsed?.data as T;
}
