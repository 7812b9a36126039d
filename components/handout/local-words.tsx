'use client';

import { firstToFailWords } from '@/components/checks/first-to-fail-words';
import { clockWords, dateTimeWords } from '@/components/conditions/time-words';
import { useReadersZone } from '@/components/ui/when';
import type { FirstToFail } from '@/lib/checks';

/**
 * The only words of a handout that depend on where it is read. The server writes them in UTC; the
 * browser puts its own zone in place.
 */

const useZone = (): string => useReadersZone() ?? 'UTC';

export const LocalDateTime = ({ at }: { at: string }) => dateTimeWords(at, useZone());

/** The time of day, with its date where that is not the day of `beside`. */
export const LocalClock = ({ at, beside }: { at: string; beside: string }) =>
  clockWords(at, beside, useZone());

export const LocalFirstToFail = ({ first, asOf }: { first: FirstToFail; asOf: string }) =>
  firstToFailWords(first, asOf, useZone());
