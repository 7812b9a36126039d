import { describe, expect, it } from 'vitest';
import { parseNumber } from '@/components/conditions/parse-number';
import { readPolar } from '@/components/pieces/read-polar';

describe('typed numbers', () => {
  it.each([
    ['330', 330],
    [' 330° ', 330],
    ['8 mph', 8],
    ['3,5', 3.5],
    ['.5', 0.5],
    ['−4', -4],
    ['', null],
    ['  ', null],
  ])('%j is %j', (text, value) => {
    expect(parseNumber(text, -10, 360)).toEqual({ value });
  });

  it.each(['3 3', 'north', '1e3', '1.2.3', '--4'])('%j is no number', (text) => {
    expect(parseNumber(text, 0, 360)).toHaveProperty('fault');
  });

  it('says the range', () => {
    expect(parseNumber('400', 0, 360)).toEqual({ fault: 'Enter 0 to 360' });
    expect(parseNumber('-1', 0, Infinity)).toEqual({ fault: 'Enter 0 or more' });
  });
});

describe('bearing and distance', () => {
  it('needs both, and says of each what is wrong', () => {
    expect(readPolar({ from: '', bearing: '90', feet: '12.5' })).toEqual({
      ok: true,
      polar: { bearingDeg: 90, feet: 12.5 },
    });
    expect(readPolar({ from: '', bearing: '', feet: 'far' })).toEqual({
      ok: false,
      faults: { bearing: 'Enter the bearing', feet: 'Enter a number, or leave it empty' },
    });
  });
});
