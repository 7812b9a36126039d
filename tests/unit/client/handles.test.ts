import { describe, expect, test } from 'vitest';
import { handleAt, handlesOf } from '@/lib/client/handles';
import { feetToMetres, localPlane } from '@/lib/geo';
import type { Piece } from '@/lib/layout';
import { ORIGIN } from './drawing-on';

const plane = localPlane(ORIGIN);
const at = (eastFt: number, northFt: number) =>
  plane.toLonLat({ x: feetToMetres(eastFt), y: feetToMetres(northFt) });
const METRES_PER_PX = 0.05;
const unders = (piece: Piece, metresPerPx = METRES_PER_PX) =>
  handlesOf(plane, piece, metresPerPx).map(({ under }) => under);

describe('handles', () => {
  test('a unit is turned from before its front', () => {
    const [turn] = handlesOf(
      plane,
      { id: 'c', kind: 'casualty-vehicle', at: at(0, 0), heading_deg: 90, length_ft: 60 },
      METRES_PER_PX,
    );
    expect(turn?.under).toEqual({ type: 'turn', id: 'c' });
    expect(turn?.at.x).toBeGreaterThan(feetToMetres(30));
    expect(Math.abs(turn?.at.y ?? 1)).toBeLessThan(0.001);
  });

  test('a jumper has only its ends; a cable also its bends, and middles where there is room', () => {
    const ends = [
      { type: 'end', id: 'j', end: 'from' },
      { type: 'end', id: 'j', end: 'to' },
    ];
    const path = [at(0, 0), at(60, 0)];
    expect(unders({ id: 'j', kind: 'jumper', path, from: 'a', to: 'b' })).toEqual(ends);
    const bent = [at(0, 0), at(60, 0), at(60, 60)];
    const cable = unders({ id: 'g', kind: 'ground-cable', path: bent, from: 'a', to: 'b' });
    expect(cable.filter(({ type }) => type === 'vertex')).toEqual([
      { type: 'vertex', id: 'g', part: 0, vertex: 1 },
    ]);
    expect(cable.filter(({ type }) => type === 'middle')).toEqual([
      { type: 'middle', id: 'g', part: 0, vertex: 1 },
      { type: 'middle', id: 'g', part: 0, vertex: 2 },
    ]);
  });

  test('a ring’s closing position is no corner of its own', () => {
    const ring = [at(0, 0), at(60, 0), at(60, 60), at(0, 0)];
    const corners = unders({ id: 'z', kind: 'hot-zone', rings: [ring] }).filter(
      ({ type }) => type === 'vertex',
    );
    expect(corners).toHaveLength(3);
  });

  test('crowded corners are thinned out, and get no middles', () => {
    const ring = Array.from({ length: 49 }, (_, i) => {
      const angle = ((i % 48) / 48) * 2 * Math.PI;
      return at(45 * Math.sin(angle), 45 * Math.cos(angle));
    });
    const far = unders({ id: 'z', kind: 'hot-zone', rings: [ring] }, 0.2);
    expect(far.length).toBeLessThan(20);
    expect(far.every(({ type }) => type === 'vertex')).toBe(true);
    const near = unders({ id: 'z', kind: 'hot-zone', rings: [ring] }, 0.02);
    expect(near.filter(({ type }) => type === 'vertex')).toHaveLength(48);
    expect(near.filter(({ type }) => type === 'middle')).toHaveLength(48);
  });

  test('a point has none', () => {
    expect(unders({ id: 'r', kind: 'rod', at: at(0, 0), system: 'C' })).toEqual([]);
  });

  test('a corner is taken before the middle beside it, and nothing out of reach', () => {
    const path = [at(0, 0), at(60, 0)];
    const handles = handlesOf(plane, { id: 'm', kind: 'metal-line', path }, METRES_PER_PX);
    const near = handleAt(handles, { x: 0.3, y: 0 }, 100);
    expect(near?.under.type).toBe('vertex');
    expect(handleAt(handles, { x: 0, y: 5 }, 1)).toBeNull();
  });
});
