import { describe, expect, test } from 'vitest';
import { THEMES } from '@/lib/draw';
import { UTILITIES } from '@/lib/layout';

/**
 * Source: American Public Works Association, Uniform Color Code (ANSI Z535.1 safety colours): red
 * electric; yellow gas, oil, steam; orange communications; blue potable water; purple reclaimed
 * water; green sewer and drain. Hues in degrees on the colour wheel.
 */
const APWA = {
  electric: [345, 15],
  gas: [42, 66],
  communications: [18, 41],
  potable: [200, 240],
  reclaimed: [262, 310],
  sewer: [95, 160],
} as const;

test('the code has a colour for each of the six classes', () => {
  expect(UTILITIES).toHaveLength(Object.keys(APWA).length);
});

describe.each(['paper', 'night'] as const)('on %s', (theme) => {
  test.each(Object.entries(APWA))('%s lies in its hue', (token, [from, to]) => {
    const hue = hueOf(THEMES[theme][token as keyof typeof APWA]);
    const turn = (deg: number): number => (deg - from + 360) % 360;
    expect(turn(hue), `hue ${hue}`).toBeLessThanOrEqual(turn(to));
  });
});

function hueOf(hex: string): number {
  const [r, g, b] = [1, 3, 5].map((i) => parseInt(hex.slice(i, i + 2), 16) / 255) as [
    number,
    number,
    number,
  ];
  const most = Math.max(r, g, b);
  const span = most - Math.min(r, g, b);
  const sixth =
    most === r ? ((g - b) / span + 6) % 6 : most === g ? (b - r) / span + 2 : (r - g) / span + 4;
  return sixth * 60;
}
