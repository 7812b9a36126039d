import { readFileSync } from 'node:fs';
import { beforeAll, describe, expect, test } from 'vitest';
import { GET as exportLayout } from '@/app/api/layouts/[layoutId]/export/route';
import { GET as getLayout } from '@/app/api/layouts/[layoutId]/route';
import { GET as listLayouts, POST as postLayout } from '@/app/api/sites/[siteId]/layouts/route';
import { GET as getGround } from '@/app/api/sites/[siteId]/ground/route';
import { PATCH as patchSite } from '@/app/api/sites/[siteId]/route';
import type {
  CreatedLayout,
  GroundAnswer,
  LayoutAnswer,
  LayoutsAnswer,
  ProblemDetails,
} from '@/lib/api';
import { parseExchange } from '@/lib/layout/exchange';
import { db } from '@/lib/server/database';
import { makeAgency, makeLayout, makeSite, type TestAgency } from './support/agency';
import { call, jsonOf } from './support/call';

type File = { stillground: Record<string, unknown>; features: Record<string, unknown>[] };
const fixture = (name: string): File =>
  JSON.parse(readFileSync(`tests/fixtures/exchange/${name}.geojson`, 'utf8')) as File;

let agency: TestAgency;
let siteId: string;
let cookie: string;
beforeAll(async () => {
  agency = await makeAgency();
  cookie = agency.people.planner.cookie;
  siteId = await makeSite(agency.people.planner);
});

const post = (body: unknown, at = siteId) =>
  call(postLayout, { params: { siteId: at }, cookie, body });
const create = async (body: unknown, at = siteId) => {
  const response = await post(body, at);
  expect(response.status).toBe(201);
  return jsonOf<CreatedLayout>(response);
};
const read = async (layoutId: string) =>
  jsonOf<LayoutAnswer>(await call(getLayout, { params: { layoutId }, cookie }));
const ground = async (at: string) =>
  jsonOf<GroundAnswer>(await call(getGround, { params: { siteId: at }, cookie }));
const faultsOf = async (response: Response) => {
  expect(response.status).toBe(422);
  return (await jsonOf<ProblemDetails>(response)).faults ?? [];
};

describe('from nothing', () => {
  test('starts at the site’s place, with nothing entered', async () => {
    const { id, version } = await create({ name: 'Plan A' });
    expect(version).toBe(1);
    const { layout, drawn_by } = await read(id);
    expect(layout).toMatchObject({ name: 'Plan A', origin: [-98.3, 41.2], pieces: [], kit: null });
    expect(drawn_by?.id).toBe(agency.people.planner.id);
  });

  test('a site without a place asks where', async () => {
    const lost = await makeSite(agency.people.planner);
    await call(patchSite, {
      method: 'PATCH',
      params: { siteId: lost },
      cookie,
      body: { at: null },
    });
    expect((await faultsOf(await post({}, lost)))[0]?.path).toBe('origin');
    const { id } = await create({ origin: [-97, 40] }, lost);
    expect((await read(id)).layout.origin).toEqual([-97, 40]);
    expect((await read(id)).layout.name).toBeNull();
  });
});

describe('from another layout', () => {
  test('brings everything drawn, under a name of its own', async () => {
    const { id: from } = await create({ name: 'First', from: { file: fixture('everything-met') } });
    const copied = await read((await create({ name: 'Second', from: { layoutId: from } })).id);
    expect(copied.layout).toEqual({ ...(await read(from)).layout, name: 'Second' });
    const unnamed = await read((await create({ from: { layoutId: from } })).id);
    expect(unnamed.layout.name).toBe('Copy of First');
  });

  test('only from the same site, and never from another agency', async () => {
    const elsewhere = await makeSite(agency.people.planner);
    const layoutId = await makeLayout(agency.people.planner, elsewhere);
    expect((await faultsOf(await post({ from: { layoutId } })))[0]?.path).toBe('from.layoutId');
    const { planner } = (await makeAgency()).people;
    const foreign = await makeLayout(planner, await makeSite(planner));
    expect((await post({ from: { layoutId: foreign } })).status).toBe(404);
  });
});

