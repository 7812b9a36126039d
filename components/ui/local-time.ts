import { format, isValid, parseISO } from 'date-fns';

/** What `<input type="datetime-local">` shows for an instant, in the reader's own zone. */
export const toLocalEntry = (at: string | null | undefined): string =>
  at ? format(parseISO(at), "yyyy-MM-dd'T'HH:mm") : '';

/** The instant meant by such an entry; null where nothing, or not yet a whole time, is entered. */
export function fromLocalEntry(entry: string): string | null {
  const at = parseISO(entry);
  return entry !== '' && isValid(at) ? at.toISOString() : null;
}
