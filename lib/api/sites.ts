import { z } from 'zod';
import { siteGroundSchema } from '../layout/schema';
import { at, id, label, lonLat, name, page, who } from './common';
import { baseMap } from './base-map';

export const siteQuery = page.extend({
  /** Words looked for in name and place; every character is taken as it stands. */
  q: z.string().trim().max(200).optional(),
});

const where = z.string().trim().max(300, { error: 'the place is longer than 300 characters' });
const notes = z.string().trim().max(5000, { error: 'notes are longer than 5000 characters' });

export const newSite = z.strictObject({
  name,
  /** The place in words: road, milepost, yard. */
  where: where.nullish(),
  notes: notes.nullish(),
  at: z.nullish(lonLat),
});
export const siteChange = newSite.partial();

export const siteRow = z.object({
  id,
  name: z.string(),
  where: z.string().nullable(),
  at: z.nullable(lonLat),
  layouts: z.int(),
  /** When the site, its ground or a layout there last changed. */
  changed_at: at,
});
export const sitesAnswer = z.object({
  sites: z.array(siteRow),
  next_cursor: z.string().nullable(),
});

export const siteAnswer = siteRow.extend({
  notes: z.string().nullable(),
  ground_version: z.int(),
  base_map: baseMap.nullable(),
});

export const groundAnswer = z.object({
  site_id: id,
  version: z.int(),
  ground: siteGroundSchema,
  saved_at: at,
  saved_by: who.nullable(),
});
export const groundSave = z.strictObject({ ground: siteGroundSchema, label });
export const savedAnswer = z.object({ version: z.int(), saved_at: at });

export type NewSite = z.input<typeof newSite>;
export type SiteChange = z.input<typeof siteChange>;
export type SiteRow = z.infer<typeof siteRow>;
export type SitesAnswer = z.infer<typeof sitesAnswer>;
export type SiteAnswer = z.infer<typeof siteAnswer>;
export type GroundAnswer = z.infer<typeof groundAnswer>;
export type GroundSave = z.infer<typeof groundSave>;
export type SavedAnswer = z.infer<typeof savedAnswer>;
