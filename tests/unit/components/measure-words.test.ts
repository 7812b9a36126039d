import { describe, expect, it } from 'vitest';
import { allowedWords, rangeWords, valueWords } from '@/components/checks/measure-words';

const ft = (value: number) => ({ value, unit: 'ft' }) as const;

describe('words for values', () => {
  it.each([
    [{ value: 7.4, unit: 'ft' } as const, '7.4 ft'],
    [{ value: 34, unit: 'deg' } as const, '34°'],
    [{ value: 0.618, unit: 'ratio' } as const, '0.62'],
    [{ value: 2, unit: 'count' } as const, '2'],
    [{ value: 9.4, unit: 'min' } as const, '9 min'],
    [{ value: 25, unit: 'ohm' } as const, '25 Ω'],
    [{ value: -4.31, unit: 'ft' } as const, '−4.3 ft'],
    [{ value: -0.01, unit: 'ft' } as const, '0.0 ft'],
    [{ value: 1234.56, unit: 'ft' } as const, '1,234.6 ft'],
  ])('%o reads %s', (measured, words) => {
    expect(valueWords(measured, null, true)).toBe(words);
  });

  it('never rounds a value over the limit that it fails', () => {
    const least = { min: 25, max: null, unit: 'ft' } as const;
    expect(valueWords(ft(24.97), least, false)).toBe('24.97 ft');
    expect(valueWords(ft(24.2), least, false)).toBe('24.2 ft');
    expect(valueWords(ft(24.9999), least, false)).toBe('under 25 ft');
    const most = { min: null, max: 90, unit: 'deg' } as const;
    expect(valueWords({ value: 90.2, unit: 'deg' }, most, false)).toBe('90.2°');
  });

  it('says what is allowed', () => {
    expect(allowedWords({ min: 3, max: 6, unit: 'ft' })).toBe('3 to 6 ft');
    expect(allowedWords({ min: 10, max: null, unit: 'ft' })).toBe('at least 10 ft');
    expect(allowedWords({ min: null, max: 90, unit: 'deg' })).toBe('at most 90°');
    expect(allowedWords({ min: 0, max: 0, unit: 'count' })).toBe('0');
    expect(allowedWords({ min: null, max: null, unit: 'ft' })).toBeNull();
  });

  it('says what several come to by the end that matters', () => {
    const several = (min: number | null, max: number | null) =>
      [6.2, 14, 9.9].map((value) => ({
        measured: ft(value),
        allowed: { min, max, unit: 'ft' } as const,
      }));
    expect(rangeWords(several(5, null))).toBe('6.2 ft least');
    expect(rangeWords(several(null, 20))).toBe('14.0 ft most');
    expect(rangeWords(several(3, 20))).toBe('6.2 to 14.0 ft');
    expect(rangeWords([{ measured: null, allowed: null }])).toBeNull();
  });
});
