import 'server-only';
import type { NextRequest } from 'next/server';
import { findSession } from './find-session';
import type { SignedIn } from './signed-in';
import { sessionCookie, sessionIdFrom } from './token';

/** Who sent this request, or null. */
export async function personOf(request: NextRequest): Promise<SignedIn | null> {
  const id = await sessionIdFrom(request.cookies.get(sessionCookie())?.value);
  return id === null ? null : findSession(id);
}
