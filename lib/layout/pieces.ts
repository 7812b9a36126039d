import * as z from 'zod/mini';
import { above, direction, lonLat, path, rings, between, system, words } from './values';

/**
 * Everything that can be drawn, one schema a kind. A piece holds its place under the name that
 * tells its shape: `at` a point, `path` a line, `paths` one line or several, `rings` an area.
 * What was not entered is absent; defaults are applied where they are used (queries.ts).
 */

/** Members of a file that this version doesn't know; they leave as they came. */
const more = z.optional(
  z.object({
    properties: z.optional(z.record(z.string(), z.unknown())),
    feature: z.optional(z.record(z.string(), z.unknown())),
  }),
);

const id = z
  .string({ error: 'every feature needs a text id' })
  .check(
    z.minLength(1, { error: 'the id is empty' }),
    z.maxLength(200, { error: 'the id is longer than 200 characters' }),
  );
const reference = (what: string) =>
  z
    .string({ error: `${what} must name the id of a piece` })
    .check(z.minLength(1, { error: `${what} is empty` }));

const piece = <K extends string, S extends z.core.$ZodShape>(kind: K, shape: S) =>
  z.object({ id, kind: z.literal(kind), label: z.optional(words('label', 60)), more, ...shape });

const unitShape = {
  at: lonLat,
  heading_deg: z.optional(direction('heading_deg')),
  length_ft: z.optional(above('length_ft', 0, 300)),
  width_ft: z.optional(above('width_ft', 0, 60)),
};

const serves = z.optional(z.array(system, { error: 'serves must list systems' }));
const diameter = z.optional(above('diameter_in', 0, 240));

export const casualtyVehicle = piece('casualty-vehicle', unitShape);
export const receivingVehicle = piece('receiving-vehicle', unitShape);
export const pump = piece('pump', unitShape);
export const releasePoint = piece('release-point', { at: lonLat });
export const vent = piece('vent', { at: lonLat, of: z.optional(reference('of')) });
export const pool = piece('pool', { rings });
export const rod = piece('rod', {
  at: lonLat,
  system,
  length_ft: z.optional(above('length_ft', 0, 200)),
  driven_ft: z.optional(between('driven_ft', 0, 200)),
  diameter_in: z.optional(above('diameter_in', 0, 12)),
});
export const jumper = piece('jumper', {
  path: path.check(
    z.refine((p) => p.length <= 2, { error: 'a jumper is a line of two positions' }),
  ),
  from: reference('from'),
  to: reference('to'),
});
const run = { path, from: reference('from'), to: reference('to') };
export const groundCable = piece('ground-cable', run);
export const bondCable = piece('bond-cable', run);
export const hose = piece('hose', { ...run, diameter_in: diameter });
export const zProbe = piece('z-probe', { at: lonLat, serves });
export const yProbe = piece('y-probe', { at: lonLat, serves });
export const tester = piece('tester', { at: lonLat });
export const testLead = piece('test-lead', run);
export const hotZone = piece('hot-zone', { rings });
export const warmZone = piece('warm-zone', { rings });
export const note = piece('note', { at: lonLat, text: z.optional(words('text', 2000)) });

export const UTILITIES = [
  'electric',
  'gas-oil-steam',
  'communications',
  'potable-water',
  'reclaimed-water',
  'sewer',
] as const;
export type Utility = (typeof UTILITIES)[number];

export const noDrive = piece('no-drive', { rings, surface: z.optional(words('surface')) });
export const lowGround = piece('low-ground', { rings, surface: z.optional(words('surface')) });
export const buriedLine = piece('buried-line', {
  paths: z.array(path).check(z.minLength(1, { error: 'a buried line needs at least one line' })),
  utility: z.enum(UTILITIES, { error: `utility must be one of ${UTILITIES.join(', ')}` }),
  diameter_in: diameter,
  depth_ft: z.optional(between('depth_ft', 0, 500)),
  quality: z.optional(z.enum(['A', 'B', 'C', 'D'], { error: 'quality is A, B, C or D' })),
  material: z.optional(
    z.enum(['metal', 'nonmetal', 'unknown'], { error: 'material is metal, nonmetal or unknown' }),
  ),
  private: z.optional(z.boolean({ error: 'private must be true or false' })),
  owner: z.optional(words('owner')),
});
export const metalLine = piece('metal-line', {
  path,
  what: z.optional(
    z.enum(['rail', 'guardrail', 'fence', 'culvert'], {
      error: 'what is rail, guardrail, fence or culvert',
    }),
  ),
});
export const overheadLine = piece('overhead-line', {
  path,
  volts: z.optional(between('volts', 0, 2_000_000)),
});
export const fixedPoint = piece('fixed-point', { at: lonLat, name: z.optional(words('name')) });

/** What a layout holds: drawn for one arrangement, gone with it. */
export const layoutPiece = z.discriminatedUnion('kind', [
  casualtyVehicle,
  receivingVehicle,
  pump,
  releasePoint,
  vent,
  pool,
  rod,
  jumper,
  groundCable,
  bondCable,
  hose,
  zProbe,
  yProbe,
  tester,
  testLead,
  hotZone,
  warmZone,
  note,
]);

/** What the site holds: it outlives every layout drawn there. */
export const siteFeature = z.discriminatedUnion('kind', [
  noDrive,
  lowGround,
  buriedLine,
  metalLine,
  overheadLine,
  fixedPoint,
]);

export type LayoutPiece = z.output<typeof layoutPiece>;
export type SiteFeature = z.output<typeof siteFeature>;
export type Piece = LayoutPiece | SiteFeature;
export type Kind = Piece['kind'];
export type PieceOf<K extends Kind> = Extract<Piece, { kind: K }>;

export type Unit = PieceOf<'casualty-vehicle' | 'receiving-vehicle' | 'pump'>;
export type Rod = PieceOf<'rod'>;
export type Probe = PieceOf<'z-probe' | 'y-probe'>;
/** Everything that runs from one piece to another. */
export type Run = PieceOf<'jumper' | 'ground-cable' | 'bond-cable' | 'hose' | 'test-lead'>;
export type BuriedLine = PieceOf<'buried-line'>;

const kindOf = (schema: { shape: { kind: z.ZodMiniLiteral<Kind> } }): Kind =>
  schema.shape.kind.def.values[0]!;

const schemasByKind = new Map(
  [...layoutPiece.def.options, ...siteFeature.def.options].map((option) => [
    kindOf(option),
    option,
  ]),
);

export const LAYOUT_KINDS: readonly Kind[] = layoutPiece.def.options.map(kindOf);
export const SITE_KINDS: readonly Kind[] = siteFeature.def.options.map(kindOf);
export const isKind = (kind: string): kind is Kind => schemasByKind.has(kind as Kind);
export const pieceSchema = (kind: Kind) => schemasByKind.get(kind)!;
export const isSiteKind = (kind: Kind): boolean => SITE_KINDS.includes(kind);

/** Which member holds the piece's place, by its kind. */
export type PlaceKey = 'at' | 'path' | 'paths' | 'rings';
export function placeKey(kind: Kind): PlaceKey {
  const { shape } = pieceSchema(kind);
  if ('at' in shape) return 'at';
  if ('path' in shape) return 'path';
  return 'paths' in shape ? 'paths' : 'rings';
}
