/**
 * The files stand at one fixed moment so that they can be tested; a demonstration that opened on
 * a wind reading from another year would teach nothing. Laid in at `now`, the fixed moment becomes
 * that minute and everything else keeps its distance from it.
 */
export const DEMO_MOMENT = '2031-05-04T14:00:00Z';

const MINUTE_MS = 60_000;
const INSTANT = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}:\d{2}(\.\d+)?Z$/;

/** The same sheet, ground or layout with every instant moved; `now` is cut to the minute. */
export function asIfAt<T>(now: Date, value: T): T {
  const minute = Math.floor(now.getTime() / MINUTE_MS) * MINUTE_MS;
  return moved(value, minute - Date.parse(DEMO_MOMENT)) as T;
}

function moved(value: unknown, byMs: number): unknown {
  if (typeof value === 'string') {
    if (!INSTANT.test(value)) return value;
    return new Date(Date.parse(value) + byMs).toISOString().replace('.000Z', 'Z');
  }
  if (Array.isArray(value)) return value.map((item: unknown) => moved(item, byMs));
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([key, item]) => [key, moved(item, byMs)]));
}
