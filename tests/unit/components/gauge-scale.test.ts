import { describe, expect, it } from 'vitest';
import { gaugeScale } from '@/components/checks/gauge-scale';
import { finding } from './finding';

const ft = (value: number) => ({ value, unit: 'ft' }) as const;
const band = (min: number | null, max: number | null) => ({ min, max, unit: 'ft' }) as const;

describe('gauge scale', () => {
  it('shows a value outside the band to be outside it, with room to spare', () => {
    const scale = gaugeScale(finding({ measured: ft(7.4), allowed: band(3, 6) }))!;
    expect(scale.from).toBe(0);
    expect(scale.mark).toBeGreaterThan(scale.bandEnd);
    expect(scale.mark).toBeLessThan(1);
    expect(scale.ends.map((end) => end.value)).toEqual([3, 6]);
  });

  it('runs the band to the right end where there is no most', () => {
    const scale = gaugeScale(finding({ measured: ft(14), allowed: band(10, null) }))!;
    expect(scale.bandEnd).toBe(1);
    expect(scale.bandStart).toBeGreaterThan(0);
    expect(scale.ends).toHaveLength(1);
  });

  it('reaches below nothing for a piece inside a zone', () => {
    const scale = gaugeScale(finding({ measured: ft(-4.3), allowed: band(0, null) }))!;
    expect(scale.from).toBeLessThan(-4.3);
    expect(scale.mark).toBeGreaterThan(0);
    expect(scale.mark).toBeLessThan(scale.bandStart);
  });

  it('keeps angles on a half turn, so that the line stands still', () => {
    const measured = { value: 178, unit: 'deg' } as const;
    const allowed = { min: null, max: 90, unit: 'deg' } as const;
    const scale = gaugeScale(finding({ measured, allowed }))!;
    expect([scale.from, scale.to, scale.bandStart, scale.bandEnd]).toEqual([0, 180, 0, 0.5]);
  });

  it('turns crowded numbers away from each other', () => {
    const measured = { value: 0.62, unit: 'ratio' } as const;
    const allowed = { min: 0.6, max: 0.65, unit: 'ratio' } as const;
    const scale = gaugeScale(finding({ measured, allowed }))!;
    expect(scale.ends.map((end) => end.anchor)).toEqual(['end', 'start']);
  });

  it('draws nothing for counts, for nothing measured and for no band', () => {
    const count = { value: 1, unit: 'count' } as const;
    expect(
      gaugeScale(finding({ measured: count, allowed: { min: 1, max: null, unit: 'count' } })),
    ).toBeNull();
    expect(gaugeScale(finding({ measured: null, allowed: band(3, 6) }))).toBeNull();
    expect(gaugeScale(finding({ measured: ft(3), allowed: band(null, null) }))).toBeNull();
    expect(gaugeScale(finding({ measured: ft(Infinity), allowed: band(3, 6) }))).toBeNull();
  });
});
