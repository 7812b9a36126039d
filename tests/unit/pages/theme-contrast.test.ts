import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { MARGIN_COLOR, THEMES, type Theme } from '@/components/ui/theme';

const css = readFileSync('app/globals.css', 'utf8');

/** The variables of one block, by the selector in front of it. */
function variables(selector: string): Record<string, string> {
  const block = css.slice(css.indexOf(selector)).match(/\{([^}]*)\}/)?.[1] ?? '';
  return Object.fromEntries(
    [...block.matchAll(/--([\w-]+):\s*(#[0-9a-f]{6});/g)].map(([, name, color]) => [name, color]),
  );
}

const COLORS: Record<Theme, Record<string, string>> = {
  paper: variables(":root[data-theme='paper']"),
  night: variables(":root[data-theme='night']"),
};

/** WCAG 2.2: relative luminance of an sRGB colour. */
function luminance(color: string): number {
  const [r, g, b] = [1, 3, 5].map((at) => {
    const part = parseInt(color.slice(at, at + 2), 16) / 255;
    return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r! + 0.7152 * g! + 0.0722 * b!;
}

function contrast(one: string, other: string): number {
  const [light, dark] = [luminance(one), luminance(other)].sort((a, b) => b - a);
  return (light! + 0.05) / (dark! + 0.05);
}

describe.each(THEMES)('the %s theme', (theme) => {
  const color = (name: string): string => {
    const found = COLORS[theme][name];
    if (!found) throw new Error(`--${name} is missing in ${theme}`);
    return found;
  };

  test.each(['paper', 'margin'])('reads on %s: verdicts 7:1, text 4.5:1, rules 3:1', (ground) => {
    for (const verdict of ['ink', 'spruce', 'alarm', 'caution']) {
      expect(contrast(color(verdict), color(ground)), verdict).toBeGreaterThanOrEqual(7);
    }
    expect(contrast(color('ink-soft'), color(ground))).toBeGreaterThanOrEqual(4.5);
    for (const stroke of ['rule', 'focus']) {
      expect(contrast(color(stroke), color(ground)), stroke).toBeGreaterThanOrEqual(3);
    }
  });

  test.each([
    ['on-spruce', 'spruce'],
    ['on-action', 'action'],
    ['on-alarm', 'alarm'],
  ])('%s reads on %s', (text, ground) => {
    expect(contrast(color(text), color(ground))).toBeGreaterThanOrEqual(7);
  });

  test.each(['alarm-wash', 'caution-wash', 'spruce-wash'])('ink reads on %s', (wash) => {
    expect(contrast(color('ink'), color(wash))).toBeGreaterThanOrEqual(7);
    expect(contrast(color('ink-soft'), color(wash))).toBeGreaterThanOrEqual(4.5);
  });

  test('the browser’s own bars take the margin', () => {
    expect(MARGIN_COLOR[theme]).toBe(color('margin'));
  });
});

test('night by the system is the night that can be chosen', () => {
  expect(variables(':root:not([data-theme])')).toEqual(COLORS.night);
});

test('night has no pure white, and paper no pure black', () => {
  expect(Object.values(COLORS.night)).not.toContain('#ffffff');
  expect(Object.values(COLORS.paper)).not.toContain('#000000');
});
