import { metresToFeet } from '../geo';
import type { LengthUnit } from './types';

/** A length as it stands on the sheet: "14.0 ft", "4.3 m". */
export function lengthWords(metres: number, units: LengthUnit, decimals = 1): string {
  const value = units === 'ft' ? metresToFeet(metres) : metres;
  return `${value.toFixed(decimals)} ${units}`;
}
