import { connect, createServer, type Server, type Socket } from 'node:net';
import { setTimeout as delay } from 'node:timers/promises';
import { afterAll, beforeAll, expect, test } from 'vitest';
import type * as HealthRoute from '@/app/api/health/route';
import type * as SitesRoute from '@/app/api/sites/route';
import type { ProblemDetails } from '@/lib/api';
import type { TestPerson } from './support/agency';
import { call, jsonOf } from './support/call';

/**
 * The database behind a line that can be cut: every open connection drops and new ones are
 * refused, as when its server stops.
 */
class Line {
  private server: Server | undefined;
  private readonly open = new Set<Socket>();
  port = 0;

  constructor(private readonly target: URL) {}

  async restore(): Promise<void> {
    this.server = createServer((socket) => {
      const far = connect(Number(this.target.port || 3306), this.target.hostname);
      for (const [one, other] of [
        [socket, far],
        [far, socket],
      ] as const) {
        this.open.add(one);
        one.on('error', () => other.destroy()).on('close', () => other.destroy());
        one.pipe(other);
      }
    });
    await new Promise<void>((done) => this.server!.listen(this.port, '127.0.0.1', done));
    this.port = (this.server.address() as { port: number }).port;
  }

  async cut(): Promise<void> {
    const closed = new Promise((done) => this.server?.close(done));
    for (const socket of this.open) socket.destroy();
    this.open.clear();
    await closed;
  }
}

const target = new URL(process.env.DATABASE_URL!);
const line = new Line(target);
let planner: TestPerson;
let sites: typeof SitesRoute;
let health: typeof HealthRoute;

beforeAll(async () => {
  await line.restore();
  const through = new URL(target);
  through.hostname = '127.0.0.1';
  through.port = String(line.port);
  // The application reads its address when it is loaded, so it is loaded after this.
  process.env.DATABASE_URL = through.href;
  sites = await import('@/app/api/sites/route');
  health = await import('@/app/api/health/route');
  const { makeAgency } = await import('./support/agency');
  planner = (await makeAgency()).people.planner;
});
afterAll(async () => {
  const { database } = await import('@/lib/server/database');
  await database.close();
  await line.cut();
});

const list = () => call(sites.GET, { cookie: planner.cookie });
const save = () => call(sites.POST, { cookie: planner.cookie, body: { name: 'Ramp' } });

test('stopped: a plain 503 within seconds; back: answers by itself, nothing half done', async () => {
  expect((await list()).status).toBe(200);
  expect((await call(health.GET)).status).toBe(200);

  await line.cut();
  for (const ask of [list, save]) {
    const started = Date.now();
    const response = await ask();
    expect(response.status).toBe(503);
    expect(Date.now() - started).toBeLessThan(10_000);
    expect(response.headers.get('retry-after')).toBe('5');
    const problem = await jsonOf<ProblemDetails>(response);
    expect(problem.code).toBe('database-away');
    expect(problem.detail).toContain('What was saved before is kept');
    expect(JSON.stringify(problem)).not.toMatch(/ECONN|127\.0\.0\.1|mariadb|sequelize/i);
  }
  const away = await call(health.GET);
  expect([away.status, await jsonOf(away)]).toEqual([503, { status: 'database-away' }]);

  await line.restore();
  expect(await jsonOf(await list())).toEqual({ sites: [], next_cursor: null });
  expect((await save()).status).toBe(201);
  expect((await call(health.GET)).status).toBe(200);
});

test('cut in the middle of many saves: each is either there or was refused', async () => {
  const statuses: number[] = [];
  let cut: Promise<void> | undefined;
  while (statuses.at(-1) !== 503) {
    const name = `During ${statuses.length}`;
    const saving = call(sites.POST, { cookie: planner.cookie, body: { name } });
    // Somewhere within the fifth: its statements take a few milliseconds together.
    if (statuses.length === 4) cut = delay(4).then(() => line.cut());
    statuses.push((await saving).status);
  }
  await cut;
  await line.restore();
  expect(new Set(statuses)).toEqual(new Set([201, 503]));
  const { db } = await import('@/lib/server/database');
  const kept = await db.Site.findAll({ where: { agency_id: planner.agencyId }, raw: true });
  const names = new Set(kept.map((site) => site.name));
  statuses.forEach((status, n) => {
    if (status === 201) expect(names).toContain(`During ${n}`);
  });
  for (const site of kept) {
    expect(await db.AuditEvent.count({ where: { subject_id: site.id } })).toBe(1);
  }
});
