/** Instants in words. `zone` is an IANA name; left out, the reader's own. Nothing here asks what time it is. */

export const minutesBetween = (earlier: string, later: string): number =>
  (Date.parse(later) - Date.parse(earlier)) / 60_000;

/** "9 min", "2 h 05 min", "3 days": as much as it takes to know whether to look again. */
export function spanWords(minutes: number): string {
  const whole = Math.floor(minutes);
  if (whole < 60) return `${whole} min`;
  if (whole < 48 * 60) return `${Math.floor(whole / 60)} h ${two(whole % 60)} min`;
  return `${Math.floor(whole / (24 * 60))} days`;
}

/** "13:53", with the date before it where that is not the day of `beside`. */
export function clockWords(at: string, beside: string | null, zone?: string): string {
  const time = parts(at, zone);
  const clock = `${time.hour}:${time.minute}`;
  if (beside !== null && dayOf(at, zone) === dayOf(beside, zone)) return clock;
  return beside === null ? clock : `${dayOf(at, zone)} ${clock}`;
}

/** "2031-05-04 14:02 CDT": the date as it sorts, the zone as people there write it. */
export function dateTimeWords(at: string, zone?: string): string {
  const time = parts(at, zone);
  return `${dayOf(at, zone)} ${time.hour}:${time.minute} ${time.timeZoneName}`;
}

/** What `<input type="datetime-local">` holds, in the reader's zone. */
export function toLocalInput(at: string | null | undefined, zone?: string): string {
  if (!at || Number.isNaN(Date.parse(at))) return '';
  const time = parts(at, zone);
  return `${dayOf(at, zone)}T${time.hour}:${time.minute}`;
}

/** The instant that such an input stands for; null where it is empty or half filled in. */
export function fromLocalInput(value: string): string | null {
  const at = new Date(value);
  return value === '' || Number.isNaN(at.getTime()) ? null : at.toISOString();
}

type Parts = Record<'year' | 'month' | 'day' | 'hour' | 'minute' | 'timeZoneName', string>;

function parts(at: string, zone?: string): Parts {
  const format = new Intl.DateTimeFormat('en-US', {
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
    timeZoneName: 'short',
    ...(zone && { timeZone: zone }),
  });
  return Object.fromEntries(
    format.formatToParts(new Date(at)).map(({ type, value }) => [type, value]),
  ) as Parts;
}

function dayOf(at: string, zone?: string): string {
  const { year, month, day } = parts(at, zone);
  return `${year}-${month}-${day}`;
}

const two = (n: number): string => String(n).padStart(2, '0');
