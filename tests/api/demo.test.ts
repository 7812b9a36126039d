import { mkdtemp, readFile, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { beforeAll, expect, test } from 'vitest';
import { GET as getLayout } from '@/app/api/layouts/[layoutId]/route';
import { GET as getKits } from '@/app/api/kits/route';
import { GET as getLimits } from '@/app/api/limits/route';
import { asIfAt } from '@/demo/shift-times';
import { DEMO_KITS, DEMO_LAYOUTS, DEMO_LIMITS, DEMO_SITES } from '@/demo/demo';
import type { KitsAnswer, LayoutAnswer, LimitsAnswer } from '@/lib/api';
import { parseExchange } from '@/lib/layout/exchange';
import { db, inTransaction } from '@/lib/server/database';
import { verifyAudit } from '@/lib/server/audit';
import { signIn } from '@/lib/server/people/sign-in';
import { seedAgency, type Author } from '@/scripts/seed/agency';
import { seedPlaces } from '@/scripts/seed/places';
import { keepSignIns, makeSignIns, type DemoSignIn } from '@/scripts/seed/sign-ins';
import { cookieFor } from './support/agency';
import { call, jsonOf } from './support/call';

const signIns = makeSignIns();
const laidIn = new Date();
let author: Author;
let cookie: string;

const enter = ({ email, password }: DemoSignIn) =>
  signIn({ email, password, address: '198.51.100.7', before: null });

beforeAll(async () => {
  author = await inTransaction(async (transaction) => {
    const planner = await seedAgency(signIns, transaction);
    await seedPlaces(planner, transaction, laidIn);
    return planner;
  });
  cookie = await cookieFor((await enter(signIns[0]!)).sessionId);
});

test('each of the team can sign in, one a role', async () => {
  expect(signIns.map((one) => one.role).sort()).toEqual([
    'administrator',
    'crew',
    'planner',
    'safety-officer',
  ]);
  for (const one of signIns) expect((await enter(one)).name).toBe(one.name);
  expect(new Set(signIns.map((one) => one.password)).size).toBe(signIns.length);
});

test('every site and layout lies in the database as its file says', async () => {
  const where = { agency_id: author.agencyId };
  expect(await db.Site.count({ where })).toBe(DEMO_SITES.length);
  const rows = await db.Layout.findAll({ where, order: [['saved_at', 'DESC']], raw: true });
  expect(rows.map((row) => row.name)).toEqual(DEMO_LAYOUTS.map((layout) => layout.name));
  for (const [index, { file }] of DEMO_LAYOUTS.entries()) {
    const parsed = parseExchange(JSON.parse(await readFile(file, 'utf8')));
    if (!parsed.ok) throw new Error(`${file} has faults`);
    const params = { layoutId: rows[index]!.id };
    const answer = await jsonOf<LayoutAnswer>(await call(getLayout, { params, cookie }));
    const { layout, site } = asIfAt(laidIn, parsed.sheet);
    expect(answer.layout.pieces).toEqual(layout.pieces);
    expect(answer.layout.conditions).toEqual(layout.conditions);
    expect(answer.site.ground).toEqual(site);
    expect(answer.limits).toEqual(parsed.limits);
  }
  expect(await verifyAudit(author.agencyId)).toEqual([]);
});

test('kits come with their counts, and the acceptance value with its authority', async () => {
  const { kits } = await jsonOf<KitsAnswer>(await call(getKits, { cookie }));
  expect(kits.map(({ name, items }) => ({ name, items }))).toEqual(
    [...DEMO_KITS].sort((a, b) => (a.name < b.name ? -1 : 1)),
  );
  const { limits } = await jsonOf<LimitsAnswer>(await call(getLimits, { cookie }));
  expect(limits).toMatchObject({ number: 1, name: DEMO_LIMITS.name });
  expect(limits?.acceptance).toEqual(DEMO_LIMITS.acceptance);
});

test('the sign-ins are kept where only their owner can read them', async () => {
  const folder = await mkdtemp(join(tmpdir(), 'sign-ins-'));
  try {
    await keepSignIns(folder, signIns);
    const file = join(folder, 'demo-sign-ins.json');
    expect(JSON.parse(await readFile(file, 'utf8'))).toEqual(signIns);
    expect((await stat(file)).mode & 0o777).toBe(0o600);
  } finally {
    await rm(folder, { recursive: true });
  }
});
