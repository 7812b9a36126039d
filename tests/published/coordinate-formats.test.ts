import { describe, expect, test } from 'vitest';
import { formatGrid, formatPosition, parseGrid, parsePosition, type LonLat } from '@/lib/geo';

/**
 * Source: FGDC-STD-011-2001, United States National Grid, the standard's own example:
 * 18S UJ 23483 06479 lies at 38.889463, −77.035242; coarser references are truncated, not rounded.
 */
const EXAMPLE: LonLat = [-77.035242, 38.889463];

describe('US National Grid', () => {
  test('the example of the standard, both ways', () => {
    expect(formatGrid(EXAMPLE)).toBe('18S UJ 23483 06479');
    const place = parseGrid('18S UJ 23483 06479')!;
    expect(place[0]).toBeCloseTo(EXAMPLE[0], 5);
    expect(place[1]).toBeCloseTo(EXAMPLE[1], 5);
  });
  test('coarser references are cut, never rounded', () => {
    expect(formatGrid(EXAMPLE, 4)).toBe('18S UJ 2348 0647');
    expect(formatGrid(EXAMPLE, 3)).toBe('18S UJ 234 064');
  });
  test('beyond the grid there is no reference, and degrees are written', () => {
    expect(formatGrid([10, 85])).toBeNull();
    expect(formatPosition([10, 85], 'grid')).toBe('85.000000° N, 10.000000° E');
  });
});

describe('degrees', () => {
  test.each([
    ['decimal', '38.889463° N, 77.035242° W'],
    ['minutes', '38°53.3678′ N, 77°2.1145′ W'],
    ['seconds', '38°53′22.07″ N, 77°2′6.87″ W'],
  ] as const)('written as %s', (format, text) => {
    expect(formatPosition(EXAMPLE, format)).toBe(text);
    const read = parsePosition(text);
    expect(read.ok && Math.abs(read.place[0] - EXAMPLE[0])).toBeLessThan(3e-6);
    expect(read.ok && Math.abs(read.place[1] - EXAMPLE[1])).toBeLessThan(3e-6);
  });
  test('seconds that round to 60 carry', () => {
    expect(formatPosition([-0.9999999, 10.9999999], 'seconds')).toBe('11°0′0.00″ N, 1°0′0.00″ W');
  });
  test.each([
    ['38.889463, -77.035242'],
    ['38.889463 -77.035242'],
    ['N38.889463 W77.035242'],
    ['77.035242W, 38.889463N'],
    ['38 53 22.0668 N 77 2 6.8712 W'],
    ['38°53\'22.0668"N 77°2\'6.8712"W'],
  ])('read: %s', (text) => {
    const read = parsePosition(text);
    expect(read).toMatchObject({ ok: true });
    if (read.ok) {
      expect(read.place[0]).toBeCloseTo(-77.035242, 6);
      expect(read.place[1]).toBeCloseTo(38.889463, 6);
    }
  });
  test.each([
    ['somewhere'],
    ['38.9'],
    ['95, 10'],
    ['10, 190'],
    ['38 61 0 N, 77 2 6 W'],
    ['38.5 30 N, 77 W'],
    ['-38 N, 77 W'],
    ['38 N, 77 N'],
  ])('refused with a reason: %s', (text) => {
    const read = parsePosition(text);
    expect(read.ok).toBe(false);
    expect(!read.ok && read.message.length).toBeGreaterThan(10);
  });
});