describe('from a file', () => {
  const sorted = (file: File) => ({
    ...file,
    features: [...file.features].sort((a, b) => (String(a.id) < String(b.id) ? -1 : 1)),
  });

  test.each(['everything-met', 'mixed-3', 'mixed-11', 'mixed-27'])(
    '%s with its ground: the export says the same',
    async (name) => {
      const site = await makeSite(agency.people.planner);
      const file = fixture(name);
      await db.LimitSet.destroy({ where: { agency_id: agency.id } });
      const { id } = await create({ from: { file, takeGround: true } }, site);
      const response = await call(exportLayout, { params: { layoutId: id }, cookie });
      expect(response.headers.get('content-type')).toBe('application/geo+json');
      expect(response.headers.get('content-disposition')).toMatch(
        /^attachment; filename="[\w-]+\.geojson"$/,
      );
      const back = await jsonOf<File>(response);
      const parsed = parseExchange(back);
      const original = parseExchange(file);
      if (!parsed.ok || !original.ok) throw new Error('one of the two files is not readable');
      expect(parsed.sheet.layout).toEqual(original.sheet.layout);
      expect(parsed.sheet.site).toEqual(original.sheet.site);
      expect(sorted(back).features.map((feature) => feature.id)).toEqual(
        sorted(file).features.map((feature) => feature.id),
      );
    },
  );

  test('without its ground the site stays as it was, and what was left out is told', async () => {
    const site = await makeSite(agency.people.planner);
    const { not_taken } = await create({ from: { file: fixture('everything-met') } }, site);
    expect((await ground(site)).version).toBe(1);
    expect(not_taken).toContain('its acceptance value: the agency’s holds');
    expect(not_taken).toContain('7 owners’ answers');
    expect(not_taken).toContain('1 locate ticket');
  });

  test('its ground adds to the site’s and writes over nothing', async () => {
    const site = await makeSite(agency.people.planner);
    await create({ from: { file: fixture('everything-met'), takeGround: true } }, site);
    const before = await ground(site);
    const file = fixture('everything-met');
    const line = file.features.find(
      (f) => (f.properties as { kind: string }).kind === 'buried-line',
    )!;
    (line.properties as { depth_ft: number }).depth_ft = 99;
    const answers = (file.stillground.buried_lines as { answers: Record<string, unknown> }).answers;
    answers.electric = { answer: 'waiting' };
    const { not_taken } = await create({ from: { file, takeGround: true } }, site);
    expect((await ground(site)).ground).toEqual(before.ground);
    expect((await ground(site)).version).toBe(before.version);
    expect(not_taken.join('; ')).toContain(String(line.id));
    expect(not_taken.join('; ')).toContain('the site has its own');
  });

  test('a piece whose id the site already uses gets a new one, and its cables follow', async () => {
    const site = await makeSite(agency.people.planner);
    const first = fixture('everything-met');
    first.features = first.features.filter((f) => f.id === 'cv');
    first.features.push({
      type: 'Feature',
      id: 'rod-1',
      properties: { kind: 'fixed-point', name: 'Hydrant' },
      geometry: { type: 'Point', coordinates: [-98.3, 41.2] },
    });
    await create({ from: { file: first, takeGround: true } }, site);
    const { id } = await create({ from: { file: fixture('everything-met') } }, site);
    const { layout, site: answered } = await read(id);
    const ids = new Set(layout.pieces.map((piece) => piece.id));
    expect(ids.has('rod-1')).toBe(false);
    expect(answered.ground.features.map((feature) => feature.id)).toContain('rod-1');
    for (const piece of layout.pieces) {
      if ('from' in piece) expect([ids.has(piece.from), ids.has(piece.to)]).toEqual([true, true]);
    }
    expect(layout.pieces).toHaveLength(
      fixture('everything-met').features.filter(
        (f) =>
          ![
            'buried-line',
            'fixed-point',
            'no-drive',
            'low-ground',
            'metal-line',
            'overhead-line',
          ].includes((f.properties as { kind: string }).kind),
      ).length,
    );
  });

  test('every fault at once, with its path, and nothing made', async () => {
    const site = await makeSite(agency.people.planner);
    const file = fixture('everything-met');
    (file.features[0]!.properties as { kind: string }).kind = 'spaceship';
    file.features[1]!.geometry = { type: 'Point', coordinates: [-98.3, 141] };
    file.features[2]!.id = file.features[3]!.id;
    file.stillground.pump = 'nowhere';
    const faults = await faultsOf(await post({ from: { file, takeGround: true } }, site));
    const paths = faults.map((fault) => fault.path);
    for (const path of [
      'from.file.features[0].properties.kind',
      'from.file.features[1].geometry.coordinates',
      'from.file.features[3].id',
      'from.file.stillground.pump',
    ]) {
      expect(paths).toContainEqual(expect.stringContaining(path));
    }
    const list = await call(listLayouts, { params: { siteId: site }, cookie });
    expect((await jsonOf<LayoutsAnswer>(list)).layouts).toEqual([]);
    expect((await ground(site)).version).toBe(1);
  });

  test.each([null, 7, 'text', [], {}, { type: 'FeatureCollection' }])(
    'a file that is %j is refused',
    async (file) => expect(await faultsOf(await post({ from: { file } }))).not.toHaveLength(0),
  );
});

test('the list pages by the time of the last save', async () => {
  const site = await makeSite(agency.people.planner);
  const made: string[] = [];
  for (let n = 0; n < 5; n += 1) made.unshift((await create({ name: `Plan ${n}` }, site)).id);
  const seen: string[] = [];
  let cursor: string | null = '';
  while (cursor !== null) {
    const path: string = `/?limit=2${cursor ? `&cursor=${cursor}` : ''}`;
    const page: LayoutsAnswer = await jsonOf<LayoutsAnswer>(
      await call(listLayouts, { params: { siteId: site }, cookie, path }),
    );
    seen.push(...page.layouts.map((layout) => layout.id));
    cursor = page.next_cursor;
  }
  expect([...seen].sort()).toEqual([...made].sort());
});
