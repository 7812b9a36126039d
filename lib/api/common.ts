import { z } from 'zod';
import { lonLat } from '../layout/values';

export const id = z.uuid({ error: 'an id is a UUID' });
export const at = z.iso.datetime();
export const who = z.object({ id, name: z.string() });
export type Who = z.infer<typeof who>;

/** Rows of a page where nobody asks for another number. */
export const PAGE_ROWS = 50;

/** Lists come a page at a time; the cursor of the last page is null. */
export const page = z.object({
  cursor: z.string().max(500).optional(),
  limit: z.coerce.number().int().min(1).max(100).default(PAGE_ROWS),
});

export const name = z
  .string({ error: 'a name is needed' })
  .trim()
  .min(1, { error: 'a name is needed' })
  .max(200, { error: 'the name is longer than 200 characters' });

export { lonLat };

export const LABEL_MOST = 200;
/** What the change did, in the words that undo would use: "Move R2". */
export const label = z
  .string({ error: 'label must be text' })
  .trim()
  .min(1, { error: 'the label is empty' })
  .max(LABEL_MOST, { error: `label must be ${LABEL_MOST} characters or fewer` });

/** Bytes of a request body at most. */
export const MOST_BYTES = { request: 64 * 1024, layout: 2_000_000, ground: 30_000_000 } as const;

export const siteParams = z.object({ siteId: id });
export const layoutParams = z.object({ layoutId: id });
export const versionParams = layoutParams.extend({ version: z.coerce.number().int().min(1) });
