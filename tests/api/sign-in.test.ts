import { randomUUID } from 'node:crypto';
import NextAuth from 'next-auth';
import { beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { GET as getSites } from '@/app/api/sites/route';
import { readSignInError } from '@/lib/api';
import { db } from '@/lib/server/database';
import { accountKey } from '@/lib/server/people/attempts';
import { endSessions } from '@/lib/server/people/end-sessions';
import { signIn } from '@/lib/server/people/sign-in';
import { authOptions } from '@/lib/server/session/options';
import { SESSION_UNUSED_HOURS, TRIES } from '@/lib/server/session/rules';
import { cookieFor, makeAgency, makePerson, PASSWORD, type TestPerson } from './support/agency';
import { call } from './support/call';

let agencyId: string;
let person: TestPerson;
let address: string;

beforeAll(async () => {
  agencyId = (await makeAgency('Sign-in agency')).id;
});
beforeEach(async () => {
  person = await makePerson(agencyId, 'Sign-in agency', 'planner');
  address = `203.0.113.${Math.floor(Math.random() * 1e6)}`;
});

const enter = (email: string, password: string, from = address) =>
  signIn({ email, password, address: from, before: null }).then(
    (session) => session.sessionId,
    (error: Error) => readSignInError(error.message),
  );
const status = async (cookie: string) => (await call(getSites, { cookie })).status;

describe('signing in', () => {
  test('the right password opens a session that answers', async () => {
    const sessionId = (await enter(` ${person.email.toUpperCase()} `, PASSWORD)) as string;
    expect(await status(await cookieFor(sessionId))).toBe(200);
  });

  test('a wrong password and an unknown e-mail get the same answer', async () => {
    const wrong = await enter(person.email, 'wrong');
    expect(wrong).toEqual({ code: 'wrong' });
    expect(await enter(`${randomUUID()}@test.example`, 'wrong')).toEqual(wrong);
  });

  test('both take the work of checking a password', async () => {
    const time = async (email: string) => {
      const started = performance.now();
      await enter(email, 'wrong', randomUUID());
      return performance.now() - started;
    };
    const known: number[] = [];
    const unknown: number[] = [];
    for (let n = 0; n < 7; n += 1) {
      known.push(await time((await makePerson(agencyId, 'x', 'crew')).email));
      unknown.push(await time(`${randomUUID()}@test.example`));
    }
    const median = (times: number[]) => times.sort((a, b) => a - b)[3]!;
    expect(median(unknown)).toBeGreaterThan(median(known) / 3);
  });

  test('a disabled account is told nothing more', async () => {
    await db.Person.update({ disabled_at: new Date() }, { where: { id: person.id } });
    expect(await enter(person.email, PASSWORD)).toEqual({ code: 'wrong' });
    expect(await status(person.cookie)).toBe(401);
  });

  test('the session the browser had before ends', async () => {
    await signIn({ email: person.email, password: PASSWORD, address, before: person.sessionId });
    expect(await status(person.cookie)).toBe(401);
  });
});

describe('too many tries', () => {
  test('an account rests after its share of wrong passwords, even with the right one', async () => {
    for (let n = 0; n < TRIES.perAccount; n += 1) {
      expect(await enter(person.email, 'wrong', randomUUID())).toEqual({ code: 'wrong' });
    }
    const refused = await enter(person.email, PASSWORD, randomUUID());
    expect(refused).toEqual({ code: 'too-many-tries', minutes: TRIES.windowMinutes });
    await db.SignInAttempt.update(
      { at: new Date(Date.now() - TRIES.windowMinutes * 60_000) },
      { where: { account: accountKey(person.email) } },
    );
    expect(typeof (await enter(person.email, PASSWORD))).toBe('string');
  });

  test('an unknown e-mail rests the same way', async () => {
    const email = `${randomUUID()}@test.example`;
    for (let n = 0; n < TRIES.perAccount; n += 1) await enter(email, 'x', randomUUID());
    expect(await enter(email, 'x')).toMatchObject({ code: 'too-many-tries' });
  });

  test('tries refused while resting do not lengthen the rest', async () => {
    for (let n = 0; n < TRIES.perAccount + 5; n += 1) await enter(person.email, 'wrong');
    const counted = { account: accountKey(person.email), outcome: 'failed' as const };
    expect(await db.SignInAttempt.count({ where: counted })).toBe(TRIES.perAccount);
  });

  test('a hundred at once get no more tries than one after another', async () => {
    const answers = await Promise.all(
      Array.from({ length: 100 }, () => enter(person.email, 'wrong', randomUUID())),
    );
    const checked = answers.filter((answer) => (answer as { code: string }).code === 'wrong');
    expect(checked.length).toBeLessThanOrEqual(TRIES.perAccount);
  });

  test('signing in wipes the slate', async () => {
    for (let n = 0; n < TRIES.perAccount - 1; n += 1) await enter(person.email, 'wrong');
    expect(typeof (await enter(person.email, PASSWORD))).toBe('string');
    expect(await enter(person.email, 'wrong')).toEqual({ code: 'wrong' });
    expect(await enter(person.email, 'wrong')).toEqual({ code: 'wrong' });
  });

  test('an address rests when it has tried many accounts, and a success does not free it', async () => {
    for (let n = 0; n < TRIES.perAddress; n += 1) {
      if (n === 5) await enter(person.email, PASSWORD);
      await enter(`${randomUUID()}@test.example`, 'x');
    }
    expect(await enter(person.email, PASSWORD)).toMatchObject({ code: 'too-many-tries' });
    expect(typeof (await enter(person.email, PASSWORD, randomUUID()))).toBe('string');
  });

  test('the e-mail typed is kept as a hash only', async () => {
    await enter('hunter2-typed-in-the-wrong-field', 'x');
    const rows = await db.SignInAttempt.findAll({ where: { address }, raw: true });
    expect(JSON.stringify(rows)).not.toContain('hunter2');
  });
});

describe('sessions', () => {
  test('ending them works at once, on every device', async () => {
    expect(await status(person.cookie)).toBe(200);
    await endSessions(agencyId, person.id);
    expect(await status(person.cookie)).toBe(401);
  });

  test('one unused for long has ended', async () => {
    const long = new Date(Date.now() - SESSION_UNUSED_HOURS * 3_600_000 - 1000);
    await db.Session.update({ last_seen_at: long }, { where: { id: person.sessionId } });
    expect(await status(person.cookie)).toBe(401);
  });

  test('one past its last day has ended', async () => {
    await db.Session.update({ expires_at: new Date() }, { where: { id: person.sessionId } });
    expect(await status(person.cookie)).toBe(401);
  });

  test('a role changed takes effect on the next request', async () => {
    await db.Membership.update({ role: 'crew' }, { where: { person_id: person.id } });
    const { POST } = await import('@/app/api/sites/route');
    const response = await call(POST, { cookie: person.cookie, body: { name: 'x' } });
    expect(response.status).toBe(403);
  });

  test.each(['', 'nonsense', 'a.b.c.d.e'])('a cookie of %j is nobody', async (value) => {
    expect(await status(`next-auth.session-token=${value}`)).toBe(401);
  });

  test('a cookie made with another secret is nobody', async () => {
    const own = process.env.NEXTAUTH_SECRET;
    process.env.NEXTAUTH_SECRET = 'another secret, as long as it has to be';
    const forged = await cookieFor(person.sessionId);
    process.env.NEXTAUTH_SECRET = own;
    expect(await status(forged)).toBe(401);
  });
});

describe('over the sign-in service', () => {
  type Cookies = Record<string, string>;

  /** One request through next-auth itself, cookies kept as a browser would. */
  const ask = async (
    action: string[],
    method: 'GET' | 'POST',
    cookies: Cookies,
    body: Record<string, unknown> = {},
  ) => {
    const answer = { location: '', body: {} as Record<string, unknown> };
    const take = (set: string) => {
      const [pair] = set.split(';');
      const at = pair!.indexOf('=');
      cookies[pair!.slice(0, at)] = decodeURIComponent(pair!.slice(at + 1));
    };
    const response = {
      getHeader: () => undefined,
      status: () => response,
      setHeader(name: string, value: string | string[]) {
        if (name.toLowerCase() === 'set-cookie') [value].flat().forEach(take);
        if (name === 'Location') answer.location = value as string;
        return response;
      },
      json: (sent: { url: string }) => (answer.location = sent.url),
      send: (sent: unknown) => (answer.body = (sent ?? {}) as Record<string, unknown>),
      end: () => undefined,
    };
    const cookie = Object.entries(cookies).map(([name, value]) => `${name}=${value}`);
    await NextAuth(
      {
        method,
        body,
        cookies,
        query: { nextauth: action },
        headers: { 'x-forwarded-for': address, cookie: cookie.join('; ') },
      } as never,
      response as never,
      authOptions,
    );
    return answer;
  };
  const enterBy = async (cookies: Cookies, password: string) => {
    const { body } = await ask(['csrf'], 'GET', cookies);
    const { csrfToken } = body as { csrfToken: string };
    return ask(['callback', 'credentials'], 'POST', cookies, {
      csrfToken,
      email: person.email,
      password,
      json: 'true',
    });
  };
  const cookieOf = (cookies: Cookies) =>
    `next-auth.session-token=${cookies['next-auth.session-token']}`;

  test('signs in, answers, signs out; the old cookie is worth nothing afterwards', async () => {
    const cookies: Cookies = {};
    await enterBy(cookies, PASSWORD);
    const held = cookieOf(cookies);
    expect(await status(held)).toBe(200);
    expect((await ask(['session'], 'GET', { ...cookies })).body).toMatchObject({
      user: { name: person.name, role: 'planner' },
    });
    const { body } = await ask(['csrf'], 'GET', cookies);
    await ask(['signout'], 'POST', cookies, body);
    expect(await status(held)).toBe(401);
  });

  test('a new sign-in ends the session that the browser had', async () => {
    const cookies: Cookies = {};
    await enterBy(cookies, PASSWORD);
    const first = cookieOf(cookies);
    await enterBy(cookies, PASSWORD);
    expect(cookieOf(cookies)).not.toBe(first);
    expect(await status(first)).toBe(401);
    expect(await status(cookieOf(cookies))).toBe(200);
  });

  test('a session that was ended is taken out of the browser', async () => {
    const cookies: Cookies = {};
    await enterBy(cookies, PASSWORD);
    await endSessions(agencyId, person.id);
    const answer = await ask(['session'], 'GET', cookies);
    expect(answer.body).toEqual({});
    expect(cookies['next-auth.session-token']).toBe('');
  });

  test('a wrong password says so in a code, never in words of ours', async () => {
    const answer = await enterBy({}, 'wrong');
    expect(answer.location).toMatch(/[?&]error=wrong$/);
  });

  test('without the form’s own token nobody is signed in', async () => {
    const cookies: Cookies = {};
    await ask(['callback', 'credentials'], 'POST', cookies, {
      email: person.email,
      password: PASSWORD,
    });
    expect(cookies['next-auth.session-token']).toBeUndefined();
  });
});
