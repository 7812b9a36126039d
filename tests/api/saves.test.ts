import { beforeAll, describe, expect, test } from 'vitest';
import { GET as getLayout, PUT as putLayout } from '@/app/api/layouts/[layoutId]/route';
import { GET as getChanges } from '@/app/api/layouts/[layoutId]/changes/route';
import { GET as getChange } from '@/app/api/layouts/[layoutId]/changes/[version]/route';
import { POST as restore } from '@/app/api/layouts/[layoutId]/restore/route';
import type { ChangesAnswer, LayoutAnswer, ProblemDetails, StaleLayout } from '@/lib/api';
import { emptyLayout, type Layout } from '@/lib/layout';
import { db } from '@/lib/server/database';
import { readChange } from '@/lib/server/layouts/read-change';
import { readLayout } from '@/lib/server/layouts/read-layout';
import { readGround } from '@/lib/server/sites/read-ground';
import { readSite } from '@/lib/server/sites/read-site';
import { makeAgency, makeLayout, makeSite, type TestAgency } from './support/agency';
import { call, jsonOf } from './support/call';

let agency: TestAgency;
let siteId: string;

beforeAll(async () => {
  agency = await makeAgency();
  siteId = await makeSite(agency.people.planner);
});

const plan = (name: string): Layout => ({
  ...emptyLayout([-98.3, 41.2], name),
  pieces: [{ id: 'note-1', kind: 'note', at: [-98.3, 41.2], text: 'Ω µ ≤ “quoted” 🚛' }],
});

const put = (
  layoutId: string,
  ifMatch: string | undefined,
  layout: unknown,
  who = agency.people.planner,
) =>
  call(putLayout, {
    method: 'PUT',
    params: { layoutId },
    cookie: who.cookie,
    body: { layout, label: 'Move R2' },
    ...(ifMatch !== undefined && { ifMatch }),
  });

const read = async (layoutId: string) => {
  const response = await call(getLayout, {
    params: { layoutId },
    cookie: agency.people.crew.cookie,
  });
  return { response, answer: await jsonOf<LayoutAnswer>(response) };
};

describe('saving a layout', () => {
  test('what was saved is what is read, with the next version and its tag', async () => {
    const layoutId = await makeLayout(agency.people.planner, siteId);
    const response = await put(layoutId, '"1"', plan('Plan B'));
    expect(response.status).toBe(200);
    expect(response.headers.get('etag')).toBe('"2"');
    const { response: got, answer } = await read(layoutId);
    expect(got.headers.get('etag')).toBe('"2"');
    expect(answer.layout).toEqual(plan('Plan B'));
    expect(answer.version).toBe(2);
    expect(answer.saved_by).toEqual({
      id: agency.people.planner.id,
      name: agency.people.planner.name,
    });
    expect(answer.me.can).not.toContain('layout.draw');
  });

  test('members that this version does not know survive', async () => {
    const layoutId = await makeLayout(agency.people.planner, siteId);
    const layout = {
      ...plan('Loose'),
      conditions: { wind: { from_deg: 270, gust_mph: 14 }, humidity_pct: 40 },
      more: { header: { their_own: [1, null, { a: 'b' }] } },
    };
    await put(layoutId, '"1"', layout);
    expect((await read(layoutId)).answer.layout).toEqual(layout);
  });

  test('without a version: 428, nothing written', async () => {
    const layoutId = await makeLayout(agency.people.planner, siteId);
    const response = await put(layoutId, undefined, plan('x'));
    expect(response.status).toBe(428);
    expect((await jsonOf<ProblemDetails>(response)).code).toBe('version-missing');
    expect((await read(layoutId)).answer.version).toBe(1);
  });

  test.each(['*', '"0"', '"1.5"', 'W/"1"', '"1", "2"', 'one'])('If-Match %s: 400', async (tag) => {
    const layoutId = await makeLayout(agency.people.planner, siteId);
    expect((await put(layoutId, tag, plan('x'))).status).toBe(400);
  });

  test('from an older version: 412 with the newest and who saved it; both are kept', async () => {
    const layoutId = await makeLayout(agency.people.planner, siteId);
    await put(layoutId, '"1"', plan('Theirs'), agency.people['safety-officer']);
    const response = await put(layoutId, '"1"', plan('Mine'));
    expect(response.status).toBe(412);
    expect(response.headers.get('content-type')).toBe('application/problem+json');
    const problem = await jsonOf<ProblemDetails & { current: StaleLayout }>(response);
    expect(problem.code).toBe('stale');
    expect(problem.current.version).toBe(2);
    expect(problem.current.layout).toEqual(plan('Theirs'));
    expect(problem.current.saved_by?.name).toBe(agency.people['safety-officer'].name);
    expect((await read(layoutId)).answer.layout.name).toBe('Theirs');
  });

  test('from a version that has not been yet: 412', async () => {
    const layoutId = await makeLayout(agency.people.planner, siteId);
    expect((await put(layoutId, '"7"', plan('x'))).status).toBe(412);
  });

  test('the same save sent twice, its first answer lost, is confirmed and not refused', async () => {
    const layoutId = await makeLayout(agency.people.planner, siteId);
    await put(layoutId, '"1"', plan('Once'));
    const again = await put(layoutId, '"1"', plan('Once'));
    expect(again.status).toBe(200);
    expect(await jsonOf(again)).toMatchObject({ version: 2 });
    expect(await db.LayoutChange.count({ where: { layout_id: layoutId } })).toBe(2);
    const byAnother = await put(layoutId, '"1"', plan('Once'), agency.people['safety-officer']);
    expect(byAnother.status).toBe(412);
  });

  test('every fault at once, each with its path, and nothing written', async () => {
    const layoutId = await makeLayout(agency.people.planner, siteId);
    const response = await put(layoutId, '"1"', {
      ...plan('x'),
      origin: [-198, 41],
      pump: 'on a boat',
      pieces: [
        { id: 'a', kind: 'rod', at: [-98.3, 'north'], system: 'X' },
        { id: '', kind: 'note', at: [-98.3, 41.2] },
      ],
    });
    expect(response.status).toBe(422);
    const { faults } = await jsonOf<ProblemDetails>(response);
    expect(faults?.map((fault) => fault.path).sort()).toEqual([
      'layout.origin',
      'layout.pieces[0].at[1]',
      'layout.pieces[0].system',
      'layout.pieces[1].id',
      'layout.pump',
    ]);
    expect((await read(layoutId)).answer.version).toBe(1);
  });

  test('an id used twice is a fault', async () => {
    const layoutId = await makeLayout(agency.people.planner, siteId);
    const { pieces } = plan('x');
    const response = await put(layoutId, '"1"', { ...plan('x'), pieces: [...pieces, ...pieces] });
    expect((await jsonOf<ProblemDetails>(response)).faults).toEqual([
      {
        path: 'layout.pieces[1].id',
        message: 'the id "note-1" is already that of layout.pieces[0]',
      },
    ]);
  });
});

