import { z } from 'zod';
import { ACTIONS, ROLES } from '../access';
import type { Limits } from '../limits';
import { layoutSchema, siteGroundSchema } from '../layout/schema';
import { at, id, label, lonLat, name, page, who } from './common';
import { baseMap } from './base-map';
import { fault } from './problem';
import { kitAnswer } from './kits';

export const layoutsQuery = page;

/** From nothing, from another layout of the agency, or from an exchange file. */
export const newLayout = z.strictObject({
  name: name.nullish(),
  from: z
    .union([
      z.strictObject({ layoutId: id }),
      /** `takeGround` also puts the file's site features and answers on the site. */
      z.strictObject({ file: z.unknown(), takeGround: z.boolean().optional() }),
    ])
    .nullish(),
  /** Where a layout from nothing starts, if the site has no place of its own. */
  origin: z.nullish(lonLat),
});

export const createdLayout = z.object({
  id,
  version: z.int(),
  /** What an imported file held that was left out, in words. */
  not_taken: z.array(z.string()),
});

export const layoutRow = z.object({
  id,
  site_id: id,
  name: z.string(),
  version: z.int(),
  pieces: z.int(),
  drawn_by: who.nullable(),
  saved_by: who.nullable(),
  saved_at: at,
});
export const layoutsAnswer = z.object({
  layouts: z.array(layoutRow),
  next_cursor: z.string().nullable(),
});

/** The agency's limit set in force, ready for the checks. */
const limitsInForce = z.custom<Limits>((value) => typeof value === 'object' && value !== null);

export const me = z.object({
  id,
  name: z.string(),
  role: z.enum(ROLES),
  can: z.array(z.enum(ACTIONS)),
});

/** Everything the drawing needs, in one answer. */
export const layoutAnswer = z.object({
  id,
  version: z.int(),
  layout: layoutSchema,
  site: z.object({
    id,
    name: z.string(),
    ground: siteGroundSchema,
    ground_version: z.int(),
  }),
  limits: limitsInForce,
  limits_number: z.int(),
  kits: z.array(kitAnswer),
  base_map: baseMap.nullable(),
  agency: z.object({ name: z.string() }),
  me,
  drawn_by: who.nullable(),
  saved_by: who.nullable(),
  saved_at: at,
});

export const layoutSave = z.strictObject({ layout: layoutSchema, label });

/** `current` of the 412 that answers a save made from an older version. */
export const staleLayout = z.object({
  version: z.int(),
  layout: layoutSchema,
  saved_at: at,
  saved_by: who.nullable(),
});
export const staleGround = z.object({
  version: z.int(),
  ground: siteGroundSchema,
  saved_at: at,
  saved_by: who.nullable(),
});

export const changeRow = z.object({ version: z.int(), label: z.string(), at, by: who.nullable() });
export const changesAnswer = z.object({
  changes: z.array(changeRow),
  next_cursor: z.string().nullable(),
});
export const changeAnswer = changeRow.extend({ layout: layoutSchema });
export const restoreRequest = z.strictObject({ version: z.int().min(1) });

export const faultsAnswer = z.object({ faults: z.array(fault) });

export type NewLayout = z.input<typeof newLayout>;
export type CreatedLayout = z.infer<typeof createdLayout>;
export type LayoutRow = z.infer<typeof layoutRow>;
export type LayoutsAnswer = z.infer<typeof layoutsAnswer>;
export type LayoutAnswer = z.infer<typeof layoutAnswer>;
export type LayoutSave = z.infer<typeof layoutSave>;
export type StaleLayout = z.infer<typeof staleLayout>;
export type StaleGround = z.infer<typeof staleGround>;
export type ChangeRow = z.infer<typeof changeRow>;
export type ChangesAnswer = z.infer<typeof changesAnswer>;
export type ChangeAnswer = z.infer<typeof changeAnswer>;
export type Me = z.infer<typeof me>;
