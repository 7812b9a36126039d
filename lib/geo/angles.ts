/** Directions are degrees clockwise from true north, 0 ≤ b < 360. */

const DEGREES_PER_RADIAN = 180 / Math.PI;

export const toRadians = (degrees: number): number => degrees / DEGREES_PER_RADIAN;
export const toDegrees = (radians: number): number => radians * DEGREES_PER_RADIAN;

export function normaliseDegrees(degrees: number): number {
  const turned = degrees % 360;
  const positive = turned < 0 ? turned + 360 : turned;
  return positive === 360 ? 0 : positive; // a tiny negative turn rounds up to 360
}

/** The angle between two directions, 0 … 180. */
export function angleBetween(a: number, b: number): number {
  const turn = normaliseDegrees(a - b);
  return turn > 180 ? 360 - turn : turn;
}

/** The signed turn that takes `from` to `to`, −180 < t ≤ 180, clockwise positive. */
export function turnBetween(from: number, to: number): number {
  const turn = normaliseDegrees(to - from);
  return turn > 180 ? turn - 360 : turn;
}

const EIGHT_WINDS = [
  'north',
  'north-east',
  'east',
  'south-east',
  'south',
  'south-west',
  'west',
  'north-west',
] as const;

/** The nearest of the eight winds, for sentences ("1.4 ft south-east"). */
export function compassWord(degrees: number): (typeof EIGHT_WINDS)[number] {
  return EIGHT_WINDS[Math.round(normaliseDegrees(degrees) / 45) % 8] ?? 'north';
}

/** Three digits as the trade says them: 007°, 330°. */
export const threeDigits = (degrees: number): string =>
  String(Math.round(normaliseDegrees(degrees)) % 360).padStart(3, '0');
