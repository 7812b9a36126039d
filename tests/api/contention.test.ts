import { beforeAll, expect, test } from 'vitest';
import { PUT as putLayout } from '@/app/api/layouts/[layoutId]/route';
import type { ProblemDetails, StaleLayout } from '@/lib/api';
import { emptyLayout, type Layout } from '@/lib/layout';
import { db, database } from '@/lib/server/database';
import { verifyAudit } from '@/lib/server/audit';
import { openDatabase } from '@/lib/server/database/open';
import { makeAgency, makeLayout, makeSite, type TestAgency } from './support/agency';
import { call, jsonOf } from './support/call';

const WRITERS = 16;
const SAVES_EACH = 8;

let agency: TestAgency;
let siteId: string;

beforeAll(async () => {
  agency = await makeAgency();
  siteId = await makeSite(agency.people.planner);
});

const addNote = (layout: Layout, id: string): Layout => ({
  ...layout,
  pieces: [...layout.pieces, { id, kind: 'note', at: [-98.3, 41.2], text: id }],
});

/** Saves note after note; when told that it is behind, goes on from the newest. */
async function writer(layoutId: string, name: string): Promise<string[]> {
  const kept: string[] = [];
  let version = 1;
  let layout = emptyLayout([-98.3, 41.2], 'Contended');
  while (kept.length < SAVES_EACH) {
    const id = `${name}-${kept.length}`;
    const next = addNote(layout, id);
    const response = await call(putLayout, {
      method: 'PUT',
      params: { layoutId },
      cookie: agency.people.planner.cookie,
      ifMatch: `"${version}"`,
      body: { layout: next, label: id },
    });
    if (response.status === 200) {
      ({ version } = await jsonOf<{ version: number }>(response));
      layout = next;
      kept.push(id);
    } else {
      expect(response.status).toBe(412);
      const { current } = await jsonOf<ProblemDetails & { current: StaleLayout }>(response);
      ({ version, layout } = current);
    }
  }
  return kept;
}

test(`${WRITERS} writers on one layout: every acknowledged save is kept`, async () => {
  const { planner } = agency.people;
  const start = emptyLayout([-98.3, 41.2], 'Contended');
  const layoutId = await makeLayout(planner, siteId, start);
  const kept = (
    await Promise.all(Array.from({ length: WRITERS }, (_, n) => writer(layoutId, `w${n}`)))
  ).flat();

  const row = await db.Layout.findByPk(layoutId, { raw: true });
  expect(kept).toHaveLength(WRITERS * SAVES_EACH);
  expect(row?.version).toBe(1 + kept.length);
  expect(row?.document.pieces.map((piece) => piece.id).sort()).toEqual([...kept].sort());

  const changes = await db.LayoutChange.findAll({
    where: { layout_id: layoutId },
    order: ['version'],
    raw: true,
  });
  expect(changes.map((change) => change.version)).toEqual(
    Array.from({ length: 1 + kept.length }, (_, n) => n + 1),
  );
  // Each version holds all of the one before it and the one note its label names.
  changes.slice(1).forEach((change, index) => {
    expect(change.document.pieces.map((piece) => piece.id)).toEqual([
      ...changes[index]!.document.pieces.map((piece) => piece.id),
      change.label,
    ]);
  });
  expect(await verifyAudit(agency.id)).toEqual([]);
});

test('the control: read, change, write without comparing loses saves on the same database', async () => {
  const layoutId = await makeLayout(agency.people.planner, siteId);
  const { config } = database;
  const address = `mariadb://${config.username}:${config.password}@${config.host}:${config.port}/${config.database}`;
  const direct = openDatabase(address, WRITERS);
  let acknowledged = 0;
  const naive = async () => {
    for (let save = 0; save < SAVES_EACH; save += 1) {
      await direct.transaction(async (transaction) => {
        const [rows] = (await direct.query('SELECT version FROM layouts WHERE id = ?', {
          replacements: [layoutId],
          transaction,
        })) as [{ version: number }[], unknown];
        await direct.query('UPDATE layouts SET version = ? WHERE id = ?', {
          replacements: [rows[0]!.version + 1, layoutId],
          transaction,
        });
      });
      acknowledged += 1;
    }
  };
  await Promise.all(Array.from({ length: WRITERS }, naive));
  await direct.close();
  const row = await db.Layout.findByPk(layoutId, { attributes: ['version'], raw: true });
  expect(acknowledged).toBe(WRITERS * SAVES_EACH);
  expect(row!.version - 1).toBeLessThan(acknowledged);
});
