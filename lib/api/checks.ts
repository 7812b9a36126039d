import { z } from 'zod';

const measured = z.object({ value: z.number(), unit: z.string() });
const allowed = z.object({
  min: z.number().nullable(),
  max: z.number().nullable(),
  unit: z.string(),
});

export const checksQuery = z.object({
  /** The instant the answer is for; default the file's `planned_at`. */
  at: z.iso.datetime({ offset: true }).optional(),
});

/** The same as the command line prints. */
export const checksAnswer = z.object({
  summary: z.object({
    meets: z.int(),
    caution: z.int(),
    not_met: z.int(),
    not_known: z.int(),
    na: z.int(),
  }),
  stands_for: z.object({ from_deg: z.number(), to_deg: z.number() }).nullable(),
  findings: z.array(
    z.looseObject({
      rule: z.string(),
      status: z.enum(['meets', 'caution', 'not-met', 'not-known', 'n/a']),
      gate: z.enum(['stop', 'deviation', 'ack']),
      subjects: z.array(z.string()),
      measured: measured.nullable(),
      allowed: allowed.nullable(),
      message: z.string(),
      source: z.string(),
      mark: z.string(),
      remedy: z.looseObject({ type: z.string() }).nullable(),
    }),
  ),
});
export type ChecksAnswer = z.infer<typeof checksAnswer>;
