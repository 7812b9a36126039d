import type { NextRequest } from 'next/server';
import { Refusal } from '../problems';

/** The version a change was made from, out of `If-Match: "12"`. */
export function versionIn(request: NextRequest): number {
  const header = request.headers.get('if-match');
  if (header === null) {
    throw new Refusal(
      'version-missing',
      'Say in If-Match which version this change was made from, so that nobody’s work is written over. Nothing was changed.',
    );
  }
  const version = /^"?([1-9]\d{0,9})"?$/.exec(header.trim())?.[1];
  if (!version) {
    throw new Refusal('bad-request', 'If-Match must be one version number, like "12".');
  }
  return Number(version);
}
