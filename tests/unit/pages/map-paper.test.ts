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
  test('a name that would run into another stands on the left', () => {
    const [apart, low] = [
      { x: 10, y: 10 },
      { x: 40, y: 22 },
    ];
    expect(nameSides([apart, low])).toEqual(['right', 'left']);
    expect(nameSides([low, apart])).toEqual(['left', 'right']);
  });

  test('names far apart stand on the right', () => {
    expect(
      nameSides([
        { x: 10, y: 10 },
        { x: 40, y: 60 },
        { x: 400, y: 10 },
      ]),
    ).toEqual(['right', 'right', 'right']);
  });
});
