import { COMMON_PRACTICE, OUR_DEFAULT, type Backing } from './marks';

export type LimitUnit = 'ft' | 'deg' | 'mph' | 'pct' | 'min' | 'ratio';

export type LimitEntry = Backing & {
  readonly value: number;
  readonly unit: LimitUnit;
  readonly title: string;
};

const commonPractice = (title: string, value: number, unit: LimitUnit): LimitEntry => ({
  ...COMMON_PRACTICE,
  title,
  value,
  unit,
});
const ours = (title: string, value: number, unit: LimitUnit): LimitEntry => ({
  ...OUR_DEFAULT,
  title,
  value,
  unit,
});

/** Every limit that an agency may set, with the value it has until the agency does. */
export const LIMIT_TABLE = {
  systems_apart_min_ft: commonPractice('Ground systems apart, at least', 10, 'ft'),
  rods_apart_min_ft: commonPractice('Joined rods apart, at least', 3, 'ft'),
  rods_apart_max_ft: commonPractice('Joined rods apart, at most', 6, 'ft'),
  zone_setback_ft: ours('Beyond the hot zone, at least', 5, 'ft'),
  upwind_max_deg: ours('Off the wind, swing included, at most', 90, 'deg'),
  swing_floor_deg: ours('Wind swing assumed, at least', 20, 'deg'),
  calm_below_mph: ours('Calm below', 3, 'mph'),
  uphill_max_deg: ours('Off uphill, at most', 90, 'deg'),
  level_below_pct: ours('Level below', 1, 'pct'),
  wedge_min_deg: ours('Ground both upwind and uphill, at least', 60, 'deg'),
  wind_fresh_min: ours('Wind reading no older than', 30, 'min'),
  ignition_clear_ft: {
    mark: 'our-default',
    source:
      'Default of this product, by analogy with 29 CFR 1926.152(e)(1) (from memory); the agency sets its own',
    title: 'Ignition source to release, at least',
    value: 25,
    unit: 'ft',
  },
  vent_clear_ft: {
    mark: 'from-memory',
    source: 'NFPA 30 and NEC article 515, classified space around a vent (from memory)',
    title: 'Ignition source to vent, at least',
    value: 15,
    unit: 'ft',
  },
  z_min_ft: commonPractice('Z probe from the system, at least', 50, 'ft'),
  z_max_ft: commonPractice('Z probe from the system, at most', 80, 'ft'),
  z_spread_max_ft: ours('Z farther from one system than from another, at most', 10, 'ft'),
  y_min_ft: commonPractice('Y probe from the system, at least', 30, 'ft'),
  y_max_ft: commonPractice('Y probe from the system, at most', 45, 'ft'),
  y_offset_max_ft: ours('Y probe off the test line, at most', 2, 'ft'),
  y_angle_max_deg: ours('Y probe off the test line, at most', 15, 'deg'),
  y_ratio_min: ours('Y distance over Z distance, at least', 0.52, 'ratio'),
  y_ratio_max: ours('Y distance over Z distance, at most', 0.72, 'ratio'),
  y_ratio_low: ours('Y over Z tolerated with caution, at least', 0.45, 'ratio'),
  y_ratio_high: ours('Y over Z tolerated with caution, at most', 0.75, 'ratio'),
  z_extent_min_ratio: {
    mark: 'from-memory',
    source: 'IEEE Std 81, current probe at five times the extent of the ground (from memory)',
    title: 'Z distance over the extent of the system, at least',
    value: 5,
    unit: 'ratio',
  },
  metal_near_ft: ours('Metal is near the test line within', 10, 'ft'),
  metal_angle_deg: ours('Metal runs with the test line within', 30, 'deg'),
  metal_run_ft: ours('Metal along the test line, at most', 10, 'ft'),
  buried_tolerance_ft: {
    mark: 'published',
    source: 'Common Ground Alliance best practice 5.19 (18 in each side); states ask 18 to 30 in',
    title: 'Tolerance zone each side of a buried line',
    value: 1.5,
    unit: 'ft',
  },
  doubt_a_ft: ours('Doubt of a buried line at quality level A (ASCE 38)', 0.1, 'ft'),
  doubt_b_ft: ours('Doubt of a buried line at quality level B (ASCE 38)', 1, 'ft'),
  doubt_c_ft: ours('Doubt of a buried line at quality level C (ASCE 38)', 3, 'ft'),
  doubt_d_ft: ours('Doubt of a buried line at quality level D (ASCE 38)', 10, 'ft'),
  cable_slack_pct: ours('Slack added to a drawn run', 10, 'pct'),
  cable_climb_ft: ours('Climb added for each end on a vehicle', 8, 'ft'),
  reading_band_pct: ours('A reading stands within', 5, 'pct'),
} as const satisfies Record<string, LimitEntry>;

export type LimitKey = keyof typeof LIMIT_TABLE;
export type LimitValues = Readonly<Record<LimitKey, number>>;

export const LIMIT_KEYS = Object.keys(LIMIT_TABLE) as LimitKey[];

export const DEFAULT_LIMIT_VALUES: LimitValues = Object.fromEntries(
  LIMIT_KEYS.map((key) => [key, LIMIT_TABLE[key].value]),
) as Record<LimitKey, number>;
