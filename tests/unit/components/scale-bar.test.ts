import { describe, expect, it } from 'vitest';
import { scaleBarLength } from '@/components/title-block/scale-bar-length';

describe('the scale bar', () => {
  it.each([
    [0.3048 / 4, 168, 40, 160],
    [0.3048, 168, 100, 100],
    [0.3048 / 100, 168, 1, 100],
  ])('%f m a px in %d px', (metresPerPx, most, feet, px) => {
    const bar = scaleBarLength(metresPerPx, most)!;
    expect(bar.feet).toBe(feet);
    expect(bar.px).toBeCloseTo(px, 6);
  });

  it('never grows past its place, nor shrinks below a third of it', () => {
    for (let scale = 0.001; scale < 50; scale *= 1.07) {
      const { px } = scaleBarLength(scale, 168)!;
      expect(px).toBeLessThanOrEqual(168.0001);
      expect(px).toBeGreaterThan(168 / 3);
    }
  });

  it('has nothing to say of no scale', () => {
    expect(scaleBarLength(0, 168)).toBeNull();
    expect(scaleBarLength(Number.NaN, 168)).toBeNull();
  });
});