describe('history', () => {
  test('every version can be listed a page at a time, opened and restored', async () => {
    const layoutId = await makeLayout(agency.people.planner, siteId);
    for (const n of [1, 2, 3, 4]) await put(layoutId, `"${n}"`, plan(`Plan ${n + 1}`));
    const list = async (query: string) =>
      jsonOf<ChangesAnswer>(
        await call(getChanges, {
          params: { layoutId },
          path: `/?${query}`,
          cookie: agency.people.crew.cookie,
        }),
      );
    const first = await list('limit=3');
    expect(first.changes.map((change) => change.version)).toEqual([5, 4, 3]);
    const second = await list(`limit=3&cursor=${first.next_cursor}`);
    expect(second.changes.map((change) => [change.version, change.label])).toEqual([
      [2, 'Move R2'],
      [1, 'New layout'],
    ]);
    expect(second.next_cursor).toBeNull();

    const old = await call(getChange, {
      params: { layoutId, version: '3' },
      cookie: agency.people.crew.cookie,
    });
    expect(await jsonOf(old)).toMatchObject({ version: 3, layout: plan('Plan 3') });

    const restored = await call(restore, {
      params: { layoutId },
      cookie: agency.people.planner.cookie,
      body: { version: 3 },
    });
    expect(await jsonOf(restored)).toMatchObject({ version: 6 });
    expect((await read(layoutId)).answer.layout).toEqual(plan('Plan 3'));
    expect((await list('')).changes[0]).toMatchObject({ version: 6, label: 'Restore version 3' });
  });

  test('a version that never was: 404', async () => {
    const layoutId = await makeLayout(agency.people.planner, siteId);
    const params = { layoutId, version: '9' };
    const cookie = agency.people.planner.cookie;
    expect((await call(getChange, { params, cookie })).status).toBe(404);
    const body = { version: 9 };
    expect((await call(restore, { params: { layoutId }, cookie, body })).status).toBe(404);
  });

  test('the database itself refuses to change or drop a version', async () => {
    const layoutId = await makeLayout(agency.people.planner, siteId);
    const where = { layout_id: layoutId };
    await expect(db.LayoutChange.update({ label: 'x' }, { where })).rejects.toThrow('history');
    await expect(db.LayoutChange.destroy({ where })).rejects.toThrow('history');
  });
});

test('an id that is no id leads nowhere, however it reaches the query', async () => {
  const { planner } = agency.people;
  for (const id of ['北', 'x', '', "' OR 1=1"]) {
    await expect(readLayout(planner, id)).rejects.toMatchObject({ code: 'not-found' });
    await expect(readChange(planner, id, 1)).rejects.toMatchObject({ code: 'not-found' });
    await expect(readSite(planner, id)).rejects.toMatchObject({ code: 'not-found' });
    await expect(readGround(planner, id)).rejects.toMatchObject({ code: 'not-found' });
  }
});
