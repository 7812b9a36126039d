import { COMMON_PRACTICE, OUR_DEFAULT, type Backing } from './marks';

/** Numbers that no agency sets: the drawing's own resolution, or a regulation's table. */

/**
 * Spacing limits are met within this much, the drawing's resolution, so that 10.00 drawn is 10.
 * It never relaxes a safety limit (buried tolerance and doubt, overhead, ignition, vent, zone).
 */
export const DRAWN_WITHIN_FT = { ...OUR_DEFAULT, value: 0.05 } as const satisfies Backing & {
  value: number;
};

/** Part of the way from the system to Z where the reading is true in even soil: (√5 − 1) / 2. */
export const TRUE_POINT_RATIO = {
  mark: 'published',
  source: 'IEEE Std 81; MIL-HDBK-419A (61.8 % rule)',
  value: 0.618,
} as const satisfies Backing & { value: number };

/** The wedge between wind and slope ends at a right angle to the wind, whatever limit is set. */
export const CROSSWIND_DEG = 90;

/** Diameter taken for a buried line whose own is not known, inches. */
export const UNKNOWN_DIAMETER_IN = { ...OUR_DEFAULT, value: 12 } as const;

/** Lines farther than this from a rod or probe are only reported when none is nearer, feet. */
export const BURIED_REPORT_WITHIN_FT = { ...OUR_DEFAULT, value: 30 } as const;

/** Least clearance from an overhead line by its voltage: up to and with `upToVolts`. */
export const OVERHEAD_CLEARANCE = {
  mark: 'published',
  source: '29 CFR 1926.1408 Table A, used here by analogy',
  rows: [
    { upToVolts: 50_000, feet: 10 },
    { upToVolts: 200_000, feet: 15 },
    { upToVolts: 350_000, feet: 20 },
    { upToVolts: 500_000, feet: 25 },
    { upToVolts: 750_000, feet: 35 },
    { upToVolts: 1_000_000, feet: 45 },
  ],
  /** Drawn round a line whose voltage nobody has said. */
  unknownDrawnFeet: 20,
} as const;

/** Feet to keep from a line of `volts`; null above the table, where only its owner can say. */
export function overheadClearanceFeet(volts: number): number | null {
  return OVERHEAD_CLEARANCE.rows.find((row) => volts <= row.upToVolts)?.feet ?? null;
}

/** What a piece measures when the file or the planner does not say. */
export const PIECE_DEFAULTS = {
  rod: { ...COMMON_PRACTICE, length_ft: 8, diameter_in: 0.625 },
  vehicle: { ...OUR_DEFAULT, length_ft: 65, width_ft: 8.5 },
  pump: { ...OUR_DEFAULT, length_ft: 6, width_ft: 4 },
} as const;

/** Radius of an area put down with one press, before anyone shapes it. */
export const AREA_DRAWN_RADIUS_FT = {
  ...OUR_DEFAULT,
  'hot-zone': 50,
  'warm-zone': 100,
  pool: 8,
  'no-drive': 15,
  'low-ground': 15,
} as const;
