/** Conversions between the trade's units and the metre. Every factor is exact by definition. */

/** The international foot (1959). The US survey foot, retired in 2022, is not used anywhere. */
export const METRES_PER_FOOT = 0.3048;
export const METRES_PER_INCH = METRES_PER_FOOT / 12;
export const METRES_PER_MILE = METRES_PER_FOOT * 5280;
const KILOMETRES_PER_MILE = METRES_PER_MILE / 1000;
/** The international knot: 1,852 m an hour. */
const KILOMETRES_PER_NAUTICAL_MILE = 1.852;

export const feetToMetres = (feet: number): number => feet * METRES_PER_FOOT;
export const metresToFeet = (metres: number): number => metres / METRES_PER_FOOT;
export const inchesToMetres = (inches: number): number => inches * METRES_PER_INCH;

export type SpeedUnit = 'mph' | 'kn' | 'm/s' | 'km/h';

const MPH_PER: Record<SpeedUnit, number> = {
  mph: 1,
  kn: KILOMETRES_PER_NAUTICAL_MILE / KILOMETRES_PER_MILE,
  'm/s': 3.6 / KILOMETRES_PER_MILE,
  'km/h': 1 / KILOMETRES_PER_MILE,
};

export const speedToMph = (speed: number, unit: SpeedUnit): number => speed * MPH_PER[unit];
export const speedFromMph = (mph: number, unit: SpeedUnit): number => mph / MPH_PER[unit];

/** Steepness as an angle from a grade in per cent (rise over run). */
export const gradeToDegrees = (gradePct: number): number =>
  (Math.atan(gradePct / 100) * 180) / Math.PI;
export const degreesToGrade = (degrees: number): number =>
  Math.tan((degrees * Math.PI) / 180) * 100;

export const celsiusToFahrenheit = (celsius: number): number => (celsius * 9) / 5 + 32;
export const fahrenheitToCelsius = (fahrenheit: number): number => ((fahrenheit - 32) * 5) / 9;
