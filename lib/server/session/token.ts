import 'server-only';
import { decode } from 'next-auth/jwt';
import { z } from 'zod';
import { SettingError } from '../database/open';

const sessionId = z.uuid();

export function secret(): string {
  const set = process.env.NEXTAUTH_SECRET;
  if (!set) throw new SettingError('NEXTAUTH_SECRET', 'NEXTAUTH_SECRET is not set.');
  return set;
}

/** Behind TLS the cookie has the prefix that a browser only takes from a secure page. */
export const secureCookies = (): boolean =>
  process.env.NEXTAUTH_URL?.startsWith('https://') ?? false;

export const sessionCookie = (): string =>
  `${secureCookies() ? '__Secure-' : ''}next-auth.session-token`;

/** The id of the session the cookie speaks of. A forged or expired cookie speaks of none. */
export async function sessionIdFrom(cookie: string | undefined): Promise<string | null> {
  if (!cookie) return null;
  const key = secret();
  const token = await decode({ token: cookie, secret: key }).catch(() => null);
  const id = sessionId.safeParse(token?.sid);
  return id.success ? id.data : null;
}
