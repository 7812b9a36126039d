import { beforeAll, describe, expect, test } from 'vitest';
import { GET as listSites, POST as postSite } from '@/app/api/sites/route';
import { GET as getSite, PATCH as patchSite } from '@/app/api/sites/[siteId]/route';
import { GET as getGround, PUT as putGround } from '@/app/api/sites/[siteId]/ground/route';
import type { GroundAnswer, ProblemDetails, SiteAnswer, SitesAnswer, StaleGround } from '@/lib/api';
import { EMPTY_GROUND, type SiteFeature, type SiteGround } from '@/lib/layout';
import { db } from '@/lib/server/database';
import { makeAgency, makeSite, type TestAgency } from './support/agency';
import { call, jsonOf } from './support/call';

let agency: TestAgency;
let cookie: string;
beforeAll(async () => {
  agency = await makeAgency();
  cookie = agency.people.planner.cookie;
});

const post = (body: unknown) => call(postSite, { cookie, body });
const search = async (q: string) => {
  const path = `/?${new URLSearchParams({ q })}`;
  return (await jsonOf<SitesAnswer>(await call(listSites, { cookie, path }))).sites;
};

describe('names and search', () => {
  const hostile = [
    'Ramp 4 <script>alert(1)</script>',
    `Robert'); DROP TABLE sites;--`,
    '100% sloped_yard',
    'back\\slash',
    'Größe Straße 北 🚛 \u202Ereversed',
    '=HYPERLINK("http://example.test")',
    '${jndi:ldap://example.test}',
  ];

  test.each(hostile)('%j is kept as it is and found by all of itself', async (name) => {
    const created = await post({ name });
    expect(created.status).toBe(201);
    const site = await jsonOf<SiteAnswer>(created);
    expect(site.name).toBe(name);
    expect(created.headers.get('location')).toBe(`/api/sites/${site.id}`);
    expect((await search(name)).map((found) => found.name)).toEqual([name]);
  });

  test.each([
    ['%', ['100% sloped_yard']],
    ['_', ['100% sloped_yard']],
    ['\\', ['back\\slash']],
    ["'", [`Robert'); DROP TABLE sites;--`]],
    ['100_', []],
  ])('the wildcard %j stands for itself', async (q, names) => {
    expect((await search(q)).map((site) => site.name)).toEqual(names);
  });

  test('the place in words is searched too', async () => {
    await post({ name: 'Found by its place', where: 'County road 19' });
    expect((await search('ROAD 19')).map((site) => site.name)).toEqual(['Found by its place']);
  });

  test.each([
    {},
    { name: '   ' },
    { name: 'x'.repeat(201) },
    { name: 7 },
    { name: 'x', at: [200, 0] },
    { name: 'x', owner: 'me' },
  ])('%j is refused with its faults', async (body) => {
    const response = await post(body);
    expect(response.status).toBe(422);
    expect((await jsonOf<ProblemDetails>(response)).faults).not.toHaveLength(0);
  });
});

describe('paging', () => {
  test('every site comes once, by name, even where names are alike', async () => {
    const own = await makeAgency();
    const names = ['b', 'a', 'a', 'a', 'c', 'A'];
    for (const name of names) await makeSite(own.people.planner, name);
    const seen: string[] = [];
    let cursor: string | null = '';
    while (cursor !== null) {
      const path: string = `/?limit=2${cursor ? `&cursor=${cursor}` : ''}`;
      const page: SitesAnswer = await jsonOf<SitesAnswer>(
        await call(listSites, { cookie: own.people.crew.cookie, path }),
      );
      expect(page.sites.length).toBeLessThanOrEqual(2);
      seen.push(...page.sites.map((site) => site.id));
      cursor = page.next_cursor;
    }
    expect(new Set(seen).size).toBe(names.length);
    expect(seen).toHaveLength(names.length);
  });

  test.each(['cursor=nonsense', 'cursor=W10', 'limit=0', 'limit=1000', 'limit=x'])(
    '%s is refused',
    async (query) => {
      const { status } = await call(listSites, { cookie, path: `/?${query}` });
      expect([400, 422]).toContain(status);
    },
  );
});

test('a change of one member leaves the others', async () => {
  const site = await jsonOf<SiteAnswer>(
    await post({ name: 'Yard', where: 'East', notes: 'Gate code', at: [-98.3, 41.2] }),
  );
  const changed = await call(patchSite, {
    method: 'PATCH',
    params: { siteId: site.id },
    cookie,
    body: { where: null },
  });
  expect(await jsonOf(changed)).toMatchObject({
    name: 'Yard',
    where: null,
    notes: 'Gate code',
    at: [-98.3, 41.2],
  });
});

