import 'server-only';
import type { NextAuthOptions } from 'next-auth';
import Credentials from 'next-auth/providers/credentials';
import { z } from 'zod';
import { writeSignInError } from '@/lib/api';
import { log } from '../log';
import { addressOf } from '../people/address';
import { SignInRefused, signIn } from '../people/sign-in';
import { signOut } from '../people/sign-out';
import { isDatabaseAway } from '../problems';
import { findSession } from './find-session';
import { SESSION_DAYS } from './rules';
import { secureCookies, sessionCookie, sessionIdFrom } from './token';

const typed = z.object({ email: z.string().max(254), password: z.string().max(1000) });
const sessionId = z.uuid();

type Headers = Record<string, string | undefined>;

async function authorize(credentials: unknown, headers: Headers) {
  const entered = typed.safeParse(credentials);
  if (!entered.success) throw new SignInRefused({ code: 'wrong' });
  try {
    return await signIn({
      ...entered.data,
      address: addressOf(headers['x-forwarded-for']),
      before: await sessionIdFrom(cookieIn(headers.cookie, sessionCookie())),
    });
  } catch (error) {
    if (error instanceof SignInRefused) throw error;
    log.error({ err: error }, 'sign-in failed');
    // next-auth puts the message into an address, so the error's own words must not leave.
    throw new Error(
      writeSignInError({ code: isDatabaseAway(error) ? 'database-away' : 'unknown' }),
    );
  }
}

function cookieIn(header: string | undefined, name: string): string | undefined {
  const pair = header?.split(/;\s*/).find((part) => part.startsWith(`${name}=`));
  return pair?.slice(name.length + 1);
}

/** Sessions are JWTs that only name a row; the row decides, on every request. */
export const authOptions: NextAuthOptions = {
  providers: [
    Credentials({
      credentials: { email: { type: 'email' }, password: { type: 'password' } },
      authorize: (credentials, request) =>
        authorize(credentials, (request.headers ?? {}) as Headers),
    }),
  ],
  session: { strategy: 'jwt', maxAge: SESSION_DAYS * 86_400 },
  useSecureCookies: secureCookies(),
  pages: { signIn: '/sign-in', signOut: '/', error: '/sign-in' },
  callbacks: {
    async jwt({ token, user }) {
      if (user) return { sub: user.id, sid: (user as { sessionId?: unknown }).sessionId };
      const sid = sessionId.safeParse(token.sid);
      const person = sid.success ? await findSession(sid.data) : null;
      // Thrown, because next-auth then takes the cookie away; returned, it would renew it.
      if (!person) throw new Error('the session has ended');
      return { sub: person.id, sid: person.sessionId, name: person.name, role: person.role };
    },
    session({ token, session }) {
      return {
        expires: session.expires,
        user: { name: token.name ?? null, role: token.role },
      } as typeof session;
    },
  },
  events: {
    async signOut({ token }) {
      const sid = sessionId.safeParse(token?.sid);
      if (sid.success) await signOut(sid.data);
    },
  },
  logger: {
    error(code, metadata) {
      // An ended session and a refused sign-in are everyday; anything else is a failure.
      if (code === 'JWT_SESSION_ERROR') return log.info({ code }, 'a cookie of an ended session');
      log.error({ code, metadata }, 'sign-in service');
    },
    warn: (code) => log.warn({ code }, 'sign-in service'),
    debug: () => undefined,
  },
};
