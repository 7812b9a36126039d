import * as z from 'zod';
import { layoutPiece, siteFeature, UTILITIES } from './pieces';
import { above, between, direction, instant, lonLat, words } from './values';

/** The version of the stored document. Raising it takes a step in upgrade.ts. */
export const LAYOUT_VERSION = 1;

/** Layout pieces in one layout at most; more is not a layout but a mistake. */
export const MOST_PIECES = 2000;

/** Members are loose: what a later version or another program added survives a round trip. */
export const wind = z.looseObject({
  from_deg: direction('from_deg').nullish(),
  speed_mph: between('speed_mph', 0, 300).nullish(),
  swing_deg: between('swing_deg', 0, 180).nullish(),
  observed_at: instant.nullish(),
});

export const slope = z.looseObject({
  down_deg: direction('down_deg').nullish(),
  grade_pct: between('grade_pct', 0, 1000).nullish(),
});

export const soil = z.looseObject({
  resistivity_ohm_m: above('resistivity_ohm_m', 0, 1e7).nullish(),
  low_ohm_m: above('low_ohm_m', 0, 1e7).nullish(),
  high_ohm_m: above('high_ohm_m', 0, 1e7).nullish(),
  source: words('source').nullish(),
});

export const conditions = z.looseObject({
  wind: wind.nullish(),
  slope: slope.nullish(),
  soil: soil.nullish(),
});

export const liquid = z.looseObject({
  name: words('name').nullish(),
  un: words('un', 20).nullish(),
  flash_point_c: between('flash_point_c', -273.15, 2000).nullish(),
  boiling_point_c: between('boiling_point_c', -273.15, 5000).nullish(),
});

export const KIT_KINDS = [
  'rod',
  'coupler',
  'jumper',
  'ground-cable',
  'bond-cable',
  'clamp',
  'probe',
  'tester',
  'test-lead',
  'hose',
  'driver',
] as const;
export type KitKind = (typeof KIT_KINDS)[number];

export const kitItem = z.looseObject({
  kind: z.enum(KIT_KINDS, { error: `a kit item's kind is one of ${KIT_KINDS.join(', ')}` }),
  length_ft: above('length_ft', 0, 10_000).nullish(),
  diameter_in: above('diameter_in', 0, 240).nullish(),
  count: z
    .int({ error: 'count must be a whole number' })
    .min(0, { error: 'count must be 0 or more' })
    .max(100_000, { error: 'count must be 100000 or less' }),
});

export const kit = z.looseObject({
  name: words('name').nullish(),
  items: z.array(kitItem, { error: 'a kit needs its list of items' }),
});

export const PUMP_PLACES = ['separate', 'on-receiving-vehicle', 'none'] as const;

export const layoutSchema = z.object({
  version: z.literal(LAYOUT_VERSION),
  name: words('name', 200).nullable(),
  /** Where the local plane touches the ground; coordinates on the sheet are counted from here. */
  origin: lonLat,
  planned_at: instant.nullable(),
  pump: z.enum(PUMP_PLACES).nullable(),
  conditions,
  liquid: liquid.nullable(),
  kit: kit.nullable(),
  pieces: z.array(layoutPiece).max(MOST_PIECES, {
    error: `a layout holds at most ${MOST_PIECES} pieces`,
  }),
  more: z.record(z.string(), z.unknown()).optional(),
});

/** The six utility classes, and lines that no locate service answers for. */
export const ANSWER_CLASSES = [...UTILITIES, 'private'] as const;
export type AnswerClass = (typeof ANSWER_CLASSES)[number];

export const ownersAnswer = z.looseObject({
  answer: z.enum(['marked', 'clear', 'waiting'], {
    error: 'an answer is marked, clear or waiting',
  }),
  at: instant.nullish(),
});

export const locate = z.looseObject({
  ticket: words('ticket', 100).min(1, { error: 'a ticket needs its number' }),
  lawful_start: instant.nullish(),
  valid_until: instant.nullish(),
  emergency: z.boolean({ error: 'emergency must be true or false' }).nullish(),
});

export const answers = z.partialRecord(z.enum(ANSWER_CLASSES), ownersAnswer.nullable());

export const siteGroundSchema = z.object({
  features: z.array(siteFeature),
  answers,
  overhead_none_known_as_of: instant.nullable(),
  locates: z.array(locate),
});

export type Layout = z.output<typeof layoutSchema>;
export type Wind = z.output<typeof wind>;
export type Slope = z.output<typeof slope>;
export type Soil = z.output<typeof soil>;
export type Conditions = z.output<typeof conditions>;
export type Liquid = z.output<typeof liquid>;
export type Kit = z.output<typeof kit>;
export type KitItem = z.output<typeof kitItem>;
export type PumpPlace = (typeof PUMP_PLACES)[number];
export type Locate = z.output<typeof locate>;
/** What the site knows of its ground: features, owners' answers, tickets. */
export type SiteGround = z.output<typeof siteGroundSchema>;

/** What lies on the drawing: the layout and the site's ground under it. Edits go Sheet → Sheet. */
export type Sheet = { readonly layout: Layout; readonly site: SiteGround };
