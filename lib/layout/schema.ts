import * as z from 'zod/mini';
import { layoutPiece, siteFeature, UTILITIES } from './pieces';
import { above, between, direction, instant, lonLat, words } from './values';

/** The version of the stored document. Raising it takes a step in upgrade.ts. */
export const LAYOUT_VERSION = 1;

/** Layout pieces in one layout at most; more is not a layout but a mistake. */
export const MOST_PIECES = 2000;

/** Members are loose: what a later version or another program added survives a round trip. */
export const wind = z.looseObject({
  from_deg: z.nullish(direction('from_deg')),
  speed_mph: z.nullish(between('speed_mph', 0, 300)),
  swing_deg: z.nullish(between('swing_deg', 0, 180)),
  observed_at: z.nullish(instant),
});

export const slope = z.looseObject({
  down_deg: z.nullish(direction('down_deg')),
  grade_pct: z.nullish(between('grade_pct', 0, 1000)),
});

export const soil = z.looseObject({
  resistivity_ohm_m: z.nullish(above('resistivity_ohm_m', 0, 1e7)),
  low_ohm_m: z.nullish(above('low_ohm_m', 0, 1e7)),
  high_ohm_m: z.nullish(above('high_ohm_m', 0, 1e7)),
  source: z.nullish(words('source')),
});

export const conditions = z.looseObject({
  wind: z.nullish(wind),
  slope: z.nullish(slope),
  soil: z.nullish(soil),
});

export const liquid = z.looseObject({
  name: z.nullish(words('name')),
  un: z.nullish(words('un', 20)),
  flash_point_c: z.nullish(between('flash_point_c', -273.15, 2000)),
  boiling_point_c: z.nullish(between('boiling_point_c', -273.15, 5000)),
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
  length_ft: z.nullish(above('length_ft', 0, 10_000)),
  diameter_in: z.nullish(above('diameter_in', 0, 240)),
  count: z
    .int({ error: 'count must be a whole number' })
    .check(
      z.gte(0, { error: 'count must be 0 or more' }),
      z.lte(100_000, { error: 'count must be 100000 or less' }),
    ),
});

export const kit = z.looseObject({
  name: z.nullish(words('name')),
  items: z.array(kitItem, { error: 'a kit needs its list of items' }),
});

export const PUMP_PLACES = ['separate', 'on-receiving-vehicle', 'none'] as const;

export const layoutSchema = z.object({
  version: z.literal(LAYOUT_VERSION),
  name: z.nullable(words('name', 200)),
  /** Where the local plane touches the ground; coordinates on the sheet are counted from here. */
  origin: lonLat,
  planned_at: z.nullable(instant),
  pump: z.nullable(z.enum(PUMP_PLACES)),
  conditions,
  liquid: z.nullable(liquid),
  kit: z.nullable(kit),
  pieces: z
    .array(layoutPiece)
    .check(z.maxLength(MOST_PIECES, { error: `a layout holds at most ${MOST_PIECES} pieces` })),
  more: z.optional(z.record(z.string(), z.unknown())),
});

/** The six utility classes, and lines that no locate service answers for. */
export const ANSWER_CLASSES = [...UTILITIES, 'private'] as const;
export type AnswerClass = (typeof ANSWER_CLASSES)[number];

export const ownersAnswer = z.looseObject({
  answer: z.enum(['marked', 'clear', 'waiting'], {
    error: 'an answer is marked, clear or waiting',
  }),
  at: z.nullish(instant),
});

export const locate = z.looseObject({
  ticket: words('ticket', 100).check(z.minLength(1, { error: 'a ticket needs its number' })),
  lawful_start: z.nullish(instant),
  valid_until: z.nullish(instant),
  emergency: z.nullish(z.boolean({ error: 'emergency must be true or false' })),
});

export const answers = z.partialRecord(z.enum(ANSWER_CLASSES), z.nullable(ownersAnswer));

export const siteGroundSchema = z.object({
  features: z.array(siteFeature),
  answers,
  overhead_none_known_as_of: z.nullable(instant),
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
