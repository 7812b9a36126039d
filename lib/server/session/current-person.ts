import 'server-only';
import { cookies } from 'next/headers';
import { cache } from 'react';
import { findSession } from './find-session';
import type { SignedIn } from './signed-in';
import { sessionCookie, sessionIdFrom } from './token';

/** Who is asking for the page being rendered; looked up once a request. */
export const currentPerson = cache(async (): Promise<SignedIn | null> => {
  const id = await sessionIdFrom((await cookies()).get(sessionCookie())?.value);
  return id === null ? null : findSession(id);
});
