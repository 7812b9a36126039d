import type { Allowed, Measured, MeasureUnit } from '@/lib/checks';

/** Decimals that a reading is worth: a tape's tenth of a foot, a whole degree, a minute. */
const DECIMALS: Record<MeasureUnit, number> = {
  ft: 1,
  deg: 0,
  ratio: 2,
  count: 0,
  min: 0,
  ohm: 0,
};
const MOST_DECIMALS = 3;

const SUFFIX: Record<MeasureUnit, string> = {
  ft: ' ft',
  deg: '°',
  ratio: '',
  count: '',
  min: ' min',
  ohm: ' Ω',
};

/**
 * The value in words. Where rounding would carry it over a limit that it does not reach (24.97
 * shown as 25.0 beside "at least 25"), it is written with as many decimals as tell the truth.
 */
export function valueWords(
  { value, unit }: Measured,
  allowed: Allowed | null,
  meets: boolean,
): string {
  let decimals = DECIMALS[unit];
  while (!meets && allowed && decimals < MOST_DECIMALS && looksWithin(value, decimals, allowed)) {
    decimals += 1;
  }
  if (!meets && allowed && looksWithin(value, decimals, allowed)) return barely(value, allowed);
  return plainNumber(value, decimals) + SUFFIX[unit];
}

/** Short of the limit by less than can be written. */
function barely(value: number, { min, max, unit }: Allowed): string {
  if (min !== null && value < min) return `under ${limitNumber(min)}${SUFFIX[unit]}`;
  return max === null
    ? limitNumber(value) + SUFFIX[unit]
    : `over ${limitNumber(max)}${SUFFIX[unit]}`;
}

/** How a count is said beside its line: how many of how many, and nothing where it is as it should be. */
export function countWords(value: number, { min }: Allowed): string {
  return min === null ? plainNumber(value, 0) : `${plainNumber(value, 0)} of ${limitNumber(min)}`;
}

const looksWithin = (value: number, decimals: number, { min, max }: Allowed): boolean => {
  const shown = Number(value.toFixed(decimals));
  const within = (v: number): boolean => (min === null || v >= min) && (max === null || v <= max);
  return within(shown) && !within(value);
};

/** A limit as it was set: no trailing zeros. */
export const limitNumber = (value: number): string => plainNumber(Number(value.toFixed(2)), null);

/** "3 to 6 ft", "at least 10 ft", "at most 90°". */
export function allowedWords({ min, max, unit }: Allowed): string | null {
  const suffix = SUFFIX[unit];
  if (min !== null && max !== null) {
    return min === max
      ? `${limitNumber(min)}${suffix}`
      : `${limitNumber(min)} to ${limitNumber(max)}${suffix}`;
  }
  if (min !== null) return `at least ${limitNumber(min)}${suffix}`;
  if (max !== null) return `at most ${limitNumber(max)}${suffix}`;
  return null;
}

function plainNumber(value: number, decimals: number | null): string {
  const written = value.toLocaleString('en-US', {
    minimumFractionDigits: decimals ?? 0,
    maximumFractionDigits: decimals ?? MOST_DECIMALS,
  });
  // A true minus, and never "−0.0".
  return /^-0(\.0*)?$/.test(written) ? written.slice(1) : written.replace('-', '−');
}

/** What the values of several findings come to: "6.2 ft least", "84° most", "3.2 to 5.6 ft". */
export function rangeWords(
  several: readonly { measured: Measured | null; allowed: Allowed | null }[],
): string | null {
  const read = several.filter((one) => one.measured !== null && one.measured.unit !== 'count');
  const first = read[0];
  if (!first?.measured || read.some((one) => one.measured?.unit !== first.measured?.unit)) {
    return null;
  }
  const { unit } = first.measured;
  const values = read.map((one) => one.measured!.value);
  const shown = (value: number): string => plainNumber(value, DECIMALS[unit]);
  const [least, most] = [shown(Math.min(...values)), shown(Math.max(...values))];
  if (least === most) return least + SUFFIX[unit];
  const [hasMin, hasMax] = [first.allowed?.min != null, first.allowed?.max != null];
  if (hasMin && !hasMax) return `${least}${SUFFIX[unit]} least`;
  if (hasMax && !hasMin) return `${most}${SUFFIX[unit]} most`;
  return `${least} to ${most}${SUFFIX[unit]}`;
}
