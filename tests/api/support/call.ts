import { NextRequest } from 'next/server';

type Handler = (
  request: NextRequest,
  context: { params: Promise<Record<string, string>> },
) => Promise<Response>;

export type Sent = {
  readonly method?: string;
  readonly path?: string;
  readonly params?: Record<string, string>;
  readonly cookie?: string;
  readonly body?: unknown;
  /** Sent as it stands instead of `body`. */
  readonly raw?: string | Uint8Array<ArrayBuffer>;
  readonly ifMatch?: string;
  readonly headers?: Record<string, string>;
};

/** Sends a real Request through a route handler, as Next would after routing. */
export async function call(handler: Handler, sent: Sent = {}): Promise<Response> {
  const headers = new Headers(sent.headers);
  if (sent.cookie) headers.set('cookie', sent.cookie);
  if (sent.ifMatch !== undefined) headers.set('if-match', sent.ifMatch);
  const body = sent.raw ?? (sent.body === undefined ? undefined : JSON.stringify(sent.body));
  if (body !== undefined && !headers.has('content-type')) {
    headers.set('content-type', 'application/json');
  }
  const method = sent.method ?? (body === undefined ? 'GET' : 'POST');
  const request = new NextRequest(new URL(sent.path ?? '/', 'http://localhost'), {
    method,
    headers,
    body,
  });
  return handler(request, { params: Promise.resolve(sent.params ?? {}) });
}

/** The answer's JSON, after asserting nothing: tests read what they need from it. */
export const jsonOf = async <T = Record<string, unknown>>(response: Response): Promise<T> =>
  (await response.json()) as T;
