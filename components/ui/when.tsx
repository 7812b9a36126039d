'use client';

import { formatDistanceToNowStrict } from 'date-fns';
import { useSyncExternalStore } from 'react';

/**
 * An instant in words and with its zone: "4 May 2031, 14:02 CDT, 9 minutes ago". The server does
 * not know the reader's zone: it writes UTC, and the browser puts its own in place after loading.
 */
export function When({ at, ago = true }: { at: string; ago?: boolean }) {
  const zone = useReadersZone();
  return (
    <time dateTime={at}>
      {instantWords(at, zone ?? 'UTC')}
      {ago && zone !== null && (
        <span className="text-ink-soft">
          , {formatDistanceToNowStrict(at, { addSuffix: true })}
        </span>
      )}
    </time>
  );
}

/** "4 May 2031, 14:02 CDT". */
export function instantWords(at: string, timeZone: string): string {
  const parts = new Intl.DateTimeFormat('en-US', {
    timeZone,
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
    timeZoneName: 'short',
  }).formatToParts(new Date(at));
  const part = (type: Intl.DateTimeFormatPartTypes) =>
    parts.find((candidate) => candidate.type === type)?.value ?? '';
  return `${part('day')} ${part('month')} ${part('year')}, ${part('hour')}:${part('minute')} ${part('timeZoneName')}`;
}

const never = () => () => {};
const readersZone = () => Intl.DateTimeFormat().resolvedOptions().timeZone;

/** The reader's zone; null while the server's page is still as it came. */
export const useReadersZone = (): string | null =>
  useSyncExternalStore(never, readersZone, () => null);
