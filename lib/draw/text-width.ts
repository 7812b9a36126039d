import type { Weight } from './types';

/**
 * Advances of Source Sans 3 Semibold, thousandths of the size, for U+0020 … U+007E: read from the
 * font that ships with the application, so that labels can be placed where no font is at hand.
 */
const ADVANCES = [
  200, 315, 482, 513, 513, 841, 639, 275, 324, 324, 438, 513, 275, 322, 275, 344, 513, 513, 513,
  513, 513, 513, 513, 513, 513, 513, 275, 275, 513, 513, 513, 444, 875, 558, 597, 576, 625, 538,
  510, 628, 663, 282, 494, 597, 502, 745, 657, 674, 582, 674, 592, 545, 546, 655, 536, 800, 541,
  501, 540, 324, 344, 324, 513, 500, 549, 516, 563, 462, 564, 507, 317, 520, 558, 262, 263, 522,
  271, 843, 560, 549, 564, 564, 373, 431, 361, 556, 495, 748, 481, 495, 443, 324, 255, 324, 513,
];
const OTHER_CHARACTERS: Readonly<Record<string, number>> = {
  '–': 480,
  '°': 348,
  '±': 513,
  '′': 275,
  '″': 482,
  Ω: 672,
  '·': 275,
  '’': 275,
};
const ANY_OTHER = 600;

/** How much wider or narrower the other weights run, from the same font's figures. */
const WEIGHT_FACTOR: Record<Weight, number> = { 400: 0.97, 600: 1, 700: 1.03 };

/** Width in px of `text` set at `size` px. */
export function textWidth(text: string, size: number, weight: Weight): number {
  let thousandths = 0;
  for (const character of text) thousandths += advance(character);
  return (thousandths / 1000) * size * WEIGHT_FACTOR[weight];
}

const advance = (character: string): number =>
  ADVANCES[character.charCodeAt(0) - 32] ?? OTHER_CHARACTERS[character] ?? ANY_OTHER;
