import { mkdtempSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeAll, describe, expect, test } from 'vitest';
import { can, ROLES } from '@/lib/access';
import { db } from '@/lib/server/database';
import { importPack } from '@/lib/server/tiles/import-pack';
import { makeAgency, makeLayout, makeSite, type TestAgency } from './support/agency';
import { call, type Sent } from './support/call';
import { DECLARED, type DeclaredRoute, type World } from './support/declared-routes';
import { routesOnDisk, type RouteOnDisk } from './support/routes-on-disk';

const routes = await routesOnDisk();
const answered = routes.filter(({ name }) => (declared(name)?.can ?? 'sign-in') !== 'sign-in');

const PACK = 'ours-alone';
let ours: TestAgency;
let theirs: TestAgency;

beforeAll(async () => {
  ours = await makeAgency();
  theirs = await makeAgency();
  await importPack(
    ours.id,
    {
      pack: PACK,
      version: 'v1',
      min_zoom: 14,
      max_zoom: 14,
      bounds: [-98.4, 41.1, -98.2, 41.3],
      attribution: 'Ours alone',
      type: 'image/png',
    },
    async function* () {
      const bytes = Buffer.from('a picture');
      yield [{ z: 14, x: 3700, y: 6100, hash: 'a'.repeat(64), bytes }];
    },
  );
});

function declared(name: string): DeclaredRoute | undefined {
  return DECLARED[name];
}

async function world(): Promise<World> {
  const { planner } = ours.people;
  const siteId = await makeSite(planner, 'Ours alone');
  return { siteId, layoutId: await makeLayout(planner, siteId), pack: PACK };
}

const ask = (route: RouteOnDisk, sent: Sent, cookie?: string) =>
  call(route.handler, { method: route.method, ...sent, ...(cookie && { cookie }) });

test('every route on disk is declared, and every declared route is there', () => {
  expect(routes.map((route) => route.name).sort()).toEqual(Object.keys(DECLARED).sort());
});

test('a route that nobody declared would be seen', async () => {
  const folder = mkdtempSync('tests/api/undeclared-');
  try {
    mkdirSync(join(folder, 'back-door'));
    const source = 'export const DELETE = async () => new Response();\n';
    writeFileSync(join(folder, 'back-door', 'route.ts'), source);
    const names = (await routesOnDisk([folder])).map((route) => route.name);
    expect(names).toEqual([`DELETE /${folder}/back-door`]);
    expect(declared(names[0]!)).toBeUndefined();
  } finally {
    rmSync(folder, { recursive: true });
  }
});

describe.each(answered.map((route) => [route.name, route] as const))('%s', (name, route) => {
  const expected = declared(name)!;
  const open = expected.can === 'public';

  test(`signed out: ${open ? expected.status : 401}`, async () => {
    const response = await ask(route, expected.send(await world()));
    expect(response.status).toBe(open ? expected.status : 401);
  });

  test.each(ROLES)('%s', async (role) => {
    const may =
      expected.can === 'public' || (expected.can !== 'sign-in' && can(role, expected.can));
    const response = await ask(route, expected.send(await world()), ours.people[role].cookie);
    expect(response.status).toBe(may ? expected.status : 403);
    if (!may) expect(response.headers.get('content-type')).toBe('application/problem+json');
  });

  test.each(ROLES)('%s of another agency', async (role) => {
    const made = await world();
    const may =
      expected.can === 'public' || (expected.can !== 'sign-in' && can(role, expected.can));
    const response = await ask(route, expected.send(made), theirs.people[role].cookie);
    const status = expected.reach === 'thing' ? 404 : expected.status;
    expect(response.status).toBe(may ? status : 403);
    const answer = await response.text();
    for (const secret of [made.siteId, made.layoutId, ours.id, ours.name, 'Ours alone']) {
      expect(answer).not.toContain(secret);
    }
    const site = await db.Site.findByPk(made.siteId, { raw: true });
    const layout = await db.Layout.findByPk(made.layoutId, { raw: true });
    expect([site?.name, site?.version, layout?.version]).toEqual(['Ours alone', 1, 1]);
    expect(await db.Layout.count({ where: { site_id: made.siteId } })).toBe(1);
  });

  if (expected.reach === 'thing') {
    test.each(['00000000-0000-4000-8000-000000000000', 'not-an-id', '..', '1 OR 1=1'])(
      'with the id %j: 404',
      async (id) => {
        const sent = expected.send({ siteId: id, layoutId: id, pack: id });
        const response = await ask(route, sent, ours.people['safety-officer'].cookie);
        expect(response.status).toBe(404);
      },
    );
  }
});