describe('the ground', () => {
  const line = (id: string, owner = 'Plains Electric'): SiteFeature => ({
    id,
    kind: 'buried-line',
    utility: 'electric',
    paths: [
      [
        [-98.3, 41.2],
        [-98.31, 41.2],
      ],
    ],
    owner,
  });
  const put = (siteId: string, ifMatch: string | undefined, ground: SiteGround, who = cookie) =>
    call(putGround, {
      method: 'PUT',
      params: { siteId },
      cookie: who,
      body: { ground, label: 'Draw a line' },
      ...(ifMatch && { ifMatch }),
    });
  const read = async (siteId: string) =>
    jsonOf<GroundAnswer>(await call(getGround, { params: { siteId }, cookie }));
  const rowsOf = (siteId: string) =>
    db.SiteFeature.findAll({ where: { site_id: siteId }, order: ['place'], raw: true });

  test('comes back as it was saved: features in order, answers, tickets', async () => {
    const siteId = await makeSite(agency.people.planner);
    expect((await read(siteId)).ground).toEqual(EMPTY_GROUND);
    const ground: SiteGround = {
      features: [line('b'), line('a'), { id: 'A', kind: 'fixed-point', at: [-98.3, 41.2] }],
      answers: {
        electric: { answer: 'marked', at: '2031-05-03T15:00:00Z', by: 'J.' },
        private: { answer: 'waiting' },
      },
      overhead_none_known_as_of: '2031-05-03T10:00:00-05:00',
      locates: [{ ticket: 'EX-2' }, { ticket: 'EX-1', emergency: true, extra: [1] }],
    };
    const saved = await put(siteId, '"1"', ground);
    expect(saved.headers.get('etag')).toBe('"2"');
    expect(await read(siteId)).toMatchObject({
      version: 2,
      ground,
      saved_by: { name: agency.people.planner.name },
    });
    const site = await jsonOf(await call(getSite, { params: { siteId }, cookie }));
    expect(site.ground_version).toBe(2);
  });

  test('one changed line among many writes one row', async () => {
    const siteId = await makeSite(agency.people.planner);
    const features = Array.from({ length: 1200 }, (_, n) => line(`line-${n}`));
    await put(siteId, '"1"', { ...EMPTY_GROUND, features });
    await db.SiteFeature.update({ kind: 'touched' }, { where: { site_id: siteId } });
    const changed = features.map((feature, n) => (n === 600 ? line(feature.id, 'Other') : feature));
    await put(siteId, '"2"', { ...EMPTY_GROUND, features: [...changed, line('new')] });
    const rows = await rowsOf(siteId);
    expect(rows.filter((row) => row.kind !== 'touched').map((row) => row.feature_id)).toEqual([
      'line-600',
      'new',
    ]);
    expect(rows).toHaveLength(1201);
  });

  test('removing and reordering come back right', async () => {
    const siteId = await makeSite(agency.people.planner);
    const ids = async () => (await read(siteId)).ground.features.map((feature) => feature.id);
    const save = (version: number, ...names: string[]) =>
      put(siteId, `"${version}"`, { ...EMPTY_GROUND, features: names.map((name) => line(name)) });
    await save(1, 'a', 'b', 'c', 'd');
    await save(2, 'a', 'c', 'd');
    expect(await ids()).toEqual(['a', 'c', 'd']);
    await save(3, 'd', 'x', 'a', 'c');
    expect(await ids()).toEqual(['d', 'x', 'a', 'c']);
    await save(4);
    expect(await ids()).toEqual([]);
  });

  test('without a version 428; from an older one 412 with what is there', async () => {
    const siteId = await makeSite(agency.people.planner);
    expect((await put(siteId, undefined, EMPTY_GROUND)).status).toBe(428);
    const theirs = { ...EMPTY_GROUND, features: [line('theirs')] };
    await put(siteId, '"1"', theirs, agency.people.administrator.cookie);
    const stale = await put(siteId, '"1"', { ...EMPTY_GROUND, features: [line('mine')] });
    expect(stale.status).toBe(412);
    const { current } = await jsonOf<ProblemDetails & { current: StaleGround }>(stale);
    expect(current).toMatchObject({
      version: 2,
      ground: theirs,
      saved_by: { name: agency.people.administrator.name },
    });
  });

  test('every fault with its path, nothing changed', async () => {
    const siteId = await makeSite(agency.people.planner);
    const response = await put(siteId, '"1"', {
      features: [line('a'), { ...line('a'), utility: 'steam' }, { id: 'v', kind: 'vent' }],
      answers: { electric: { answer: 'maybe' } },
      overhead_none_known_as_of: 'yesterday',
      locates: [{ ticket: '' }],
    } as unknown as SiteGround);
    const { faults } = await jsonOf<ProblemDetails>(response);
    expect(faults?.map((fault) => fault.path).sort()).toEqual([
      'ground.answers.electric.answer',
      'ground.features[1].utility',
      'ground.features[2].kind',
      'ground.locates[0].ticket',
      'ground.overhead_none_known_as_of',
    ]);
    expect((await read(siteId)).version).toBe(1);
  });
});
