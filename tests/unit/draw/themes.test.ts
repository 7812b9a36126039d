import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { THEMES, type Theme, type ThemeName, type Token } from '@/lib/draw';

/** WCAG 2.2, relative luminance and contrast ratio. */
function contrast(a: string, b: string): number {
  const [dark, light] = [luminance(a), luminance(b)].sort((x, y) => x - y) as [number, number];
  return (light + 0.05) / (dark + 0.05);
}
function luminance(hex: string): number {
  const [r, g, b] = [1, 3, 5].map((i) => {
    const c = parseInt(hex.slice(i, i + 2), 16) / 255;
    return c <= 0.03928 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
  }) as [number, number, number];
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

const LETTERED: readonly Token[] = [
  'ink',
  'ink-soft',
  'alarm',
  'caution',
  'spruce',
  'steel',
  'electric-word',
  'gas-word',
  'communications-word',
  'potable-word',
  'reclaimed-word',
  'sewer-word',
];
/** Told by their casing where their own colour is too light for the paper. */
const CASED: readonly Token[] = [
  'electric',
  'gas',
  'communications',
  'potable',
  'reclaimed',
  'sewer',
];

describe.each(Object.entries(THEMES) as [ThemeName, Theme][])('%s', (name, theme) => {
  test('words of the plan stand out at 4.5:1', () => {
    for (const token of LETTERED) {
      expect([token, contrast(theme[token], theme.paper) >= 4.5]).toEqual([token, true]);
    }
  });

  test('what warns stands out at 7:1', () => {
    expect(contrast(theme.alarm, theme.paper)).toBeGreaterThanOrEqual(7);
    expect(contrast(theme.ink, theme.paper)).toBeGreaterThanOrEqual(7);
    expect(contrast(theme['on-alarm'], theme.alarm)).toBeGreaterThanOrEqual(7);
  });

  test('strokes stand out at 3:1', () => {
    for (const token of Object.keys(theme) as Token[]) {
      if (token === 'paper' || token === 'on-alarm' || token === 'casing') continue;
      const seen = CASED.includes(token)
        ? Math.max(contrast(theme[token], theme.paper), contrast(theme.casing, theme.paper))
        : contrast(theme[token], theme.paper);
      expect([name, token, seen >= 3]).toEqual([name, token, true]);
    }
  });
});

test.each(['paper', 'night'] as const)('%s uses the colours of the screens round it', (name) => {
  const css = readFileSync('app/globals.css', 'utf8');
  const block = css.slice(css.indexOf(`:root[data-theme='${name}'] {`));
  const variable = (token: string) => new RegExp(`--${token}: (#[0-9a-f]{6})`).exec(block)?.[1];
  for (const token of [
    'paper',
    'ink',
    'ink-soft',
    'rule',
    'spruce',
    'alarm',
    'on-alarm',
    'caution',
  ]) {
    expect([token, THEMES[name][token as Token]]).toEqual([token, variable(token)]);
  }
});
