import { z } from 'zod';

/** Tiles lie at `/tiles/{pack}/{version}/{z}/{x}/{y}`. Bounds are west, south, east, north. */
export const baseMap = z.object({
  pack: z.string(),
  version: z.string(),
  min_zoom: z.int(),
  max_zoom: z.int(),
  bounds: z.tuple([z.number(), z.number(), z.number(), z.number()]),
  attribution: z.string(),
});
export type BaseMapAnswer = z.infer<typeof baseMap>;
