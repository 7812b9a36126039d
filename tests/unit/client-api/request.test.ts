import { createServer, type IncomingHttpHeaders, type Server } from 'node:http';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { Problem } from '@/lib/client/api/problem';
import { address, request } from '@/lib/client/api/request';
import { readSignInError, signInWords, writeSignInError } from '@/lib/api';

type Answer = { status: number; type?: string; body: string };

let server: Server;
let base: string;
let answer: Answer;
let seen: { method?: string; headers: IncomingHttpHeaders; body: string };

beforeEach(async () => {
  server = createServer((incoming, outgoing) => {
    let body = '';
    incoming.on('data', (chunk: Buffer) => (body += chunk.toString()));
    incoming.on('end', () => {
      seen = { method: incoming.method, headers: incoming.headers, body };
      outgoing.writeHead(answer.status, { 'content-type': answer.type ?? 'application/json' });
      outgoing.end(answer.body);
    });
  });
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  base = `http://127.0.0.1:${(server.address() as { port: number }).port}`;
});
afterEach(() => {
  server.closeAllConnections();
  server.close();
});

const refusal = (sending = {}) =>
  request(`${base}/x`, sending).then(
    () => {
      throw new Error('was not refused');
    },
    (error: unknown) => error as Problem,
  );

test('an answer comes back as data; the body and the version go along', async () => {
  answer = { status: 200, body: '{"version":3}' };
  const sent = { method: 'PUT', body: { label: 'Ω' }, ifMatch: 2 } as const;
  expect(await request(`${base}/x`, sent)).toEqual({ version: 3 });
  expect(seen.method).toBe('PUT');
  expect(seen.headers['if-match']).toBe('"2"');
  expect(seen.headers['content-type']).toBe('application/json');
  expect(seen.body).toBe('{"label":"Ω"}');
});

test('a refusal carries its code, its words, its faults and what is newest', async () => {
  const faults = [{ path: 'layout.name', message: 'too long' }];
  answer = {
    status: 412,
    type: 'application/problem+json',
    body: JSON.stringify({
      type: 'about:blank',
      title: 'Changed in the meantime',
      status: 412,
      detail: 'Someone saved.',
      code: 'stale',
      reference: 'ab12',
      faults,
      current: { version: 9 },
    }),
  };
  const problem = await refusal();
  expect(problem).toBeInstanceOf(Problem);
  expect(problem).toMatchObject({
    code: 'stale',
    status: 412,
    message: 'Someone saved.',
    reference: 'ab12',
    faults,
    current: { version: 9 },
  });
});

test.each(['<html>Bad gateway</html>', '', '{"error":"x"}', 'null'])(
  'a refusal in the form of %j is still a Problem with its status',
  async (body) => {
    answer = { status: 502, type: 'text/html', body };
    expect(await refusal()).toMatchObject({ code: 'unknown', status: 502, faults: [] });
  },
);

test('no answer at all is offline', async () => {
  server.closeAllConnections();
  await new Promise((done) => server.close(done));
  expect(await refusal()).toMatchObject({ code: 'offline', status: 0 });
});

test.each(['<html>Sign in to the hotspot</html>', '{"version":'])(
  'a success that answers %j is offline: it was not our server, or not all of it',
  async (body) => {
    answer = { status: 200, body };
    expect(await refusal()).toMatchObject({ code: 'offline' });
  },
);

test('a request that was called off is not a problem', async () => {
  answer = { status: 200, body: '{}' };
  const calledOff = await refusal({ signal: AbortSignal.abort() });
  expect(calledOff.name).toBe('AbortError');
});

test('empty parameters stay out of an address', () => {
  expect(address('/api/sites', { q: '', cursor: undefined })).toBe('/api/sites');
  expect(address('/api/sites', { q: 'a&b', limit: 5 })).toBe('/api/sites?q=a%26b&limit=5');
});

test.each([
  { code: 'wrong' } as const,
  { code: 'too-many-tries', minutes: 12 } as const,
  { code: 'database-away' } as const,
  { code: 'unknown' } as const,
])('the sign-in error $code survives its way through an address', (error) => {
  expect(readSignInError(writeSignInError(error))).toEqual(error);
});

test('words for a sign-in error never repeat what an address said', () => {
  expect(signInWords('<b>call 555-0100</b>')).not.toContain('555');
  expect(signInWords('too-many-tries:12')).toContain('in 12 minutes');
  expect(signInWords('too-many-tries:1')).toContain('in 1 minute.');
});
