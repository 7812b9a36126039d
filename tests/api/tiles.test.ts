import { createHash, randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, test } from 'vitest';
import { GET } from '@/app/tiles/[pack]/[version]/[z]/[x]/[y]/route';
import { db } from '@/lib/server/database';
import { importPack, type Pack, type PackTile } from '@/lib/server/tiles/import-pack';
import { makeAgency, makeSite, type TestAgency } from './support/agency';
import { call } from './support/call';

let agency: TestAgency;
let other: TestAgency;
beforeAll(async () => {
  [agency, other] = [await makeAgency(), await makeAgency()];
});

const pack = (version: string, name = 'test-yard'): Pack => ({
  pack: name,
  version,
  min_zoom: 14,
  max_zoom: 22,
  bounds: [-98.31, 41.19, -98.29, 41.21],
  attribution: 'Invented',
  type: 'image/webp',
});

function tile(z: number, x: number, y: number, words: string): PackTile {
  const bytes = Buffer.from(words);
  return { z, x, y, bytes, hash: createHash('sha256').update(bytes).digest('hex') };
}

async function* batches(...all: PackTile[][]): AsyncGenerator<PackTile[]> {
  yield* all;
}

const ask = (
  address: Partial<Record<'pack' | 'version' | 'z' | 'x' | 'y', string>>,
  cookie = agency.people.crew.cookie,
  headers?: Record<string, string>,
) =>
  call(GET, {
    params: { pack: 'test-yard', version: 'v1', z: '15', x: '7', y: '9', ...address },
    cookie,
    ...(headers ? { headers } : {}),
  });

describe('a pack in the database', () => {
  beforeAll(async () => {
    await importPack(agency.id, pack('v1'), () =>
      batches(
        [tile(14, 3, 4, 'grass'), tile(15, 7, 9, 'road')],
        [],
        [tile(15, 7, 10, 'grass'), tile(16, 0, 0, 'road')],
      ),
    );
  });

  test('gives its tiles to be kept for good, by whoever may see the agency', async () => {
    const answer = await ask({});
    expect(answer.status).toBe(200);
    expect(answer.headers.get('content-type')).toBe('image/webp');
    expect(answer.headers.get('cache-control')).toBe('private, max-age=31536000, immutable');
    expect(answer.headers.get('etag')).toBe(`"${tile(0, 0, 0, 'road').hash}"`);
    expect(Buffer.from(await answer.arrayBuffer()).toString()).toBe('road');
  });

  test('stores a picture once however often it lies on the map', async () => {
    expect(await db.Tile.count({ where: { agency_id: agency.id } })).toBe(2);
    expect(await db.TilePlace.count({ where: { agency_id: agency.id } })).toBe(4);
  });

  test('sends nothing again that the browser holds', async () => {
    const { hash } = tile(0, 0, 0, 'road');
    const headers = { 'if-none-match': `"${hash}"` };
    const params = { pack: 'test-yard', version: 'v1', z: '15', x: '7', y: '9' };
    expect((await call(GET, { params, headers })).status).toBe(401);
    const cookie = agency.people.crew.cookie;
    const same = await ask({}, cookie, { 'if-none-match': `W/"x", "${hash}"` });
    expect(same.status).toBe(304);
    expect(same.headers.get('etag')).toBe(`"${hash}"`);
    expect(await same.text()).toBe('');
    const changed = await ask({}, cookie, { 'if-none-match': `"${'0'.repeat(64)}"` });
    expect(changed.status).toBe(200);
  });

  test.each([
    { z: '15', x: '8', y: '9' },
    { z: '22', x: '1', y: '1' },
    { z: '0', x: '0', y: '0' },
  ])('has no tile at %j and says so without a body', async (address) => {
    const answer = await ask(address);
    expect(answer.status).toBe(204);
    expect(answer.headers.get('cache-control')).toContain('immutable');
  });

  test.each([
    { z: '15', x: '32768', y: '9' },
    { z: '25', x: '0', y: '0' },
    { z: '-1', x: '0', y: '0' },
    { z: '15', x: '7.5', y: '9' },
    { z: '15', x: '07', y: '9' },
    { z: '15', x: '1e1', y: '9' },
    { z: 'NaN', x: '7', y: '9' },
    { pack: 'no-such-yard' },
    { pack: '../test-yard' },
    { version: 'v2' },
    { version: "v1' OR '1'='1" },
  ])('has nothing at %j', async (address) => {
    expect((await ask(address)).status).toBe(404);
  });

  test('is not there for another agency, nor for anyone signed out', async () => {
    expect((await ask({}, other.people.administrator.cookie)).status).toBe(404);
    expect((await call(GET, { params: {} })).status).toBe(401);
  });

  test('is left alone when the same version comes again', async () => {
    let asked = false;
    const id = await importPack(agency.id, pack('v1'), () => {
      asked = true;
      return batches([]);
    });
    expect(asked).toBe(false);
    const where = { agency_id: agency.id, pack: 'test-yard' };
    expect((await db.BaseMap.findAll({ where })).map((map) => map.id)).toEqual([id]);
  });
});

test('a newer version takes the place of the older, its sites with it', async () => {
  const name = `yard-${randomUUID().slice(0, 8)}`;
  const planner = other.people.planner;
  const first = await importPack(other.id, pack('v1', name), () =>
    batches([tile(14, 1, 1, 'old grass'), tile(14, 1, 2, 'kept road')]),
  );
  const siteId = await makeSite(planner);
  await db.Site.update({ base_map_id: first }, { where: { id: siteId } });
  const second = await importPack(other.id, pack('v2', name), () =>
    batches([tile(14, 1, 1, 'new grass'), tile(14, 1, 2, 'kept road')]),
  );
  expect((await db.Site.findByPk(siteId))?.base_map_id).toBe(second);
  expect((await ask({ pack: name, z: '14', x: '1', y: '1' }, planner.cookie)).status).toBe(404);
  const now = await ask({ pack: name, version: 'v2', z: '14', x: '1', y: '1' }, planner.cookie);
  expect(await now.text()).toBe('new grass');
  expect(await db.Tile.count({ where: { agency_id: other.id } })).toBe(2);
});

test('an import that breaks off leaves nothing of itself', async () => {
  const third = await makeAgency();
  async function* broken(): AsyncGenerator<PackTile[]> {
    yield [tile(14, 1, 1, 'half')];
    throw new Error('The drawing broke off');
  }
  await expect(importPack(third.id, pack('v1'), broken)).rejects.toThrow('broke off');
  expect(await db.BaseMap.count({ where: { agency_id: third.id } })).toBe(0);
  expect(await db.Tile.count({ where: { agency_id: third.id } })).toBe(0);
});
