import type { WindArc } from '@/lib/checks';
import {
  compassWord,
  gradeToDegrees,
  normaliseDegrees,
  speedFromMph,
  threeDigits,
  type SpeedUnit,
} from '@/lib/geo';
import type { Slope, Soil, Wind } from '@/lib/layout';
import { clockWords, minutesBetween, spanWords } from './time-words';

type Entered<T> = T | null | undefined;

const number = (value: number, decimals: number): string =>
  value.toLocaleString('en-US', { maximumFractionDigits: decimals });

export const degreesWords = (degrees: number): string => `${threeDigits(degrees)}°`;

/** "Wind from 330°"; null while not entered. */
export const windFromWords = (wind: Entered<Wind>): string | null =>
  wind?.from_deg == null ? null : `Wind from ${degreesWords(wind.from_deg)}`;

export const speedWords = (wind: Entered<Wind>, unit: SpeedUnit): string | null =>
  wind?.speed_mph == null ? null : `${number(speedFromMph(wind.speed_mph, unit), 1)} ${unit}`;

export const swingWords = (wind: Entered<Wind>): string | null =>
  wind?.swing_deg == null ? null : `swings ±${number(wind.swing_deg, 0)}°`;

export type Seen = { readonly words: string; readonly fresh: 'fresh' | 'stale' | 'ahead' };

/** "seen 13:53, 9 min ago". `asOf` is the instant that the checks answer for. */
export function seenWords(
  observedAt: string,
  asOf: string | null,
  freshMinutes: number,
  zone?: string,
): Seen {
  const clock = clockWords(observedAt, asOf, zone);
  if (asOf === null) return { words: `seen ${clock}`, fresh: 'fresh' };
  const age = minutesBetween(observedAt, asOf);
  if (age < 0) return { words: `seen ${clock}, still to come`, fresh: 'ahead' };
  const ago = age < 1 ? 'just now' : `${spanWords(age)} ago`;
  return { words: `seen ${clock}, ${ago}`, fresh: age <= freshMinutes ? 'fresh' : 'stale' };
}

/** Whether the wind comes from within the arc, ends included. */
export function inArc(deg: number, arc: WindArc): boolean {
  if (isWholeTurn(arc)) return true;
  return normaliseDegrees(deg - arc.from_deg) <= arcDegrees(arc);
}

export const isWholeTurn = ({ from_deg, to_deg }: WindArc): boolean =>
  Math.abs(to_deg - from_deg) >= 360;

export const arcDegrees = (arc: WindArc): number =>
  isWholeTurn(arc) ? 360 : normaliseDegrees(arc.to_deg - arc.from_deg);

export type Stands = {
  /** What matters first, where it does not stand: "Does not stand now". */
  readonly alarm: string | null;
  readonly words: string | null;
  readonly tone: 'stands' | 'does-not' | 'not-known';
};

/**
 * What the arc of the dial says. `judged` is whether any piece could be held against the wind:
 * before that, having no arc means nothing.
 */
export function standsWords(
  arc: WindArc | null,
  wind: Entered<Wind>,
  { judged, calmBelowMph }: { judged: boolean; calmBelowMph: number },
): Stands {
  if (!arc) {
    if (!judged) {
      return { alarm: null, words: 'Not known which wind it stands for', tone: 'not-known' };
    }
    const calm = wind?.speed_mph != null && wind.speed_mph < calmBelowMph;
    const alarm = calm ? 'Calm: nowhere is upwind' : 'Stands for no wind';
    return { alarm, words: null, tone: 'does-not' };
  }
  const words = isWholeTurn(arc)
    ? 'Stands for any wind'
    : `Stands for wind ${degreesWords(arc.from_deg)} through ${degreesWords(arc.to_deg)}`;
  if (wind?.from_deg == null) return { alarm: null, words, tone: 'not-known' };
  if (!inArc(wind.from_deg, arc)) {
    return { alarm: 'Does not stand now', words, tone: 'does-not' };
  }
  return { alarm: null, words, tone: 'stands' };
}

export type SteepnessUnit = '%' | '°';

export const steepnessWords = (gradePct: number, unit: SteepnessUnit): string =>
  unit === '%' ? `${number(gradePct, 1)} %` : `${number(gradeToDegrees(gradePct), 1)}°`;

/** "Downhill to 150°, 3 %", with what is missing said; null while nothing is entered. */
export function downhillWords(
  slope: Entered<Slope>,
  unit: SteepnessUnit,
  levelBelowPct: number,
): string | null {
  const steepness = slope?.grade_pct == null ? null : steepnessWords(slope.grade_pct, unit);
  if (slope?.grade_pct != null && slope.grade_pct < levelBelowPct) return `Level, ${steepness}`;
  if (slope?.down_deg == null) return steepness === null ? null : `Slope ${steepness}`;
  const towards = `Downhill to ${degreesWords(slope.down_deg)}`;
  return steepness === null ? towards : `${towards}, ${steepness}`;
}

export const soilWords = (soil: Entered<Soil>): string | null =>
  soil?.resistivity_ohm_m == null ? null : `Soil ${number(soil.resistivity_ohm_m, 1)} Ω·m`;

/** For a reader who does not see the dial: "330 degrees, north-west". */
export const spokenDegrees = (degrees: number): string =>
  `${Math.round(normaliseDegrees(degrees)) % 360} degrees, ${compassWord(degrees)}`;
