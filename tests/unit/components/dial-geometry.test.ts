import { describe, expect, it } from 'vitest';
import {
  arcPath,
  DIAL,
  directionTo,
  sectorPath,
  spot,
} from '@/components/conditions/dial-geometry';

describe('the dial', () => {
  it('has north up and east right', () => {
    expect(spot(0, 80)).toEqual({ x: 0, y: -80 });
    expect(spot(90, 80)).toEqual({ x: 80, y: 0 });
    expect([directionTo(0, -5), directionTo(5, 0), directionTo(0, 5), directionTo(-5, 0)]).toEqual([
      0, 90, 180, 270,
    ]);
  });

  it('reads back every direction that it draws', () => {
    for (let degrees = 0; degrees < 360; degrees++) {
      const { x, y } = spot(degrees, 60);
      expect(directionTo(x, y)).toBe(degrees);
    }
  });

  it('keeps the wind outside and downhill inside, so that neither lies over the other', () => {
    expect(DIAL.windTip).toBeGreaterThan(DIAL.downhillTip);
    expect(DIAL.rim).toBeGreaterThan(DIAL.windTip);
    expect(DIAL.arc - DIAL.arcWidth / 2).toBeGreaterThanOrEqual(DIAL.rim);
  });

  it('takes the long way round for arcs beyond a half turn, and draws a whole turn as two', () => {
    expect(arcPath(0, 90, 10)).toBe('M0 -10 A10 10 0 0 1 10 0');
    expect(arcPath(0, 270, 10)).toBe('M0 -10 A10 10 0 1 1 -10 0');
    expect(arcPath(0, 360, 10).match(/A/g)).toHaveLength(2);
    expect(sectorPath(-20, 400, 5, 10)).not.toContain('NaN');
  });
});
