import { z } from 'zod';
import { at, who } from './common';

/** One numbered set. Values are only what differs from the defaults. */
export const limitSet = z.object({
  number: z.int(),
  name: z.string(),
  values: z.record(z.string(), z.number()),
  acceptance: z.object({ max_ohm: z.number(), authority: z.string().nullable() }).nullable(),
  set_at: at,
  set_by: who.nullable(),
});
export const limitsAnswer = z.object({ limits: limitSet.nullable() });
export type LimitSetAnswer = z.infer<typeof limitSet>;
export type LimitsAnswer = z.infer<typeof limitsAnswer>;
