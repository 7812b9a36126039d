import { describe, expect, test } from 'vitest';
import { degreeWords, gridStep, linesBetween } from '@/components/map-paper/graticule-lines';
import { nameSides } from '@/components/sites/name-sides';

describe('lines of the paper', () => {
  test.each([
    [0.03, 0.05],
    [0.05, 0.05],
    [0.051, 0.1],
    [1.2, 2],
    [7, 10],
  ])('at least %d° apart is %d°', (least, step) => {
    expect(gridStep(least)).toBeCloseTo(step, 12);
  });

  test('every multiple in view, ends included', () => {
    expect(linesBetween(-1, 1, 0.5)).toEqual([-1, -0.5, 0, 0.5, 1]);
    expect(linesBetween(0.1, 0.4, 0.5)).toEqual([]);
  });

  test('degrees carry their side and as many decimals as the step', () => {
    expect(degreeWords(-100.25, 0.05, 'E', 'W')).toBe('100.25° W');
    expect(degreeWords(42, 0.1, 'N', 'S')).toBe('42.0° N');
    expect(degreeWords(40, 10, 'N', 'S')).toBe('40° N');
    expect(degreeWords(0, 1, 'N', 'S')).toBe('0°');
  });
});

describe('names beside their marks', () => {
  const named = (x: number, y: number) => ({ x, y, width: 120, height: 22 });

  test('far apart they stand on the right', () => {
    expect(nameSides([named(10, 10), named(40, 60), named(400, 10)], 600)).toEqual([
      'right',
      'right',
      'right',
    ]);
  });

  test('a name that would run into another stands on the left', () => {
    expect(nameSides([named(200, 10), named(195, 22)], 600)).toEqual(['right', 'left']);
  });

  test('with no room on the left it stands a line lower, then a line higher', () => {
    expect(nameSides([named(10, 50), named(40, 50), named(50, 52)], 600)).toEqual([
      'right',
      'right-low',
      'right-high',
    ]);
  });

  test('at the map’s right edge it stands on the left', () => {
    expect(nameSides([named(560, 50)], 600)).toEqual(['left']);
  });
});
