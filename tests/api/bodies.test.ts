import { beforeAll, expect, test } from 'vitest';
import { POST as postSite } from '@/app/api/sites/route';
import { PUT as putLayout } from '@/app/api/layouts/[layoutId]/route';
import { MOST_BYTES, type ProblemDetails } from '@/lib/api';
import { emptyLayout } from '@/lib/layout';
import { makeAgency, makeLayout, makeSite, type TestAgency } from './support/agency';
import { call, jsonOf } from './support/call';

let agency: TestAgency;
let layoutId: string;
beforeAll(async () => {
  agency = await makeAgency();
  layoutId = await makeLayout(agency.people.planner, await makeSite(agency.people.planner));
});

const save = (raw: string | Uint8Array<ArrayBuffer>, headers: Record<string, string> = {}) =>
  call(putLayout, {
    method: 'PUT',
    params: { layoutId },
    cookie: agency.people.planner.cookie,
    ifMatch: '"1"',
    raw,
    headers,
  });
const codeOf = async (response: Response) => (await jsonOf<ProblemDetails>(response)).code;

test.each([
  ['nothing', ''],
  ['half a document', '{"layout": {'],
  ['not UTF-8', new Uint8Array([0x22, 0xff, 0xfe, 0x22])],
])('%s: 400', async (_, raw) => {
  const response = await save(raw, { 'content-type': 'application/json' });
  expect([response.status, await codeOf(response)]).toEqual([400, 'bad-request']);
});

test.each(['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data; boundary=x'])(
  '%s: 415',
  async (type) => {
    const response = await save('{}', { 'content-type': type });
    expect([response.status, await codeOf(response)]).toEqual([415, 'wrong-media-type']);
  },
);

test.each(['null', '[]', '7', '"text"', '{}', '{"layout":null,"label":"x"}'])(
  '%s: 422',
  async (raw) => expect((await save(raw)).status).toBe(422),
);

test('a body beyond its limit: 413, whether announced or not', async () => {
  const raw = JSON.stringify({ label: 'x'.repeat(MOST_BYTES.layout) });
  const response = await save(raw);
  expect([response.status, await codeOf(response)]).toEqual([413, 'too-large']);
  const announced = await save('{}', { 'content-length': String(MOST_BYTES.layout + 1) });
  expect(announced.status).toBe(413);
});

test('a body cut short on its way: 400, however well it parses', async () => {
  const response = await save('{}', { 'content-length': '5000' });
  expect([response.status, await codeOf(response)]).toEqual([400, 'bad-request']);
});

test('nesting a hundred thousand deep is refused, not a crash', async () => {
  const response = await save('['.repeat(100_000) + ']'.repeat(100_000));
  expect([400, 422]).toContain(response.status);
});

test('more pieces than a layout may hold: 422', async () => {
  const pieces = Array.from({ length: 2001 }, (_, n) => ({
    id: `n${n}`,
    kind: 'note',
    at: [-98.3, 41.2],
  }));
  const layout = { ...emptyLayout([-98.3, 41.2]), pieces };
  expect((await save(JSON.stringify({ layout, label: 'x' }))).status).toBe(422);
});

test.each([
  ['cross-site', 403],
  ['same-site', 403],
  ['same-origin', 201],
  ['none', 201],
])('a change sent from %s: %d', async (from, status) => {
  const response = await call(postSite, {
    cookie: agency.people.planner.cookie,
    body: { name: 'From afar' },
    headers: { 'sec-fetch-site': from },
  });
  expect(response.status).toBe(status);
});
