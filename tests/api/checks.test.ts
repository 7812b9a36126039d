import { readFileSync } from 'node:fs';
import { beforeAll, expect, test } from 'vitest';
import { POST as postChecks } from '@/app/api/checks/route';
import { checksAnswer, type ChecksAnswer, type ProblemDetails } from '@/lib/api';
import { checkReport } from '@/lib/checks/report';
import { parseExchange } from '@/lib/layout/exchange';
import { makeAgency } from './support/agency';
import { call, jsonOf } from './support/call';

const read = (name: string): unknown =>
  JSON.parse(readFileSync(`tests/fixtures/exchange/${name}`, 'utf8'));

let cookie: string;
beforeAll(async () => {
  cookie = (await makeAgency()).people.crew.cookie;
});

test.each(['everything-met', 'mixed-3', 'mixed-11', 'mixed-27'])(
  '%s answers what the command line answers',
  async (name) => {
    const body = read(`${name}.geojson`);
    const response = await call(postChecks, { cookie, body });
    expect(response.status).toBe(200);
    const answer = await jsonOf<ChecksAnswer>(response);
    expect(checksAnswer.safeParse(answer).error).toBeUndefined();
    const parsed = parseExchange(body);
    if (!parsed.ok) throw new Error('the fixture is not readable');
    expect(answer).toEqual(JSON.parse(JSON.stringify(checkReport(parsed.sheet, parsed.limits))));
  },
);

test('`at` moves the instant the answer is for', async () => {
  const body = read('everything-met.geojson');
  const fresh = async (query: string) => {
    const answer = await jsonOf<ChecksAnswer>(
      await call(postChecks, { cookie, body, path: query }),
    );
    return answer.findings.find((finding) => finding.rule === 'wind-fresh')?.status;
  };
  expect(await fresh('/')).toBe('meets');
  expect(await fresh('/?at=2031-05-04T18:00:00Z')).toBe('caution');
  expect((await call(postChecks, { cookie, body, path: '/?at=noon' })).status).toBe(422);
});

test('a file with faults is answered with all of them', async () => {
  const response = await call(postChecks, {
    cookie,
    body: { type: 'FeatureCollection', stillground: { version: 2 }, features: [{}, {}] },
  });
  expect(response.status).toBe(422);
  expect((await jsonOf<ProblemDetails>(response)).faults!.length).toBeGreaterThan(2);
});
