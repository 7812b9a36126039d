import { LIMIT_KEYS, type LimitKey, type LimitUnit } from '@/lib/limits';

const UNIT_WORDS: Record<LimitUnit, string> = {
  ft: 'ft',
  deg: '°',
  mph: 'mph',
  pct: '%',
  min: 'min',
  ratio: '',
};

/** "6 ft", "90°", "0.52". */
export function limitWords(value: number, unit: LimitUnit): string {
  return unit === 'deg' ? `${value}°` : `${value} ${UNIT_WORDS[unit]}`.trimEnd();
}

const GROUPS: readonly { title: string; starts: readonly string[] }[] = [
  { title: 'Spacing of systems and rods', starts: ['systems_', 'rods_'] },
  {
    title: 'Hot zone, wind and slope',
    starts: ['zone_', 'upwind_', 'swing_', 'calm_', 'uphill_', 'level_', 'wedge_', 'wind_'],
  },
  { title: 'Ignition sources and vents', starts: ['ignition_', 'vent_'] },
  { title: 'Test line', starts: ['z_', 'y_', 'metal_'] },
  { title: 'Buried lines', starts: ['buried_', 'doubt_'] },
];

/** Every limit once, grouped for reading; what no group claims stands last, never left out. */
export function limitGroups(): { title: string; keys: LimitKey[] }[] {
  const claimed = GROUPS.map(({ title, starts }) => ({
    title,
    keys: LIMIT_KEYS.filter((key) => starts.some((start) => key.startsWith(start))),
  }));
  const taken = new Set(claimed.flatMap((group) => group.keys));
  return [
    ...claimed,
    { title: 'Cables and readings', keys: LIMIT_KEYS.filter((key) => !taken.has(key)) },
  ];
}
