import { z } from 'zod';
import { Refusal } from '../problems/problem';

/** The last row's sort key and id, as text that means nothing outside. */
const shape = z.tuple([z.string().max(300), z.string().max(100)]);
export type Cursor = z.infer<typeof shape>;

export const writeCursor = (cursor: Cursor): string =>
  Buffer.from(JSON.stringify(cursor)).toString('base64url');

export function readCursor(text: string | undefined): Cursor | null {
  if (text === undefined) return null;
  try {
    return shape.parse(JSON.parse(Buffer.from(text, 'base64url').toString('utf8')));
  } catch {
    throw new Refusal('bad-request', 'The cursor is not one that this list gave out.');
  }
}

/** Splits off the row that was read only to learn whether there is a next page. */
export function pageOf<Row>(rows: readonly Row[], limit: number, keyOf: (row: Row) => Cursor) {
  const page = rows.slice(0, limit);
  const last = page.at(-1);
  return { page, next_cursor: rows.length > limit && last ? writeCursor(keyOf(last)) : null };
}
