import type { NextRequest } from 'next/server';
import { Refusal } from '../problems';

const READING = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Stops a change that another site's page sent with this browser's cookie. */
export function refuseOtherSites(request: NextRequest): void {
  if (READING.has(request.method)) return;
  const from = request.headers.get('sec-fetch-site');
  if (from === null || from === 'same-origin' || from === 'none') return;
  throw new Refusal(
    'cross-site',
    'This change was sent by a page of another site, so it was not made.',
  );
}
